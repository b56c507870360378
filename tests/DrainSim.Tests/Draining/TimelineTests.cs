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

    [Fact]
    public void Acts_at_a_time_and_at_a_level_do_not_undo_each_other()
    {
        // By the hour the level act has come already; each act sets what it names, in whichever order they come.
        Job warm = Wide with { Inflow = Inflow.Constant(1e-4) };
        Act feed = new() { Time = 900, After = warm, Text = "fed" };
        Act throttle = new() { Level = 1.9, After = Throttled, Text = "throttled" };
        DrainResult result = Jobs.Run(Wide with { Timeline = [feed, throttle], Run = new RunSettings { Until = 1000 } });
        Job last = result.JobAt(result.StoppedAt);
        Assert.Equal(warm.Inflow, last.Inflow);
        Assert.Equal(Throttled.Line.Path, last.Line.Path);
        Assert.Null(result.JobAt(800).Inflow);
        Assert.Equal([2.0, 1.0], result.Events.Where(e => e.Code == EventCode.Act).Select(e => e.Number));
    }

    [Fact]
    public void An_act_at_the_start_is_the_job_from_the_start()
    {
        DrainResult told = Jobs.Run(Wide with { Timeline = [new Act { Time = 0, After = Throttled, Text = "throttled" }] });
        Assert.Equal(Jobs.Run(Throttled).StoppedAt, told.StoppedAt, 1e-7 * told.StoppedAt);
        Assert.Equal(0, Assert.Single(told.Events, e => e.Code == EventCode.Act).Time);
        DrainResult below = Jobs.Run(Wide with { Timeline = [new Act { Level = 2.4, After = Throttled, Text = "throttled" }] });
        Assert.Equal(told.StoppedAt, below.StoppedAt, 1e-9 * told.StoppedAt);
    }

    [Fact]
    public void A_line_at_rest_waits_for_an_act_that_moves_it_again()
    {
        Job drain = Jobs.OrificeDrain() with { DrawOffs = Jobs.Only(Jobs.Orifice(0.05, 0.6), surface: 1) };
        Job lower = drain with { DrawOffs = Jobs.Only(Jobs.Orifice(0.05, 0.6), surface: 0.5) };
        double rest = Jobs.Run(drain).StoppedAt;
        DrainResult result = Jobs.Run(drain with { Timeline = [new Act { Time = 2 * rest, After = lower, Text = "sluice opened" }] });
        Assert.Equal(Outcome.Levelled, result.Outcome);
        Assert.Equal(0.5, result.FinalLevel, 2e-3);
        Assert.True(result.StoppedAt > 2 * rest);
    }

    [Fact]
    public void A_line_at_rest_ends_with_an_act_that_does_not_move_it()
    {
        Job drain = Jobs.OrificeDrain() with { DrawOffs = Jobs.Only(Jobs.Orifice(0.05, 0.6), surface: 1) };
        double rest = Jobs.Run(drain).StoppedAt;
        DrainResult result = Jobs.Run(drain with { Timeline = [new Act { Time = 2 * rest, After = drain, Text = "looked at" }] });
        Assert.Equal(Outcome.Levelled, result.Outcome);
        Assert.Equal(2 * rest, result.StoppedAt, 1e-6 * rest);
    }

    [Fact]
    public void An_inlet_lifted_out_of_the_liquid_takes_air_at_once()
    {
        Line line = Jobs.SiphonLine();
        Job lifted = Wide with { DrawOffs = Jobs.Only(line with { Inlet = line.Inlet with { Elevation = 2.3 } }) };
        DrainResult result = Jobs.Run(Wide with { Timeline = [new Act { Time = 300, After = lifted, Text = "hose lifted" }] });
        Assert.Equal(Outcome.InletUncovered, result.Outcome);
        Assert.Equal(300, result.StoppedAt, 1e-6);
    }

    [Fact]
    public void A_vent_that_is_blocked_holds_the_liquid_from_then_on()
    {
        Job vented = Wide with { Headspace = new DrainSim.Gas.VentedHeadspace { Openings = [new DrainSim.Gas.VentOrifice { Bore = 0.02 }] } };
        Job closed = Wide with { Headspace = new DrainSim.Gas.ClosedHeadspace() };
        DrainResult result = Jobs.Run(vented with { Timeline = [new Act { Time = 300, After = closed, Text = "vent blocked" }] });
        Assert.Equal(Outcome.VacuumHeld, result.Outcome);
        // The gas that the vent let in by then is all there is: p·V stays, by the ideal gas law.
        Instant then = result.Trace.At(300), last = result.Trace.At(result.StoppedAt);
        double capacity = vented.Vessel.Capacity, vapour = vented.Liquid.VapourPressure;
        Assert.Equal((then.HeadspacePressure!.Value - vapour) * (capacity - then.Volume),
            (last.HeadspacePressure!.Value - vapour) * (capacity - last.Volume), 1e-5 * capacity * 1e5);
    }

    [Fact]
    public void A_vent_that_is_opened_lets_the_liquid_go()
    {
        Job closed = Wide with { Headspace = new DrainSim.Gas.ClosedHeadspace() };
        Job vented = Wide with { Headspace = new DrainSim.Gas.VentedHeadspace { Openings = [new DrainSim.Gas.VentOrifice { Bore = 0.05 }] } };
        DrainResult result = Jobs.Run(closed with { Timeline = [new Act { Time = 600, After = vented, Text = "vent opened" }] });
        Assert.Equal(Outcome.InletUncovered, result.Outcome);
        Assert.True(result.StoppedAt > Jobs.Run(Wide).StoppedAt);
    }

    [Fact]
    public void A_siphon_breaker_that_is_opened_under_the_level_breaks_it_when_the_level_comes_down()
    {
        Job open = Wide with { DrawOffs = Jobs.Only(Jobs.SiphonLine() with { AirBreak = 1 }) };
        DrainResult result = Jobs.Run(Wide with { Timeline = [new Act { Time = 300, After = open, Text = "breaker opened" }] });
        Assert.Equal(Outcome.AirBreak, result.Outcome);
        Assert.Equal(1, result.FinalLevel, 1e-9);
    }

    private static Line WithValve(double opening)
    {
        Line line = Jobs.SiphonLine();
        return line with { Path = [.. line.Path, new Valve { Kind = ValveTable.Find("ball")!, Opening = opening }] };
    }
}
