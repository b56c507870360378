using DrainSim.Draining;
using DrainSim.Lines;
using MathNet.Numerics.RootFinding;

namespace DrainSim.Tests.Draining;

public sealed class OutcomeTests
{
    private const double Atmosphere = 101325;

    [Fact]
    public void A_siphon_leaves_the_heel_under_its_inlet()
    {
        DrainResult result = Jobs.Run(Jobs.Siphon());
        Assert.Equal(Outcome.InletUncovered, result.Outcome);
        Assert.Equal(result.Job.Vessel.Volume(0.12), result.LeftVolume, 1e-12);
        Assert.Null(result.FallBack);
    }

    [Fact]
    public void A_side_inlet_takes_air_at_its_crown()
    {
        Line line = Jobs.SiphonLine();
        DrainResult result = Jobs.Run(With(line with { Inlet = line.Inlet with { Facing = InletFacing.Side } }));
        Assert.Equal(0.12 + line.Bore, result.FinalLevel, 1e-9);
    }

    [Theory]
    [InlineData(1.0, null, 1.0)]
    [InlineData(null, 2.0, 0.7859503)]
    [InlineData(1.0, 2.0, 1.0)]
    public void A_target_stops_the_run_where_the_first_is_reached(double? level, double? volume, double expected)
    {
        Job job = Jobs.Siphon() with { Run = new RunSettings { StopAtLevel = level, StopAtVolume = volume } };
        DrainResult result = Jobs.Run(job);
        Assert.Equal(Outcome.TargetReached, result.Outcome);
        Assert.Equal(expected, result.FinalLevel, 1e-7);
    }

    [Fact]
    public void The_time_limit_stops_a_run_at_its_very_time()
    {
        DrainResult result = Jobs.Run(Jobs.Siphon() with { Run = new RunSettings { Until = 600 } });
        Assert.Equal((Outcome.TimeLimit, 600.0), (result.Outcome, result.StoppedAt));
    }

    [Theory]
    [InlineData(0.1, -1.8, 1.0, NoStart.InletAboveLevel)]
    [InlineData(0.5, 0.6, 1.0, NoStart.NoDrivingHead)]
    [InlineData(2.2, -1.8, 0.0, NoStart.ValveShut)]
    public void A_line_that_cannot_flow_never_starts_and_says_why(double level, double outlet, double opening, NoStart reason)
    {
        Line line = Jobs.SiphonLine(12);
        line = line with
        {
            Path =
            [
                .. line.Path.Take(2),
                (StraightRun)line.Path[2] with { Rise = outlet - 2.75 },
                new Valve { Kind = ValveTable.Find("ball")!, Opening = opening },
            ],
        };
        DrainResult result = Jobs.Run(With(line) with { Level = level });
        Assert.Equal((Outcome.NeverStarted, reason, 0.0), (result.Outcome, result.NoStart, result.StoppedAt));
        Assert.Equal(0, result.DrainedVolume);
    }

    [Fact]
    public void A_crest_beyond_the_atmosphere_never_starts()
    {
        DrainResult result = Jobs.Run(With(Jobs.SiphonLine()) with { Site = new Site { AtmosphericPressure = 6000 } });
        Assert.Equal(NoStart.LiftBeyondLimit, result.NoStart);
    }

    /// <summary>The level at which the crest boils, by a root search of its own on the same line.</summary>
    [Fact]
    public void The_column_parts_where_the_low_point_meets_the_vapour_pressure()
    {
        Job job = Boiling(AtVapour.Break);
        DrainResult result = Jobs.Run(job);
        var line = new LineHydraulics(job.Line, job.Liquid, job.Site.Gravity);
        double level = Brent.FindRoot(
            z => (line.LowPointPressure(line.Flow(z - line.OutletElevation, 0), z, Atmosphere, out _) - job.Liquid.VapourPressure) / Atmosphere,
            0.2, 2.2, 1e-13);
        Assert.Equal(Outcome.VapourBreak, result.Outcome);
        Assert.Equal(level, result.FinalLevel, 1e-7);
        Assert.InRange(result.LeastMargin.Value, -0.1, 0.1);
    }

    [Fact]
    public void What_falls_back_is_the_inner_leg_above_the_level()
    {
        DrainResult result = Jobs.Run(Boiling(AtVapour.Break));
        double area = Math.PI * 0.032 * 0.032 / 4;
        Assert.Equal(2.7 * (2.75 - result.FinalLevel) / 2.63 * area, result.FallBack!.IntoTank, 1e-12);
        Assert.Equal(7.0 * area, result.FallBack.OutOfOutlet, 1e-12);
        Assert.Equal(result.Job.Vessel.Level(result.LeftVolume + result.FallBack.IntoTank), result.FallBack.LevelAfter, 1e-12);
    }

    [Fact]
    public void A_line_held_at_the_limit_goes_on_until_the_lift_alone_is_too_much()
    {
        Job job = Boiling(AtVapour.Limit);
        DrainResult result = Jobs.Run(job), broken = Jobs.Run(Boiling(AtVapour.Break));
        DrainEvent begins = Assert.Single(result.Events, e => e.Code == EventCode.VapourLimitBegins);
        Assert.Equal(broken.StoppedAt, begins.Time, 1e-6 * begins.Time);
        for (int i = 1; i < 20; i++)
        {
            Instant held = result.Trace.At(begins.Time + (result.StoppedAt - begins.Time) * i / 20);
            Assert.InRange(held.LowPointMargin, -1, 1);
        }

        double lift = (Atmosphere - job.Liquid.VapourPressure) / (job.Liquid.Density * job.Site.Gravity);
        Assert.Equal(2.75 - lift + job.Run.SettledWithin, result.FinalLevel, 1e-6);
    }

    [Fact]
    public void A_least_pressure_above_the_vapour_pressure_breaks_the_line_first()
    {
        Line line = Jobs.SiphonLine() with { LeastPressure = 70e3 };
        DrainResult result = Jobs.Run(With(line));
        Assert.Equal(Outcome.VapourBreak, result.Outcome);
        Assert.Equal(70e3, result.LeastLowPointPressure.Value, 1.0);
    }

    [Fact]
    public void A_column_that_parts_at_once_ends_at_the_start_with_the_margin_that_parts_it()
    {
        DrainResult result = Jobs.Run(With(Jobs.SiphonLine() with { LeastPressure = 90e3 }));
        Assert.Equal((Outcome.VapourBreak, 0.0), (result.Outcome, result.StoppedAt));
        Assert.True(result.LeastMargin.Value < 0);
    }

    [Fact]
    public void A_hole_in_the_line_lets_air_in_at_its_elevation()
    {
        DrainResult result = Jobs.Run(With(Jobs.SiphonLine() with { AirBreak = 0.9 }));
        Assert.Equal(Outcome.AirBreak, result.Outcome);
        Assert.Equal(0.9, result.FinalLevel, 1e-9);
    }

    [Theory]
    [InlineData(2.2)]
    [InlineData(2.5)]
    public void A_hole_that_stands_in_the_air_already_breaks_the_line_at_once(double hole)
    {
        DrainResult result = Jobs.Run(With(Jobs.SiphonLine() with { AirBreak = hole }));
        Assert.Equal((Outcome.AirBreak, 0.0, 0.0), (result.Outcome, result.StoppedAt, result.DrainedVolume));
        Assert.NotNull(result.FallBack);
    }

    [Fact]
    public void A_settled_head_of_nothing_is_found_too()
    {
        Job job = new()
        {
            Liquid = Jobs.Inviscid,
            Vessel = Jobs.Prism(1, 3),
            Level = 2,
            DrawOffs = Jobs.Only(Jobs.Orifice(0.05, 0.6), surface: 0.5),
            Run = new RunSettings { SettledWithin = 0, Until = 1e6 },
        };
        DrainResult result = Jobs.Run(job);
        Assert.Equal(Outcome.Levelled, result.Outcome);
        Assert.Equal(0.5, result.FinalLevel, 1e-9);
    }

    private static Job With(Line line) => Jobs.Siphon() with { DrawOffs = Jobs.Only(line) };

    private static Job Boiling(AtVapour atVapour) => With(Jobs.SiphonLine() with { AtVapour = atVapour }) with
    {
        Liquid = Jobs.Water with { VapourPressure = 76.5e3 },
    };
}
