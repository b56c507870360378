using System.Text.RegularExpressions;
using DrainSim.Draining;
using DrainSim.Reports.Wording;
using DrainSim.Scenarios;

namespace DrainSim.Tests.House;

/// <summary>Every ready scenario runs to the outcome that the index names.</summary>
public sealed partial class ReadyScenarioTests
{
    private static string Folder => Path.Combine(Repository.Root, "scenarios");

    public static TheoryData<string, string> Index
    {
        get
        {
            var rows = new TheoryData<string, string>();
            foreach (Match row in Row().Matches(File.ReadAllText(Path.Combine(Folder, "README.md"))))
                rows.Add(row.Groups[1].Value, row.Groups[2].Value);
            return rows;
        }
    }

    [Theory]
    [MemberData(nameof(Index))]
    public void A_ready_scenario_ends_as_its_index_says(string file, string outcome)
    {
        ScenarioReading reading = ScenarioReader.Read(Path.Combine(Folder, file));
        Assert.Empty(reading.Problems);
        DrainResult result = Simulation.Run(reading.Scenario!.Job, TestContext.Current.CancellationToken);
        Assert.Equal(outcome, OutcomeCodes.Code(result.Outcome));
    }

    [Fact]
    public void Every_scenario_stands_in_the_index()
    {
        IEnumerable<string> files = Directory.EnumerateFiles(Folder, "*.yaml").Select(path => Path.GetFileName(path));
        Assert.Equal(files.Order(StringComparer.Ordinal), Index.Select(row => row.Data.Item1).Order(StringComparer.Ordinal));
    }

    [GeneratedRegex(@"^\| `([\w-]+\.yaml)` \| `(\w+)` \|", RegexOptions.Multiline)]
    private static partial Regex Row();
}
