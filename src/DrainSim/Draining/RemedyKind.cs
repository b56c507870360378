namespace DrainSim.Draining;

/// <summary>A change that would let a stopped job go on.</summary>
public enum RemedyKind
{
    /// <summary>The outlet, and a receiving surface with it, lower.</summary>
    LowerOutlet,

    /// <summary>The outlet and the receiving tank with it lower.</summary>
    LowerReceiver,

    /// <summary>The crest lower.</summary>
    LowerCrest,

    /// <summary>More loss behind the crest, so that the flow is less.</summary>
    ThrottleOutlet,

    /// <summary>The inlet lower.</summary>
    LowerInlet,

    /// <summary>One more opening in the roof of the tank, or a wider one.</summary>
    WidenVent,

    /// <summary>Less inflow.</summary>
    LessInflow,

    /// <summary>A receiver that holds more, its walls carried on straight up.</summary>
    HigherBrim,
}
