namespace DrainSim.Draining;

/// <summary>The state of a job at one moment.</summary>
public readonly record struct Instant
{
    /// <summary>Time since the start, s.</summary>
    public required double Time { get; init; }

    /// <summary>Level above the tank's lowest inside point, m.</summary>
    public required double Level { get; init; }

    /// <summary>Volume in the tank, m³.</summary>
    public required double Volume { get; init; }

    /// <summary>Flow out of the tank through all lines, m³/s.</summary>
    public required double Flow { get; init; }

    /// <summary>Mean velocity in the line's own bore, m/s.</summary>
    public required double Velocity { get; init; }

    /// <summary>Reynolds number in the line's own bore, 1.</summary>
    public required double Reynolds { get; init; }

    /// <summary>Driving head, m.</summary>
    public required double Head { get; init; }

    /// <summary>Least pressure in the line, Pa absolute.</summary>
    public required double LowPointPressure { get; init; }

    /// <summary>
    /// <see cref="LowPointPressure"/> less the vapour pressure or the stricter least pressure allowed, Pa.
    /// </summary>
    public required double LowPointMargin { get; init; }

    /// <summary>Depth in the receiver, m; null where the receiver is no tank.</summary>
    public double? ReceiverLevel { get; init; }

    /// <summary>Pressure in the headspace, Pa absolute; null where the tank is open.</summary>
    public double? HeadspacePressure { get; init; }
}
