using DrainSim.Vessels;

namespace DrainSim.Draining;

/// <summary>A tank that fills with what arrives.</summary>
public sealed record ReceivingTank : Receiver
{
    /// <summary>Its inside.</summary>
    public required Vessel Vessel { get; init; }

    /// <summary>Elevation of its lowest inside point above the source tank's, m.</summary>
    public required double Bottom { get; init => field = Require.Finite(value, "receiver bottom", "m"); }

    /// <summary>Depth in it at the start, m; at least 0.</summary>
    public double Level { get; init => field = Require.NotNegative(value, "receiver level", "m"); }

    /// <summary>Depth at which it runs over, m; null for the whole height of the vessel.</summary>
    public double? Brim
    {
        get;
        init => field = value is { } brim ? Require.Positive(brim, "receiver brim", "m") : null;
    }

    /// <summary>Depth at which it runs over, m.</summary>
    public double BrimDepth => Brim is { } brim ? Math.Min(brim, Vessel.Height) : Vessel.Height;
}
