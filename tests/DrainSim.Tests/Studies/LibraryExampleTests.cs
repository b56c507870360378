using DrainSim.Draining;
using DrainSim.Scenarios;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies;
using DrainSim.Tests.Scenarios;

namespace DrainSim.Tests.Studies;

/// <summary>The studies as the contributor guide calls them.</summary>
public sealed class LibraryExampleTests
{
    [Fact]
    public void A_sweep_of_jobs_is_a_few_lines()
    {
        Job job = StudyJobs.Drain(0.05, 1);
        List<double?> times = [];
        new OrderedRuns().Run(0, 5, i => CaseResult.Of(job with { Level = 1 + 0.1 * i }), (i, result) => times.Add(result.Run?.DrainTime), TestContext.Current.CancellationToken);
        Assert.Equal(5, times.Count);
        Assert.Equal(times.Order(), times);
    }

    [Fact]
    public void A_sweep_of_a_scenario_is_a_few_lines()
    {
        List<Problem> problems = [];
        SweepCases cases = SweepPlan.Read(ScenarioDocument.FromText(GoodScenario.Text, "rinse.yaml", "."),
            new StudyRequest { Vary = ["line.path.outer_leg.length=4 m..50 m in 10"] }, problems)!;
        List<CaseResult> results = [];
        new OrderedRuns().Run(0, cases.Count,
            () => (Reader: cases.Scenario.NewReader(), Values: new ParameterValue[cases.Scenario.Parameters.Count]),
            (own, i) =>
            {
                cases.Read(i, own.Values);
                return own.Reader.Run(own.Values);
            },
            (i, result) => results.Add(result), TestContext.Current.CancellationToken);
        Assert.Contains("cannot fall", results[0].Cause, StringComparison.Ordinal);
        Assert.All(results.Skip(1), result => Assert.True(result.Run!.IsDone));
    }
}
