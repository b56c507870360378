using DrainSim.Scenarios;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies;

namespace DrainSim.Tests.House;

/// <summary>The ready studies find what their titles promise.</summary>
public sealed class ReadyStudyTests
{
    [Theory]
    [InlineData("garden-hose-lengths.yaml", 6, 1)]
    [InlineData("sump-length-and-bore.yaml", 63, 7)]
    public void A_ready_sweep_has_its_cases_and_names_the_impossible_ones(string file, int count, int impossible)
    {
        List<Problem> problems = [];
        SweepCases cases = SweepPlan.Read(Load(file), new StudyRequest(), problems)!;
        Assert.Empty(problems);
        Assert.Equal(count, cases.Count);
        CaseReader reader = cases.Scenario.NewReader();
        var values = new ParameterValue[cases.Scenario.Parameters.Count];
        int without = 0;
        for (long i = 0; i < cases.Count; i++)
        {
            cases.Read(i, values);
            without += reader.Run(values, TestContext.Current.CancellationToken).Run is null ? 1 : 0;
        }

        Assert.Equal(impossible, without);
    }

    [Fact]
    public void The_ready_sizing_finds_one_bore()
    {
        List<Problem> problems = [];
        SizePlan plan = SizePlan.Read(Load("bore-for-a-shift.yaml"), new StudyRequest(), problems)!;
        Assert.Empty(problems);
        SizedValue found = Assert.Single(plan.Find(TestContext.Current.CancellationToken).Values);
        Assert.Equal(7.5 * 3600, found.Run.DrainTime!.Value, 1e-3);
    }

    private static ScenarioDocument Load(string file) => ScenarioDocument.Load(Path.Combine(Repository.Root, "scenarios", file));
}
