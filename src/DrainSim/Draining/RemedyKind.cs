namespace DrainSim.Draining;

/// <summary>A change that would let a stopped job go on.</summary>
public enum RemedyKind
{
    /// <summary>The outlet, and a receiving surface with it, lower.</summary>
    LowerOutlet,

    /// <summary>The crest lower.</summary>
    LowerCrest,

    /// <summary>More loss behind the crest, so that the flow is less.</summary>
    ThrottleOutlet,

    /// <summary>The inlet lower.</summary>
    LowerInlet,
}
