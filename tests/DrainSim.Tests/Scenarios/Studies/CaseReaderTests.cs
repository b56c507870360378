using CsCheck;
using DrainSim.Scenarios;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies;
using DrainSim.Tests.House;

namespace DrainSim.Tests.Scenarios.Studies;

/// <summary>A case that is made by changing a number of the job is the case that reading the changed scenario makes.</summary>
public sealed class CaseReaderTests
{
    private static readonly Gen<double> Factor = Gen.OneOf(Gen.Double[0.3, 3], Gen.Int[0, 3].Select(i => new[] { 0, -1, 1e9, 1.0 }[i]));

    public static TheoryData<string> ReadyScenarios =>
        [.. Directory.EnumerateFiles(Path.Combine(Repository.Root, "scenarios"), "*.yaml").Select(file => Path.GetFileName(file)).Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(ReadyScenarios))]
    public void Every_number_of_a_ready_scenario_gives_the_same_run_changed_as_read(string file)
    {
        ScenarioDocument document = ScenarioDocument.Load(Path.Combine(Repository.Root, "scenarios", file));
        foreach (string path in document.Parameters)
        {
            List<Problem> problems = [];
            if (VariedScenario.Find(document, [(path, [])], problems) is not { } varied || varied.Parameters[0].Base is not { } number || path.StartsWith("run.", StringComparison.Ordinal))
                continue;
            CaseReader reader = varied.NewReader();
            Factor.Sample(factor => AssertSame(document, path, varied.Parameters[0].Of(number * factor), reader), iter: 3, threads: 1);
        }
    }

    [Theory]
    [InlineData("tank.level")]
    [InlineData("line.bore")]
    [InlineData("line.path.outer_leg.length")]
    [InlineData("line.path.outlet_valve.opening")]
    public void The_numbers_mostly_varied_are_changed_without_reading(string path)
    {
        ScenarioDocument document = ScenarioDocument.FromText(GoodScenario.Text, "rinse.yaml", ".");
        Assert.NotNull(JobEdits.Find(document, document.Read().Scenario!.Job, path));
    }

    [Fact]
    public void A_word_beside_a_number_is_read_once_and_the_number_changed()
    {
        ScenarioDocument document = ScenarioDocument.FromText(GoodScenario.Text, "rinse.yaml", ".");
        List<Problem> problems = [];
        SweepCases cases = SweepPlan.Read(document, new StudyRequest
        {
            Vary = ["line.material=smooth_hose, cast_iron", "line.path.outer_leg.length=5 m..9 m in 3", "tank.level=1 m, 2 m"],
        }, problems)!;
        Assert.Empty(problems);
        Assert.Equal(12, cases.Count);
        CaseReader reader = cases.Scenario.NewReader();
        var values = new ParameterValue[3];
        for (long i = 0; i < cases.Count; i++)
        {
            cases.Read(i, values);
            ScenarioDocument changed = document.With("line.material", values[0].Text)
                .With("line.path.outer_leg.length", values[1].Text).With("tank.level", values[2].Text);
            Assert.Equal(Run(changed), Text(reader.Run(values, TestContext.Current.CancellationToken)));
        }
    }

    private static void AssertSame(ScenarioDocument document, string path, ParameterValue value, CaseReader reader) =>
        Assert.Equal((path, Run(document.With(path, value.Text))), (path, Text(reader.Run([value], TestContext.Current.CancellationToken))));

    private static string Run(ScenarioDocument document) => document.Read() is { Scenario: { } scenario }
        ? Text(CaseResult.Of(scenario.Job, TestContext.Current.CancellationToken))
        : "impossible";

    /// <summary>All results of a run to the last bit.</summary>
    private static string Text(CaseResult result) => result.Run is { } run
        ? string.Join(' ', ResultQuantity.All.Select(quantity => quantity.Of(run)?.ToString("R", System.Globalization.CultureInfo.InvariantCulture)).Prepend(run.Outcome.ToString()))
        : "impossible";
}
