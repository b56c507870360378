using DrainSim.Draining;
using DrainSim.Lines;

namespace DrainSim.Tests.Draining;

/// <summary>Events that fall on one instant: what stands first in the watch list counts, and nothing is lost.</summary>
public sealed class TieTests
{
    private static readonly double K = Jobs.OrificeFactor();

    [Fact]
    public void Air_at_the_inlet_counts_before_the_hole_at_its_height()
    {
        Line line = Jobs.SiphonLine() with { AirBreak = 0.12 };
        Assert.Equal(Outcome.InletUncovered, Jobs.Run(Jobs.Siphon() with { DrawOffs = Jobs.Only(line) }).Outcome);
    }

    [Fact]
    public void A_target_that_fills_the_receiver_is_a_target()
    {
        // 2 m² into 2 m²: a metre down is a metre up.
        ReceivingTank tank = new() { Vessel = Jobs.Prism(2, 1), Bottom = -4 };
        Job job = Jobs.OrificeDrain() with { DrawOffs = [new DrawOff { Line = Jobs.Orifice(0.05, 0.6), Receiver = tank }] };
        Assert.Equal(Outcome.ReceiverFull, Jobs.Run(job).Outcome);
        DrainResult result = Jobs.Run(job with { Run = new RunSettings { StopAtLevel = 2 } });
        Assert.Equal(Outcome.TargetReached, result.Outcome);
        Assert.Equal(2 * 2 * (Math.Sqrt(3) - Math.Sqrt(2)) / K, result.StoppedAt, 1e-6 * result.StoppedAt);
    }

    [Fact]
    public void An_act_at_the_corner_of_an_inflow_leaves_both()
    {
        Job fed = Jobs.OrificeDrain() with { Inflow = new Inflow { Points = [(0, 0.002), (200, 0.002), (400, 0)] } };
        Job wider = fed with { DrawOffs = Jobs.Only(Jobs.Orifice(0.06, 0.6)) };
        DrainResult result = Jobs.Run(fed with { Timeline = [new Act { Time = 200, After = wider, Text = "wider" }], Run = new RunSettings { Until = 400 } });
        Assert.Equal(200, Assert.Single(result.Events, e => e.Code == EventCode.Act).Time, 1e-9);
        Assert.Equal(0.002 * 200 + 0.001 * 200, result.DrainedVolume + result.LeftVolume - result.InitialVolume, 1e-9);
    }

    [Fact]
    public void An_act_at_the_level_of_the_target_is_done_and_told()
    {
        Job job = Jobs.OrificeDrain() with { Run = new RunSettings { StopAtLevel = 2 } };
        Job wider = job with { DrawOffs = Jobs.Only(Jobs.Orifice(0.06, 0.6)) };
        DrainResult result = Jobs.Run(job with { Timeline = [new Act { Level = 2, After = wider, Text = "wider" }] });
        Assert.Equal(Outcome.TargetReached, result.Outcome);
        Assert.Equal(2, result.FinalLevel, 1e-9);
    }

    [Fact]
    public void An_act_at_the_moment_of_rest_moves_it_on()
    {
        Job drain = Jobs.OrificeDrain() with { DrawOffs = Jobs.Only(Jobs.Orifice(0.05, 0.6), surface: 1) };
        Job lower = drain with { DrawOffs = Jobs.Only(Jobs.Orifice(0.05, 0.6), surface: 0.5) };
        DrainResult result = Jobs.Run(drain with { Timeline = [new Act { Time = Jobs.Run(drain).StoppedAt, After = lower, Text = "sluice opened" }] });
        Assert.Equal(0.5, result.FinalLevel, 2e-3);
    }

    [Fact]
    public void A_column_that_parts_as_air_comes_is_out_of_liquid()
    {
        // The threshold set to the pressure that the low point has just when the inlet uncovers.
        DrainResult free = Jobs.Run(Jobs.Siphon());
        double last = free.Trace.At(free.StoppedAt).LowPointPressure;
        Line line = Jobs.SiphonLine() with { LeastPressure = last };
        DrainResult result = Jobs.Run(Jobs.Siphon() with { DrawOffs = Jobs.Only(line) });
        Assert.Contains(result.Outcome, new[] { Outcome.InletUncovered, Outcome.VapourBreak });
        Assert.Equal(free.StoppedAt, result.StoppedAt, 1e-5 * free.StoppedAt);
    }
}
