namespace DrainSim.Draining;

/// <summary>What a moment of a run is marked for.</summary>
public enum EventCode
{
    /// <summary>Another tenth of the starting volume is gone; the event's number is how many.</summary>
    TenthGone,

    /// <summary>A bore passed from turbulent flow into the transition; the event's number is Re.</summary>
    LeftTurbulent,

    /// <summary>A bore passed from the transition into laminar flow; the event's number is Re.</summary>
    BecameLaminar,

    /// <summary>A bore passed from laminar flow into the transition; the event's number is Re.</summary>
    LeftLaminar,

    /// <summary>A bore passed from the transition into turbulent flow; the event's number is Re.</summary>
    BecameTurbulent,

    /// <summary>The low point reached its limit and the flow is held there from now on.</summary>
    VapourLimitBegins,

    /// <summary>The low point rose from its limit and the flow is free again.</summary>
    VapourLimitEnds,

    /// <summary>The low point reached its limit and the column parted.</summary>
    VapourBreak,

    /// <summary>Air reached the inlet.</summary>
    InletUncovered,

    /// <summary>The tank is empty but for a film.</summary>
    Emptied,

    /// <summary>The driving head is used up.</summary>
    Levelled,

    /// <summary>The level or the volume asked for was reached.</summary>
    TargetReached,

    /// <summary>The run time was over.</summary>
    TimeLimit,

    /// <summary>The line never carried a flow.</summary>
    NeverStarted,
}
