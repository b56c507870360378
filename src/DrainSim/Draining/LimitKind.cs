namespace DrainSim.Draining;

/// <summary>A bound that a job must keep.</summary>
public enum LimitKind
{
    /// <summary>Shortest drain time, s.</summary>
    DrainTimeAtLeast,

    /// <summary>Longest drain time, s.</summary>
    DrainTimeAtMost,

    /// <summary>Largest volume left, m³.</summary>
    LeftVolume,

    /// <summary>Largest flow, m³/s.</summary>
    LargestFlow,

    /// <summary>Largest velocity, m/s.</summary>
    LargestVelocity,

    /// <summary>Fastest fall of the level, m/s.</summary>
    FastestFall,

    /// <summary>Least margin at the low point, Pa.</summary>
    LeastMargin,

    /// <summary>Largest vacuum in the headspace, Pa.</summary>
    LargestVacuum,

    /// <summary>Largest depth in the receiver, m.</summary>
    ReceiverLevel,
}
