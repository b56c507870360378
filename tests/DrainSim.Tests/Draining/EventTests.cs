using DrainSim.Draining;
using DrainSim.Lines;

namespace DrainSim.Tests.Draining;

public sealed class EventTests
{
    /// <summary>√h = √h₀ − k·t, so the time to a share is known for each tenth.</summary>
    [Fact]
    public void Each_tenth_of_a_prism_is_gone_at_its_closed_time()
    {
        Job job = new()
        {
            Liquid = Jobs.Inviscid,
            Vessel = Jobs.Prism(2, 4),
            Level = 3,
            DrawOffs = Jobs.Only(Jobs.Orifice(0.05, 0.6)),
            Run = new RunSettings { SettledWithin = 1e-6 },
        };
        DrainResult result = Jobs.Run(job);
        double k = 0.6 * Math.PI * 0.05 * 0.05 / 4 / 2 * Math.Sqrt(Site.StandardGravity / 2);
        for (int tenth = 1; tenth <= 9; tenth++)
        {
            DrainEvent gone = Assert.Single(result.Events, e => e.Code == EventCode.TenthGone && e.Number == tenth);
            double time = (Math.Sqrt(3) - Math.Sqrt(0.3 * (10 - tenth))) / k;
            Assert.Equal(time, gone.Time, 1e-6 * result.StoppedAt);
        }
    }

    [Fact]
    public void The_flow_regime_changes_at_Re_4000_and_2000()
    {
        Job job = Jobs.Siphon() with
        {
            Liquid = Jobs.Water with { Viscosity = 0.009 },
            DrawOffs = Jobs.Only(Jobs.SiphonLine(40)),
            Level = 2.5,
            Run = new RunSettings { Until = 1e6 },
        };
        DrainResult result = Jobs.Run(job);
        DrainEvent[] changes = [.. result.Events.Where(e => e.Number is 2000 or 4000)];
        Assert.NotEmpty(changes);
        foreach (DrainEvent change in changes)
            Assert.Equal(change.Number, result.Trace.At(change.Time).Reynolds, 1e-5 * change.Number);
    }

    [Fact]
    public void Events_stand_in_time_order_and_the_end_comes_last()
    {
        DrainResult result = Jobs.Run(Jobs.Siphon());
        Assert.Equal(result.Events.OrderBy(e => e.Time), result.Events);
        Assert.Equal((EventCode.InletUncovered, result.StoppedAt), (result.Events[^1].Code, result.Events[^1].Time));
    }

    [Fact]
    public void A_target_at_the_inlet_counts_before_the_air()
    {
        Job job = Jobs.Siphon() with { Run = new RunSettings { StopAtLevel = 0.12 } };
        Assert.Equal(Outcome.TargetReached, Jobs.Run(job).Outcome);
    }

    [Fact]
    public void The_submergence_band_is_passed_from_its_safe_side()
    {
        DrainResult result = Jobs.Run(Jobs.Siphon());
        DrainEvent may = Assert.Single(result.Events, e => e.Code == EventCode.AirMayBeDrawn);
        DrainEvent likely = Assert.Single(result.Events, e => e.Code == EventCode.AirDrawn);
        Assert.True(may.Time < likely.Time);
        Assert.Equal(0.12 + may.Number, may.Level, 1e-6);
        Assert.Contains(result.Warnings, warning => warning.Code == WarningCode.AirMayBeDrawn);
    }

    [Fact]
    public void Air_drawn_breaks_the_line_where_the_scenario_says_so()
    {
        Line line = Jobs.SiphonLine();
        line = line with { Inlet = line.Inlet with { AirDraw = AirDraw.Break } };
        DrainResult warned = Jobs.Run(Jobs.Siphon());
        DrainResult broken = Jobs.Run(Jobs.Siphon() with { DrawOffs = Jobs.Only(line) });
        double drawn = warned.Events.Single(e => e.Code == EventCode.AirDrawn).Time;
        Assert.Equal(drawn, broken.StoppedAt, 1e-6 * drawn);
    }
}
