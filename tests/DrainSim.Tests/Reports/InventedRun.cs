using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Liquids;
using DrainSim.Vessels;

namespace DrainSim.Tests.Reports;

/// <summary>Results of closed form, for reports only: √level falls evenly from the start to the end.</summary>
internal sealed record InventedRun
{
    public Outcome Outcome { get; init; } = Outcome.InletUncovered;

    public NoStart? NoStart { get; init; }

    public string Title { get; init; } = "Rinse tank over the rim into the yard sump";

    public double StartLevel { get; init; } = 2.6;

    public double EndLevel { get; init; } = 0.12;

    public double End { get; init; } = 6125;

    public double Area { get; init; } = 2.6;

    public double? LeastPressure { get; init; }

    public double? ReceiverSurface { get; init; }

    public double VapourPressure { get; init; } = 2064;

    public double LowestPressure { get; init; } = 62e3;

    public double CrestElevation { get; init; } = 3.15;

    public double OutletElevation { get; init; } = -1.5;

    public LiquidHazards Hazards { get; init; }

    public RunSettings Run { get; init; } = new();

    public IReadOnlyList<DrainEvent> MoreEvents { get; init; } = [];

    public IReadOnlyList<Remedy> Remedies { get; init; } = [];

    public IReadOnlyList<RunWarning> Warnings { get; init; } = [];

    public double? ReceiverLevel { get; init; }

    public PrimeReport? Prime { get; init; } = new(0.0104, 0.0036, 0.0068, 2.6, 0.55, 10.1, 4e4);

    public Job Job => new()
    {
        Title = Title,
        Liquid = new Liquid
        {
            Name = "water",
            Temperature = 291.15,
            Density = 998.6,
            Viscosity = 1.05e-3,
            VapourPressure = VapourPressure,
            Hazards = Hazards,
        },
        Vessel = new StraightTank(Area, Math.Max(3.0, StartLevel)),
        Level = StartLevel,
        DrawOffs = [new DrawOff { Line = TheLine, Receiver = TheReceiver }],
        Run = Run,
    };

    private FixedSurface? TheReceiver =>
        ReceiverSurface is { } surface ? new FixedSurface { Elevation = surface } : null;

    private Line TheLine => new()
    {
        Bore = 0.038,
        Roughness = 1.5e-6,
        Inlet = new Inlet { Elevation = 0.05 },
        LeastPressure = LeastPressure,
        Path =
        [
            new StraightRun { Length = Math.Abs(CrestElevation - 0.05) + 0.1, Rise = CrestElevation - 0.05 },
            new StraightRun
            {
                Length = Math.Abs(OutletElevation - CrestElevation) + 1.35,
                Rise = OutletElevation - CrestElevation,
            },
        ],
    };

    public DrainResult Result()
    {
        var trace = new EvenRootCourse(this).ToTrace();
        Instant first = trace.At(0);
        Instant last = trace.At(trace.End);
        return new DrainResult
        {
            Job = Job,
            Outcome = Outcome,
            NoStart = NoStart,
            StoppedAt = trace.End,
            InitialVolume = first.Volume,
            DrainedVolume = first.Volume - last.Volume,
            LeftVolume = last.Volume,
            FinalLevel = last.Level,
            LeastLowPointPressure = new Extreme(last.LowPointPressure, trace.End),
            LeastMargin = new Extreme(last.LowPointMargin, trace.End),
            LeastMarginNode = 2,
            LargestFlow = new Extreme(first.Flow, 0),
            LargestVelocity = new Extreme(first.Velocity, 0),
            Events = [.. Tenths(trace).Concat(MoreEvents).Append(EndEvent(last)).OrderBy(moment => moment.Time)],
            Trace = trace,
            Prime = Prime,
            Steadiness = new SteadinessCheck(0.002, 1e-5, 0),
            Warnings = Warnings,
            Remedies = Remedies,
            Lines = [],
            Counters = new Counters(21, 2, 140, 161, 60),
        };
    }

    private DrainEvent EndEvent(Instant last)
    {
        EventCode code = Outcome switch
        {
            Outcome.Emptied => EventCode.Emptied,
            Outcome.InletUncovered => EventCode.InletUncovered,
            Outcome.VapourBreak => EventCode.VapourBreak,
            Outcome.Levelled => EventCode.Levelled,
            Outcome.TargetReached => EventCode.TargetReached,
            Outcome.TimeLimit => EventCode.TimeLimit,
            _ => EventCode.NeverStarted,
        };
        return new DrainEvent(last.Time, code, last.Level, last.Volume, 0);
    }

    private static IEnumerable<DrainEvent> Tenths(Trace trace)
    {
        double whole = trace.At(0).Volume;
        for (int tenth = 1; tenth < 10; tenth++)
        {
            double volume = whole * (10 - tenth) / 10;
            if (trace.TimeAtVolume(volume) is { } time && trace.End > 0)
            {
                yield return new DrainEvent(time, EventCode.TenthGone, trace.At(time).Level, volume, tenth);
            }
        }
    }

    private sealed record StraightTank(double Section, double Tall) : Vessel
    {
        public override double Height => Tall;

        public override double Capacity => Section * Tall;

        public override double Volume(double level) => Section * Math.Clamp(level, 0, Tall);

        public override double Area(double level) => Section;

        public override double Level(double volume) => Math.Clamp(volume / Section, 0, Tall);
    }

    private sealed class EvenRootCourse(InventedRun run)
    {
        private double End => run.Outcome == Outcome.NeverStarted ? 0 : run.End;

        private double Slope => End > 0 ? (Math.Sqrt(run.StartLevel) - Math.Sqrt(run.EndLevel)) / End : 0;

        public Trace ToTrace() => new(End > 0 ? [0, End / 3, End] : [0], At, time => At(time).Volume);

        private Instant At(double time)
        {
            double root = Math.Sqrt(run.StartLevel) - Slope * time;
            double level = root * root;
            double flow = 2 * root * Slope * run.Area;
            double share = End > 0 ? time / End : 0;
            double pressure = Math.Max(run.VapourPressure, 82e3 + share * (run.LowestPressure - 82e3));
            double velocity = flow / (Math.PI / 4 * 0.038 * 0.038);
            return new Instant
            {
                Time = time,
                Level = level,
                Volume = run.Area * level,
                Flow = flow,
                Velocity = velocity,
                Reynolds = 998.6 * velocity * 0.038 / 1.05e-3,
                Head = level - run.OutletElevation,
                LowPointPressure = pressure,
                LowPointMargin = pressure - Math.Max(run.VapourPressure, run.LeastPressure ?? 0),
                ReceiverLevel = run.ReceiverLevel,
            };
        }
    }
}
