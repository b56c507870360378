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

    /// <summary>Flow out of the tank through all lines, m³/s; negative when more comes back.</summary>
    public required double Flow { get; init; }

    /// <summary>Mean velocity in the first line's own bore, m/s.</summary>
    public required double Velocity { get; init; }

    /// <summary>Reynolds number in the first line's own bore, 1.</summary>
    public required double Reynolds { get; init; }

    /// <summary>Driving head of the first line, m.</summary>
    public required double Head { get; init; }

    /// <summary>Least pressure in all lines at work, Pa absolute.</summary>
    public required double LowPointPressure { get; init; }

    /// <summary>
    /// <see cref="LowPointPressure"/> less the vapour pressure or the stricter least pressure allowed, Pa.
    /// </summary>
    public required double LowPointMargin { get; init; }

    /// <summary>Depth in the first receiving tank, m; null where there is none.</summary>
    public double? ReceiverLevel { get; init; }

    /// <summary>Pressure in the headspace, Pa absolute; null where the tank is open.</summary>
    public double? HeadspacePressure { get; init; }

    /// <summary>Flow of each line, m³/s, in their order; null where there is one line.</summary>
    public IReadOnlyList<double>? LineFlows { get; init; }
}
