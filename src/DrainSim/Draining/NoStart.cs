namespace DrainSim.Draining;

/// <summary>Why a line never carried a flow.</summary>
public enum NoStart
{
    /// <summary>The level stands below the inlet.</summary>
    InletAboveLevel,

    /// <summary>The outlet or the receiving surface stands above the level.</summary>
    NoDrivingHead,

    /// <summary>The driving head does not exceed what the liquid's yield stress holds.</summary>
    YieldHolds,

    /// <summary>The column over the crest is higher than the atmosphere can hold.</summary>
    LiftBeyondLimit,

    /// <summary>The liquid's front in the outer leg does not stand below the level.</summary>
    NoPrime,

    /// <summary>The liquid's front comes to rest in the outer leg before it reaches the outlet.</summary>
    FrontStops,

    /// <summary>A valve on the line is shut.</summary>
    ValveShut,
}
