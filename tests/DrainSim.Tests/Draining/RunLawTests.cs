using CsCheck;
using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Vessels;

namespace DrainSim.Tests.Draining;

/// <summary>Laws that hold for every job; CsCheck prints the seed of a failure.</summary>
public sealed class RunLawTests
{
    private const int Cases = 150;

    private static readonly Gen<Vessel> Tanks = Gen.OneOf<Vessel>(
        Gen.Select(Gen.Double[0.5, 4], Gen.Double[2, 4]).Select((d, h) => (Vessel)Jobs.Cylinder(d, h)),
        Gen.Double[2, 4].Select(d => (Vessel)new Sphere { Diameter = d }),
        Gen.Select(Gen.Double[0.2, 1], Gen.Double[1, 3]).Select((b, t) =>
            (Vessel)new Cone { BottomDiameter = b, TopDiameter = t, ConeHeight = 2.5 }),
        Gen.Double[2, 4].Select(l => (Vessel)new HorizontalCylinder
        {
            Diameter = 2.2,
            Length = l,
            FirstHead = new Flat(),
            SecondHead = new Flat(),
        }));

    private static readonly Gen<Job> AnyJob = Gen.Select(
        Tanks, Gen.Double[0.02, 0.1], Gen.Double[0, 3e-4], Gen.Double[0.2, 3], Gen.Double[5, 40], Gen.Double[1e-3, 0.3],
        (tank, bore, roughness, drop, length, viscosity) => new Job
        {
            Liquid = Jobs.Water with { Viscosity = viscosity },
            Vessel = tank,
            Level = 0.9 * tank.Height,
            DrawOffs = Jobs.Only(LineOf(bore, roughness, drop, length, tank.Height)),
            Run = new RunSettings { Until = 1e9 },
        });

    [Fact]
    public void Volume_balances() => AnyJob.Sample(job =>
    {
        DrainResult result = Run(job);
        Assert.Equal(result.InitialVolume, result.DrainedVolume + result.LeftVolume, 1e-9 * result.InitialVolume);
        Assert.Equal(Outcome.InletUncovered, result.Outcome);
    }, iter: Cases);

    [Fact]
    public void More_roughness_length_or_loss_never_drains_faster() =>
        Gen.Select(AnyJob, Gen.Double[0, 2e-4], Gen.Double[0, 20], Gen.Double[0, 10]).Sample((job, rougher, longer, loss) =>
        {
            double time = Run(job).StoppedAt * (1 - 1e-7);
            var outer = (StraightRun)job.Line.Path[^1];
            Assert.True(Run(With(job, job.Line with { Roughness = job.Line.Roughness + rougher })).StoppedAt >= time);
            Assert.True(Run(With(job, Outer(job.Line, outer with { Length = outer.Length + longer }))).StoppedAt >= time);
            Assert.True(Run(With(job, job.Line with { Path = [.. job.Line.Path, new PlainLoss { Coefficient = loss }] })).StoppedAt >= time);
        }, iter: Cases);

    [Fact]
    public void A_lower_outlet_is_never_slower() => Gen.Select(AnyJob, Gen.Double[0, 2]).Sample((job, lower) =>
    {
        var outer = (StraightRun)job.Line.Path[^1];
        Line deep = Outer(job.Line, outer with { Rise = outer.Rise - lower, Length = outer.Length + 2 });
        Line same = Outer(job.Line, outer with { Length = outer.Length + 2 });
        Assert.True(Run(With(job, deep)).StoppedAt <= Run(With(job, same)).StoppedAt * (1 + 1e-7));
    }, iter: Cases);

    [Fact]
    public void Splitting_a_run_changes_nothing() => Gen.Select(AnyJob, Gen.Double[0.1, 0.9]).Sample((job, share) =>
    {
        var outer = (StraightRun)job.Line.Path[^1];
        StraightRun first = outer with { Length = share * outer.Length, Rise = share * outer.Rise };
        StraightRun second = outer with { Length = (1 - share) * outer.Length, Rise = (1 - share) * outer.Rise };
        Line split = job.Line with { Path = [.. job.Line.Path.SkipLast(1), first, second] };
        double time = Run(job).StoppedAt;
        Assert.Equal(time, Run(With(job, split)).StoppedAt, 1e-9 * time);
    }, iter: Cases);

    [Fact]
    public void Twice_the_lines_empty_twice_the_tank_in_the_same_time() => AnyJob.Where(job => job.Vessel is VerticalCylinder).Sample(job =>
    {
        var tank = (VerticalCylinder)job.Vessel;
        Job twice = job with
        {
            Vessel = tank with { Diameter = tank.Diameter * Math.Sqrt(2) },
            DrawOffs = Jobs.Only(job.Line with { Parallel = 2 }),
        };
        double time = Run(job).StoppedAt;
        Assert.Equal(time, Run(twice).StoppedAt, 1e-9 * time);
    }, iter: Cases);

    [Fact]
    public void A_thousandfold_tighter_tolerance_moves_no_time_by_1e_5() => AnyJob.Sample(job =>
    {
        double time = Run(job).StoppedAt;
        double tight = Run(job with { Run = job.Run with { Tolerance = 1e-11 } }).StoppedAt;
        Assert.Equal(tight, time, 1e-5 * tight);
    }, iter: Cases);

    /// <summary>A count, not a time: what the plain siphon costs.</summary>
    [Fact]
    public void The_plain_siphon_takes_at_most_60_flow_solutions() =>
        Assert.InRange(Jobs.Run(Jobs.Siphon()).Counters.FlowSolutions, 1, 60);

    private static DrainResult Run(Job job) => Simulation.Run(job, CancellationToken.None);

    private static Job With(Job job, Line line) => job with { DrawOffs = Jobs.Only(line) };

    private static Line Outer(Line line, StraightRun outer) => line with { Path = [.. line.Path.SkipLast(1), outer] };

    private static Line LineOf(double bore, double roughness, double drop, double length, double height) => new()
    {
        Bore = bore,
        Roughness = roughness,
        Inlet = new Inlet { Elevation = 0.1 },
        Path =
        [
            new StraightRun { Length = height + 0.3, Rise = height + 0.1 },
            new StraightRun { Length = height + drop + length, Rise = -height - 0.2 - drop },
        ],
    };
}
