using System.Text.RegularExpressions;

namespace DrainSim.Cli.Tests;

/// <summary>Every command of the README, run as a user would.</summary>
public sealed partial class ReadmeTests
{
    private static readonly string Root = RepositoryRoot();
    private static readonly string Readme = File.ReadAllText(Path.Combine(Root, "README.md"));

    public static TheoryData<string> Commands => [.. CommandLines().Select(m => m.Groups["line"].Value.Trim()).Distinct()];

    [Theory]
    [MemberData(nameof(Commands))]
    public void A_command_of_the_README_ends_as_it_says(string line)
    {
        using var folder = new TestFolder();
        CopyScenarios(folder);
        string[] parts = line.Split('#', 2, StringSplitOptions.TrimEntries);
        string[] args = parts[0].Split(' ', StringSplitOptions.RemoveEmptyEntries)[1..];
        if (args[0] == "run" && args[1] == "rinse.yaml")
            Assert.Equal(0, DrainSimProcess.Run(folder, "new", "rinse").ExitCode);
        Finished finished = DrainSimProcess.Run(folder, args);
        Match expected = ExpectedCode().Match(parts.Length > 1 ? parts[1] : "");
        Assert.Equal(expected.Success ? expected.Groups[1].Value : "0", $"{finished.ExitCode}");
    }

    [Fact]
    public void The_README_has_commands_to_run() => Assert.True(Commands.Count >= 10, $"{Commands.Count} commands");

    [Fact]
    public void The_first_command_of_the_README_runs_a_ready_scenario_through_the_program()
    {
        Match first = FirstCommand().Match(Readme);
        Assert.True(first.Success);
        Assert.True(File.Exists(Path.Combine(Root, first.Groups["project"].Value, "DrainSim.Cli.csproj")));
        Assert.True(File.Exists(Path.Combine(Root, first.Groups["scenario"].Value)));
    }

    [Fact]
    public void Every_file_that_the_README_shows_or_links_is_there()
    {
        string[] missing =
        [
            .. Links().Matches(Readme).Select(m => m.Groups["target"].Value)
                .Where(target => !Path.Exists(Path.Combine(Root, target))),
        ];
        Assert.Empty(missing);
    }

    [Fact]
    public void The_scenario_explained_is_the_ready_one()
    {
        string ready = File.ReadAllText(Path.Combine(Root, "scenarios", "rinse-tank-over-rim.yaml")).ReplaceLineEndings("\n");
        string shown = Scenario().Match(Readme.ReplaceLineEndings("\n")).Groups["text"].Value;
        Assert.Equal(ready[ready.IndexOf("liquid:", StringComparison.Ordinal)..].Trim(), Comments().Replace(shown, "").Trim());
    }

    private static MatchCollection CommandLines() => CommandLine().Matches(Readme);

    private static void CopyScenarios(TestFolder folder)
    {
        foreach (string file in Directory.EnumerateFiles(Path.Combine(Root, "scenarios")))
            folder.Write(Path.Combine("scenarios", Path.GetFileName(file)), File.ReadAllText(file));
    }

    private static string RepositoryRoot()
    {
        for (DirectoryInfo? folder = new(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "DrainSim.sln")))
                return folder.FullName;
        }

        throw new DirectoryNotFoundException("DrainSim.sln stands in no folder above the tests.");
    }

    /// <summary>A line of a shell block; a comment behind it may say <c>ends with N</c>.</summary>
    [GeneratedRegex(@"^(?<line>drainsim [^\r\n]+)", RegexOptions.Multiline)]
    private static partial Regex CommandLine();

    [GeneratedRegex(@"ends with (\d+)")]
    private static partial Regex ExpectedCode();

    [GeneratedRegex(@"^dotnet run --project (?<project>\S+) -- run (?<scenario>\S+)", RegexOptions.Multiline)]
    private static partial Regex FirstCommand();

    [GeneratedRegex(@"\]\((?<target>[^)#:]+)\)")]
    private static partial Regex Links();

    [GeneratedRegex(@"```yaml\n(?<text>.*?)```", RegexOptions.Singleline)]
    private static partial Regex Scenario();

    [GeneratedRegex(@" +# .*$", RegexOptions.Multiline)]
    private static partial Regex Comments();
}
