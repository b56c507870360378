using DrainSim.Draining;
using DrainSim.Lines;

namespace DrainSim.Tests.Draining;

/// <summary>An act makes of a run two runs, the second of which begins where the first one stopped.</summary>
public sealed class TimelineTests
{
    private static readonly Job Wide = Jobs.Siphon();
    private static readonly Job Throttled = Wide with { DrawOffs = Jobs.Only(WithValve(0.3)) };

    [Fact]
    public void An_act_at_a_time_restarts_exactly()
    {
        DrainResult first = Jobs.Run(Wide with { Run = new RunSettings { Until = 700 } });
        DrainResult second = Jobs.Run(Throttled with { Level = first.FinalLevel });
        DrainResult whole = Jobs.Run(Wide with { Timeline = [new Act { Time = 700, After = Throttled, Text = "throttled" }] });
        Assert.Equal(700 + second.StoppedAt, whole.StoppedAt, 1e-7 * whole.StoppedAt);
        Assert.Equal(700, Assert.Single(whole.Events, e => e.Code == EventCode.Act).Time, 1e-9);
    }

    [Fact]
    public void An_act_at_a_level_restarts_exactly()
    {
        DrainResult first = Jobs.Run(Wide with { Run = new RunSettings { StopAtLevel = 1.2 } });
        DrainResult second = Jobs.Run(Throttled with { Level = 1.2 });
        DrainResult whole = Jobs.Run(Wide with { Timeline = [new Act { Level = 1.2, After = Throttled, Text = "throttled" }] });
        Assert.Equal(first.StoppedAt + second.StoppedAt, whole.StoppedAt, 1e-7 * whole.StoppedAt);
        Assert.Equal(1.2, Assert.Single(whole.Events, e => e.Code == EventCode.Act).Level, 1e-9);
    }

    [Fact]
    public void An_act_that_changes_nothing_moves_nothing()
    {
        double time = Jobs.Run(Wide).StoppedAt;
        DrainResult watched = Jobs.Run(Wide with { Timeline = [new Act { Time = 1000, After = Wide, Text = "looked at" }] });
        Assert.Equal(time, watched.StoppedAt, 1e-7 * time);
    }

    [Fact]
    public void Of_two_acts_at_one_time_the_later_in_the_list_stays()
    {
        Act throttle = new() { Time = 500, After = Throttled, Text = "throttled" }, open = new() { Time = 500, Before = Throttled, After = Wide, Text = "opened" };
        Assert.Equal(Jobs.Run(Wide).StoppedAt, Jobs.Run(Wide with { Timeline = [throttle, open] }).StoppedAt, 1e-3);
        DrainResult closed = Jobs.Run(Wide with { Timeline = [open, throttle] });
        DrainResult alone = Jobs.Run(Wide with { Timeline = [throttle] });
        Assert.Equal(alone.StoppedAt, closed.StoppedAt, 1e-3);
        Assert.Equal([1.0, 2.0], closed.Events.Where(e => e.Code == EventCode.Act).Select(e => e.Number));
    }

    [Fact]
    public void A_valve_that_is_opened_later_only_delays_the_job()
    {
        Job shut = Wide with { DrawOffs = Jobs.Only(WithValve(0)) }, open = Wide with { DrawOffs = Jobs.Only(WithValve(1)) };
        DrainResult late = Jobs.Run(shut with { Timeline = [new Act { Time = 300, After = open, Text = "opened" }] });
        Assert.Equal(300 + Jobs.Run(open).StoppedAt, late.StoppedAt, 1e-7 * late.StoppedAt);
    }

    [Fact]
    public void A_valve_that_is_shut_ends_the_flow_until_the_time_limit()
    {
        Job shut = Wide with { DrawOffs = Jobs.Only(WithValve(0)) };
        DrainResult result = Jobs.Run(Wide with { Timeline = [new Act { Time = 300, After = shut, Text = "shut" }] });
        Assert.Equal(Outcome.TimeLimit, result.Outcome);
        Assert.Equal(Jobs.Run(Wide with { Run = new RunSettings { Until = 300 } }).FinalLevel, result.FinalLevel, 1e-7);
    }

    [Fact]
    public void What_ran_in_before_an_act_stays_in_the_balance()
    {
        const double before = 2e-4, after = 5e-4;
        Job more = Throttled with { Inflow = Inflow.Constant(after) };
        DrainResult result = Jobs.Run(Wide with
        {
            Inflow = Inflow.Constant(before),
            Run = new RunSettings { Until = 900 },
            Timeline = [new Act { Time = 300, After = more, Text = "throttled, and more runs in" }],
        });
        Assert.Equal(result.InitialVolume + 300 * before + 600 * after, result.DrainedVolume + result.LeftVolume, 1e-9);
    }

    private static Line WithValve(double opening)
    {
        Line line = Jobs.SiphonLine();
        return line with { Path = [.. line.Path, new Valve { Kind = ValveTable.Find("ball")!, Opening = opening }] };
    }
}
