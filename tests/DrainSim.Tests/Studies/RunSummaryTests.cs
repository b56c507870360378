using DrainSim.Draining;
using DrainSim.Studies;

namespace DrainSim.Tests.Studies;

/// <summary>What a study keeps of a run.</summary>
public sealed class RunSummaryTests
{
    /// <summary>√h = √h₀·(1 − t/T) for a stop at 0: the drainable share s is gone at t/T = 1 − √(1 − s); here down to 0.2 m.</summary>
    [Fact]
    public void The_times_to_shares_of_the_drainable_volume_are_those_of_the_closed_form()
    {
        const double bore = 0.05, loss = 1, stop = 0.2;
        RunSummary run = RunSummary.Of(Simulation.Run(StudyJobs.Drain(bore, loss, stop: stop), TestContext.Current.CancellationToken));
        foreach ((double share, double? time) in ((double, double?)[])[(0.5, run.TimeTo50), (0.9, run.TimeTo90), (0.99, run.TimeTo99)])
        {
            double expected = StudyJobs.Time(bore, loss, stop: StudyJobs.Level - share * (StudyJobs.Level - stop));
            Assert.InRange(time!.Value, expected * (1 - 1e-6), expected * (1 + 1e-6));
        }

        Assert.Equal(run.StoppedAt, run.DrainTime);
    }

    [Fact]
    public void A_run_that_stops_early_has_no_drain_time()
    {
        Job job = StudyJobs.Drain(0.05, 1);
        RunSummary run = RunSummary.Of(Simulation.Run(job with { Run = job.Run with { Until = 10 } }, TestContext.Current.CancellationToken));
        Assert.Equal(Outcome.TimeLimit, run.Outcome);
        Assert.Null(run.DrainTime);
        Assert.Null(run.TimeTo50);
        Assert.Equal(10, run.StoppedAt);
    }

    [Fact]
    public void Broken_limits_are_kept_by_name()
    {
        Job job = StudyJobs.Drain(0.05, 1) with { Limits = new JobLimits { DrainTimeAtMost = 1, LeftVolume = 10 } };
        Assert.Equal([LimitKind.DrainTimeAtMost], RunSummary.Of(Simulation.Run(job, TestContext.Current.CancellationToken)).BrokenLimits);
    }

    [Fact]
    public void Every_result_is_found_by_its_name()
    {
        foreach (ResultQuantity quantity in ResultQuantity.All)
            Assert.Same(quantity, ResultQuantity.Find(quantity.Name));
        Assert.Null(ResultQuantity.Find("Drain_time"));
    }
}
