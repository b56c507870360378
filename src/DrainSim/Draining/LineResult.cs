namespace DrainSim.Draining;

/// <summary>What a run found for one line.</summary>
public sealed record LineResult
{
    /// <summary>The line and what it discharged into.</summary>
    public required DrawOff DrawOff { get; init; }

    /// <summary>How the line ended; null where it still flowed when the run stopped.</summary>
    public required Outcome? Outcome { get; init; }

    /// <summary>Why it never started; null when it did.</summary>
    public NoStart? NoStart { get; init; }

    /// <summary>When it ended, s; the end of the run where it still flowed.</summary>
    public required double StoppedAt { get; init; }

    /// <summary>Volume that it took out of the tank, m³; negative where more came back.</summary>
    public required double DeliveredVolume { get; init; }

    /// <summary>Least pressure in the line, Pa absolute, and when.</summary>
    public required Extreme LeastLowPointPressure { get; init; }

    /// <summary>Least margin at the low point, Pa, and when.</summary>
    public required Extreme LeastMargin { get; init; }

    /// <summary>Index of the node at which the margin was least; as the line numbers them.</summary>
    public required int LeastMarginNode { get; init; }

    /// <summary>Largest flow, m³/s, and when.</summary>
    public required Extreme LargestFlow { get; init; }

    /// <summary>Largest velocity in the narrowest bore, m/s, and when.</summary>
    public required Extreme LargestVelocity { get; init; }

    /// <summary>When the liquid's front reached the outlet, s; null for a line that started full or never came to it.</summary>
    public double? RanFullAt { get; init; }

    /// <summary>
    /// Largest Froude number v/√(g·D) in the widest bore behind the crest, once the line runs full, 1; null for a line that never rises above its inlet.
    /// </summary>
    public double? OuterLegFroude { get; init; }

    /// <summary>Head that the liquid's yield stress holds in it, m; null for a liquid without one.</summary>
    public double? YieldHead { get; init; }

    /// <summary>Depth in the receiver when the run stopped, m; null where it is no tank.</summary>
    public double? ReceiverLevel { get; init; }

    /// <summary>Where the liquid in the line went when the column parted; null when it did not.</summary>
    public FallBack? FallBack { get; init; }

    /// <summary>What a siphon needs before it runs; null for a line that never rises above its inlet.</summary>
    public PrimeReport? Prime { get; init; }
}
