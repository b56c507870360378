using DrainSim.Gas;
using DrainSim.Lines;
using DrainSim.Liquids;
using DrainSim.Vessels;

namespace DrainSim.Draining;

/// <summary>One emptying job: a tank, its lines, a liquid, a place and an end.</summary>
public sealed record Job
{
    /// <summary>Title for people.</summary>
    public string Title { get; init; } = "";

    /// <summary>The liquid in the tank and the lines.</summary>
    public required Liquid Liquid { get; init; }

    /// <summary>Atmosphere and gravity.</summary>
    public Site Site { get; init; } = new();

    /// <summary>The tank that is emptied.</summary>
    public required Vessel Vessel { get; init; }

    /// <summary>Level at the start above the tank's lowest inside point, m.</summary>
    public required double Level { get; init => field = Require.NotNegative(value, "level", "m"); }

    /// <summary>The lines that empty it, at least one, in the order of the scenario.</summary>
    public required IReadOnlyList<DrawOff> DrawOffs
    {
        get;
        init
        {
            ArgumentNullException.ThrowIfNull(value);
            ArgumentOutOfRangeException.ThrowIfZero(value.Count, "lines");
            field = value;
        }
    }

    /// <summary>The gas over the liquid.</summary>
    public Headspace Headspace { get; init; } = new OpenHeadspace();

    /// <summary>What runs in meanwhile; null for nothing.</summary>
    public Inflow? Inflow { get; init; }

    /// <summary>What is done during the job.</summary>
    public IReadOnlyList<Act> Timeline { get; init; } = [];

    /// <summary>Vacuum that the tank stands, Pa below the atmosphere; null where it is not known.</summary>
    public double? VacuumRating
    {
        get;
        init => field = value is { } rating ? Require.NotNegative(rating, "vacuum rating", "Pa") : null;
    }

    /// <summary>Overpressure that the tank stands, Pa above the atmosphere; null where it is not known.</summary>
    public double? PressureRating
    {
        get;
        init => field = value is { } rating ? Require.NotNegative(rating, "pressure rating", "Pa") : null;
    }

    /// <summary>What the job must keep; null for no bounds.</summary>
    public JobLimits? Limits { get; init; }

    /// <summary>When the run ends.</summary>
    public RunSettings Run { get; init; } = new();

    /// <summary>The first line: the only one of most jobs.</summary>
    public Line Line => DrawOffs[0].Line;

    /// <summary>Elevation of the first line's fixed receiving surface, m; null where it has none.</summary>
    public double? ReceiverSurface => (DrawOffs[0].Receiver as FixedSurface)?.Elevation;
}
