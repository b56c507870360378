namespace DrainSim.Draining;

/// <summary>What a job must keep; each bound is null where there is none.</summary>
public sealed record JobLimits
{
    /// <summary>Shortest drain time allowed, s.</summary>
    public double? DrainTimeAtLeast { get; init; }

    /// <summary>Longest drain time allowed, s.</summary>
    public double? DrainTimeAtMost { get; init; }

    /// <summary>Largest volume that may be left, m³.</summary>
    public double? LeftVolume { get; init; }

    /// <summary>Largest flow allowed, m³/s.</summary>
    public double? LargestFlow { get; init; }

    /// <summary>Largest velocity allowed in the narrowest bore, m/s.</summary>
    public double? LargestVelocity { get; init; }

    /// <summary>Fastest fall of the level allowed, m/s.</summary>
    public double? FastestFall { get; init; }

    /// <summary>Least margin at the low point allowed, Pa.</summary>
    public double? LeastMargin { get; init; }

    /// <summary>Largest vacuum allowed in the headspace, Pa below the atmosphere.</summary>
    public double? LargestVacuum { get; init; }

    /// <summary>Largest depth allowed in the receiver, m.</summary>
    public double? ReceiverLevel { get; init; }
}
