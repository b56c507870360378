using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Lines;
using DrainSim.Vessels;

namespace DrainSim.Tests.Draining;

/// <summary>Plants at the edge of what there is: brimful, closing over themselves, running dry or over.</summary>
public sealed class CornerTests
{
    private static readonly Line Drain = Jobs.Orifice(0.05, 0.6);

    [Fact]
    public void A_brimful_closed_tank_is_held_at_once()
    {
        DrainResult result = Jobs.Run(Jobs.OrificeDrain(height: 3, level: 3) with { Headspace = new ClosedHeadspace() });
        Assert.Equal(Outcome.VacuumHeld, result.Outcome);
        Assert.InRange(result.DrainedVolume, 0, 1e-4);
    }

    [Fact]
    public void A_brimful_sphere_under_a_vent_empties_and_its_fall_is_a_number()
    {
        Job job = Jobs.OrificeDrain() with
        {
            Vessel = new Sphere { Diameter = 2 },
            Level = 2,
            Headspace = new VentedHeadspace { Openings = [new VentOrifice { Bore = 0.02 }] },
            Limits = new JobLimits { FastestFall = 1 },
        };
        DrainResult result = Jobs.Run(job);
        Assert.Equal(Outcome.Emptied, result.Outcome);
        Assert.InRange(Assert.Single(result.LimitChecks).Worst.Value, 1e-6, 10);
    }

    [Fact]
    public void A_receiver_that_closes_over_itself_cannot_be_raised()
    {
        ReceivingTank drum = new() { Vessel = new HorizontalCylinder { Diameter = 0.6, Length = 1, FirstHead = new Flat(), SecondHead = new Flat() }, Bottom = -2 };
        DrainResult result = Jobs.Run(Jobs.OrificeDrain() with { DrawOffs = [new DrawOff { Line = Drain, Receiver = drum }] });
        Assert.Equal(Outcome.ReceiverFull, result.Outcome);
        Assert.Empty(RemedySearch.Find(result, TestContext.Current.CancellationToken));
    }

    [Fact]
    public void A_tank_that_is_filled_from_behind_runs_over()
    {
        DrainResult result = Jobs.Run(Jobs.OrificeDrain(height: 1, level: 0.8) with { DrawOffs = Jobs.Only(Drain, surface: 2) });
        Assert.Equal(Outcome.Overflowed, result.Outcome);
        Assert.Equal(-2 * 0.2, result.DrainedVolume, 1e-9);
    }

    [Fact]
    public void No_more_comes_back_than_the_receiver_holds()
    {
        ReceivingTank small = new() { Vessel = Jobs.Prism(0.04, 4), Bottom = 2, Level = 0.5 };
        DrainResult result = Jobs.Run(Jobs.OrificeDrain(height: 1, level: 0.8) with
        {
            DrawOffs = [new DrawOff { Line = Drain, Receiver = small }],
            Run = new RunSettings { Until = 3600 },
        });
        Assert.InRange(result.DrainedVolume, -0.0201, 0);
    }

    [Fact]
    public void A_siphon_that_takes_air_at_its_crown_leaves_the_heel_of_a_bore()
    {
        Line line = Drain with
        {
            Inlet = Drain.Inlet with { Facing = InletFacing.Side },
            Path = [new StraightRun { Length = 2, Rise = 0.03 }],
        };
        DrainResult result = Jobs.Run(Jobs.OrificeDrain(level: 0.8) with { DrawOffs = Jobs.Only(line) });
        Assert.Equal(Outcome.InletUncovered, result.Outcome);
        Assert.Equal(0.05, result.FinalLevel, 1e-9);
    }

    [Fact]
    public void An_inflow_that_is_shut_off_later_does_not_balance()
    {
        Job fed = Jobs.OrificeDrain() with { Inflow = Inflow.Constant(0.003) }, shut = fed with { Inflow = null };
        DrainResult result = Jobs.Run(fed with { Timeline = [new Act { Time = 20_000, After = shut, Text = "shut off" }] });
        Assert.Equal(Outcome.Emptied, result.Outcome);
        Assert.True(result.StoppedAt > 20_000);
    }

    [Fact]
    public void A_line_that_only_rises_waits_for_the_act_that_lowers_its_outlet()
    {
        Line rising = Drain with { Path = [new StraightRun { Length = 2, Rise = 0.4 }] };
        Line falling = Drain with { Path = [new StraightRun { Length = 2, Rise = -1 }] };
        Job job = Jobs.OrificeDrain(level: 0.8) with { DrawOffs = Jobs.Only(rising) };
        DrainResult result = Jobs.Run(job with { Timeline = [new Act { Time = 7200, After = job with { DrawOffs = Jobs.Only(falling) }, Text = "lowered" }] });
        Assert.Equal(Outcome.Emptied, result.Outcome);
        Assert.True(result.StoppedAt > 7200);
    }

    [Fact]
    public void Under_a_vent_the_second_line_costs_no_more_once_the_first_has_ended()
    {
        Line high = Jobs.SiphonLine() with { Inlet = new Inlet { Elevation = 1, EdgeLoss = 0.78 }, Bore = 0.05 };
        DrainResult result = Jobs.Run(Jobs.Siphon() with
        {
            DrawOffs = [new DrawOff { Line = high }, new DrawOff { Line = Jobs.SiphonLine() }],
            Headspace = new VentedHeadspace { Openings = [new VentOrifice { Bore = 0.01 }] },
        });
        Assert.InRange(result.Counters.Steps, 10, 400);
    }
}
