using DrainSim.Liquids;
using DrainSim.Lines;
using DrainSim.Vessels;

namespace DrainSim.Draining;

/// <summary>One emptying job: a tank, its lines, a liquid, a place and an end.</summary>
public sealed record Job
{
    /// <summary>Title for people.</summary>
    public string Title { get; init; } = "";

    /// <summary>The liquid in the tank and the line.</summary>
    public required Liquid Liquid { get; init; }

    /// <summary>Atmosphere and gravity.</summary>
    public Site Site { get; init; } = new();

    /// <summary>The tank that is emptied.</summary>
    public required Vessel Vessel { get; init; }

    /// <summary>Level at the start above the tank's lowest inside point, m.</summary>
    public required double Level { get; init => field = Require.NotNegative(value, "level", "m"); }

    /// <summary>The line that empties it.</summary>
    public required Line Line { get; init; }

    /// <summary>
    /// Elevation of a fixed receiving surface above the tank's lowest inside point, m; null for a free discharge.
    /// </summary>
    public double? ReceiverSurface
    {
        get;
        init => field = value is { } surface ? Require.Finite(surface, "receiver surface", "m") : null;
    }

    /// <summary>When the run ends.</summary>
    public RunSettings Run { get; init; } = new();
}
