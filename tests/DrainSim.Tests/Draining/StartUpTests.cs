using CsCheck;
using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Lines;
using DrainSim.Liquids;
using MathNet.Numerics;

namespace DrainSim.Tests.Draining;

/// <summary>Lines whose outer leg is not yet full, against the closed solutions of a column that grows.</summary>
public sealed class StartUpTests
{
    private const double G = Site.StandardGravity;
    private const double Rough = 1e-4;

    /// <summary>
    /// Down a pipe of constant friction from a surface that stays: with w = V², x·w' + (1 + φ·x)·w = 2·g·(h + x), φ = f/D, so that
    /// w = 2g/(x·e^φx)·∫(h + s)·e^φs·ds from x₀, in closed form; t = ∫dx/√w with x = x₀ + u².
    /// </summary>
    [Theory]
    [InlineData(0.5, 0.2)]
    [InlineData(3.0, 1.0)]
    public void A_column_falls_down_a_pipe_in_the_closed_time(double level, double started)
    {
        const double bore = 0.05, length = 4;
        Job job = Falling(level, -started, bore, length, 1e6);
        double phi = FrictionFactor.FullyRough(Rough / bore) / bore;
        double time = Integrate.GaussLegendre(u => 2 * u / Velocity(started + u * u), 0, Math.Sqrt(length - started), 64);
        DrainResult result = Jobs.Run(job);
        Assert.Equal(1, result.Lines[0].RanFullAt!.Value / time, 1e-6);
        DrainEvent full = Assert.Single(result.Events, e => e.Code == EventCode.RunsFull);
        Assert.Equal(result.Lines[0].RanFullAt, full.Time);
        double area = Math.PI / 4 * bore * bore;
        Assert.Equal(1, result.Trace.At(full.Time * (1 - 1e-9)).Flow / (area * Velocity(length)), 1e-5);

        double Velocity(double x) // the closed form of its integral would cancel near the start
        {
            double integral = Integrate.GaussLegendre(s => (level + s) * Math.Exp(phi * s), started, x, 32);
            return Math.Sqrt(2 * G / (x * Math.Exp(phi * x)) * integral);
        }
    }

    /// <summary>
    /// Of the fall of potential energy the friction takes its share and the rest is motion: ½·m·V² = ∫(pressure and weight)·A·V·dt
    /// less losses, for a siphon whose column passes a bend and a wider bore, with the level falling by what fills the leg.
    /// </summary>
    [Fact]
    public void A_column_over_a_crest_keeps_the_balance_of_energy()
    {
        const double area = 0.3, start = 2.2, front = 1.9;
        Job job = Siphon(front) with { Vessel = Jobs.Prism(area, 3), Level = start };
        DrainResult result = Jobs.Run(job);
        double full = result.Lines[0].RanFullAt!.Value, rho = job.Liquid.Density;
        var line = new LineHydraulics(job.Line, job.Liquid, G);
        double bore = Math.PI / 4 * 0.032 * 0.032;
        // power by quadrature over the trace: ρ·g·Q·(level − front elevation − head used) is the rate of ½·ρ·Q²·Σ L/A
        double work = Integrate.GaussLegendre(t => Power(result.Trace.At(t)), 0, full * (1 - 1e-9), 128);
        double flow = result.Trace.At(full * (1 - 1e-9)).Flow;
        double kinetic = 0.5 * rho * flow * flow * line.TotalLength / bore;
        Assert.Equal(1, work / kinetic, 1e-4);

        double Power(Instant i)
        {
            double x = ColumnAt(i.Volume), share = (x - 2.7) / 7;
            double elevation = 2.75 - 4.55 * share;
            double used = line.HeadWithin(3, share, i.Flow);
            double velocity = i.Flow / bore;
            // the column grows by liquid that moves already, which its own velocity head has paid for
            return rho * G * i.Flow * (i.Level - elevation - used) + 0.5 * rho * i.Flow * velocity * velocity;
        }

        double ColumnAt(double volume) => 2.7 + 7 * (2.75 - front) / 4.55 + (area * start - volume) / bore;
    }

    [Fact]
    public void Filling_the_line_loses_nothing_and_the_tank_falls_by_it()
    {
        Job job = Siphon(1.0);
        DrainResult result = Jobs.Run(job);
        double full = result.Lines[0].RanFullAt!.Value;
        double leg = Math.PI / 4 * 0.032 * 0.032 * 7, filled = leg * (1.0 + 1.8) / 4.55;
        Assert.Equal(filled, result.InitialVolume - result.Trace.At(full).Volume, 1e-9 * result.InitialVolume);
        Assert.Equal(result.InitialVolume, result.DrainedVolume + result.LeftVolume, 1e-9 * result.InitialVolume);
        // from there on it is the run of a primed line from that level
        DrainResult primed = Jobs.Run(Jobs.Siphon() with { Level = result.Trace.At(full).Level });
        Assert.Equal(full + primed.StoppedAt, result.StoppedAt, 1e-6 * result.StoppedAt);
        Assert.Equal(primed.Outcome, result.Outcome);
    }

    [Fact]
    public void A_receiver_gets_what_left_the_tank_but_for_what_stayed_in_the_line()
    {
        var receiver = new ReceivingTank { Vessel = Jobs.Prism(4, 3), Bottom = -5 };
        Job job = Siphon(0.5);
        job = job with { DrawOffs = [job.DrawOffs[0] with { Receiver = receiver }] };
        DrainResult result = Jobs.Run(job);
        double filled = Math.PI / 4 * 0.032 * 0.032 * 7 * (0.5 + 1.8) / 4.55;
        Assert.Equal(result.DrainedVolume - filled, 4 * result.ReceiverLevel!.Value, 1e-9 * result.InitialVolume);
        Assert.Equal(0, result.Trace.At(0.5 * result.Lines[0].RanFullAt!.Value).ReceiverLevel);
    }

    [Theory]
    [InlineData(2.2)]
    [InlineData(2.5)]
    public void A_front_that_does_not_stand_below_the_level_never_starts(double front) =>
        Assert.Equal((Outcome.NeverStarted, NoStart.NoPrime), Result(Siphon(front)));

    [Fact]
    public void A_front_just_below_the_level_starts_slowly_and_runs()
    {
        double soon = Jobs.Run(Siphon(1.5)).Lines[0].RanFullAt!.Value, late = Jobs.Run(Siphon(2.2 - 1e-6)).Lines[0].RanFullAt!.Value;
        Assert.True(late > soon, $"{late} {soon}");
    }

    [Fact]
    public void A_front_at_the_outlet_is_a_primed_line()
    {
        DrainResult result = Jobs.Run(Siphon(-1.8));
        Assert.Null(result.Lines[0].RanFullAt);
        Assert.Equal(Jobs.Run(Jobs.Siphon()).StoppedAt, result.StoppedAt);
    }

    /// <summary>Behind the first fall the leg rises above the level: the column swings up and comes to rest below the hump.</summary>
    [Fact]
    public void A_column_that_does_not_reach_over_a_second_hump_never_starts()
    {
        Line line = Jobs.SiphonLine() with
        {
            Path =
            [
                new StraightRun { Length = 2.7, Rise = 2.63 },
                new StraightRun { Length = 2, Rise = -0.7 },
                new StraightRun { Length = 2, Rise = 0.65 },
                new StraightRun { Length = 5, Rise = -4.5 },
            ],
        };
        Job job = Jobs.Siphon() with { DrawOffs = [new DrawOff { Line = line, Front = 2.15 }] };
        Assert.Equal((Outcome.NeverStarted, NoStart.FrontStops), Result(job));
        Assert.Equal(Outcome.InletUncovered, Jobs.Run(job with { DrawOffs = Jobs.Only(line) }).Outcome);
    }

    [Fact]
    public void A_liquid_with_a_yield_stress_holds_its_front()
    {
        Job job = Siphon(2.1) with
        {
            Liquid = Jobs.Water with { Rheology = new Bingham { YieldStress = 5, PlasticViscosity = 0.01 } },
        };
        Assert.Equal((Outcome.NeverStarted, NoStart.YieldHolds), Result(job));
        Assert.NotNull(Jobs.Run(job with { DrawOffs = Siphon(0).DrawOffs }).Lines[0].RanFullAt);
    }

    [Fact]
    public void The_prime_is_told()
    {
        PrimeReport prime = Simulation.Begin(Siphon(1.0)).Prime!;
        Assert.Equal(1.0, prime.Front);
        Assert.Equal(2.2, prime.FrontElevation);
        // 2.7 m of inner leg and 7·(2.75 − 2.2)/4.55 m of the outer one, 2.08 m under the surface at each dip
        Assert.Equal(2, prime.DipFills);
        Assert.Null(Simulation.Begin(Jobs.Siphon()).Prime!.Front);
    }

    [Fact]
    public void A_slow_outer_leg_warns_that_air_may_stay()
    {
        DrainResult fast = Jobs.Run(Siphon(1.0));
        Assert.DoesNotContain(fast.Warnings, w => w.Code == WarningCode.AirStaysInLeg);
        Assert.True(fast.Lines[0].OuterLegFroude > 1);
        Job throttled = Siphon(1.0);
        Line line = throttled.Line with { Path = [.. throttled.Line.Path, new PlainLoss { Coefficient = 2000 }] };
        DrainResult slow = Jobs.Run(throttled with { DrawOffs = [throttled.DrawOffs[0] with { Line = line }] });
        RunWarning warning = Assert.Single(slow.Warnings, w => w.Code == WarningCode.AirStaysInLeg);
        double flow = slow.Trace.At(slow.Lines[0].RanFullAt!.Value + 1).Flow;
        Assert.Equal(flow / (Math.PI / 4 * 0.032 * 0.032) / Math.Sqrt(G * 0.032), warning.Number, 1e-3);
    }

    [Fact]
    public void Of_several_lines_each_starts_by_itself()
    {
        Job job = Siphon(1.0);
        DrainResult result = Jobs.Run(job with { DrawOffs = [job.DrawOffs[0], new DrawOff { Line = Jobs.SiphonLine(12) }] });
        Assert.True(result.Lines[0].RanFullAt > 0);
        Assert.Null(result.Lines[1].RanFullAt);
        Assert.Equal(result.InitialVolume, result.LeftVolume + result.Lines.Sum(line => line.DeliveredVolume), 1e-9 * result.InitialVolume);
    }

    [Fact]
    public void A_column_waits_behind_a_shut_valve_and_starts_when_it_opens()
    {
        Job open = WithValve(1), shut = WithValve(0) with { Timeline = [new Act { Time = 60, After = open, Text = "the valve is opened" }] };
        DrainResult result = Jobs.Run(shut), free = Jobs.Run(open);
        Assert.Equal(60 + free.Lines[0].RanFullAt!.Value, result.Lines[0].RanFullAt!.Value, 1e-6);
        Assert.Equal(free.InitialVolume, result.Trace.At(59).Volume);
        Assert.Equal(60 + free.StoppedAt, result.StoppedAt, 1e-6 * free.StoppedAt);

        static Job WithValve(double opening)
        {
            Job job = Siphon(1.0);
            Line line = job.Line with { Path = [.. job.Line.Path, new Valve { Kind = ValveTable.Find("ball")!, Opening = opening }] };
            return job with { DrawOffs = [job.DrawOffs[0] with { Line = line }] };
        }
    }

    [Fact]
    public void A_valve_shut_on_the_way_holds_the_column_where_it_is()
    {
        Job job = Siphon(2.0), shut = job with
        {
            DrawOffs = [job.DrawOffs[0] with { Line = job.Line with { Path = [.. job.Line.Path, new Valve { Kind = ValveTable.Find("ball")!, Opening = 0 }] } }],
        };
        Act close = new() { Time = 1.5, After = shut, Text = "shut" }, open = new() { Time = 100, Before = shut, After = job, Text = "opened" };
        DrainResult result = Jobs.Run(job with { Timeline = [close, open] });
        Assert.Equal(result.Trace.At(1.5).Volume, result.Trace.At(100).Volume, 1e-12);
        Assert.True(result.Lines[0].RanFullAt > 100);
        Assert.Equal(Outcome.InletUncovered, result.Outcome);
    }

    [Theory]
    [InlineData(0.02)] // the gas keeps its mass
    [InlineData(0.1)] // the gas follows at once
    public void A_line_starts_under_a_vent_too(double vent)
    {
        Job job = Siphon(1.0) with { Headspace = new VentedHeadspace { Openings = [new VentOrifice { Bore = vent }] } };
        DrainResult result = Jobs.Run(job);
        Assert.Equal(1, result.Lines[0].RanFullAt!.Value / Jobs.Run(Siphon(1.0)).Lines[0].RanFullAt!.Value, 0.02);
        Assert.Equal(result.InitialVolume, result.DrainedVolume + result.LeftVolume, 1e-9 * result.InitialVolume);
    }

    [Theory]
    [InlineData(AtVapour.Break)]
    [InlineData(AtVapour.Limit)]
    public void A_column_that_reaches_its_limit_on_the_way_parts(AtVapour at)
    {
        Job job = Siphon(1.0) with { Liquid = Jobs.Water with { VapourPressure = 85e3 } };
        job = job with { DrawOffs = [job.DrawOffs[0] with { Line = job.Line with { AtVapour = at } }] };
        DrainResult result = Jobs.Run(job);
        Assert.Equal(Outcome.VapourBreak, result.Outcome);
        Assert.Null(result.Lines[0].RanFullAt);
        Assert.Equal(EventCode.VapourBreak, Assert.Single(result.Events).Code);
        double leg = Math.PI / 4 * 0.032 * 0.032 * 7 * (2.75 - 1.0) / 4.55;
        Assert.Equal(leg + result.DrainedVolume, result.FallBack!.OutOfOutlet, 1e-9);
    }

    [Fact]
    public void A_lower_front_never_runs_full_later() => Gen.Select(Gen.Double[-1.7, 2.1], Gen.Double[0, 1], Gen.Double[-9, 0]).Sample((front, lower, logViscosity) =>
    {
        Liquid liquid = Jobs.Water with { Viscosity = Math.Exp(logViscosity) };
        double? high = Run(front), low = Run(Math.Max(-1.75, front - lower));
        Assert.True(low <= high * (1 + 1e-6), $"{low} {high}");

        double? Run(double z)
        {
            DrainResult result = Simulation.Run(Siphon(z) with { Liquid = liquid, Run = new RunSettings { Until = 1e9 } }, CancellationToken.None);
            Assert.Equal(result.InitialVolume, result.DrainedVolume + result.LeftVolume, 1e-9 * result.InitialVolume);
            return result.Lines[0].RanFullAt;
        }
    }, iter: 60);

    private static (Outcome, NoStart?) Result(Job job) => Jobs.Run(job) is var result ? (result.Outcome, result.NoStart) : default;

    private static Job Siphon(double front) => Jobs.Siphon() with { DrawOffs = [new DrawOff { Line = Jobs.SiphonLine(), Front = front }] };

    private static Job Falling(double level, double front, double bore, double length, double area) => new()
    {
        Liquid = Jobs.Inviscid,
        Vessel = Jobs.Prism(area, 5),
        Level = level,
        DrawOffs =
        [
            new DrawOff
            {
                Line = Jobs.Orifice(bore, 1) with { Roughness = Rough, Path = [new StraightRun { Length = length, Rise = -length }] },
                Front = front,
            },
        ],
        Run = new RunSettings { Until = 60 },
    };
}
