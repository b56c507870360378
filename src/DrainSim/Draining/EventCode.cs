namespace DrainSim.Draining;

/// <summary>What a moment of a run is marked for.</summary>
public enum EventCode
{
    /// <summary>Another tenth of the starting volume is gone; the event's number is how many.</summary>
    TenthGone,

    /// <summary>The liquid's front reached the outlet: the line runs full.</summary>
    RunsFull,

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

    /// <summary>The submergence fell below the design depth of some published form; the event's number is that depth, m.</summary>
    AirMayBeDrawn,

    /// <summary>The submergence fell below the least of the published forms; the event's number is that depth, m.</summary>
    AirDrawn,

    /// <summary>The inlet's bore is no longer covered; it goes on partly full.</summary>
    BoreUncovered,

    /// <summary>The receiver covered the outlet.</summary>
    OutletCovered,

    /// <summary>The receiver fell below the outlet.</summary>
    OutletFreed,

    /// <summary>The headspace passed the tank's vacuum rating; the event's number is the rating, Pa.</summary>
    VacuumRatingPassed,

    /// <summary>The headspace passed the tank's pressure rating; the event's number is the rating, Pa.</summary>
    PressureRatingPassed,

    /// <summary>The hose's vacuum rating was passed at the low point; the event's number is the rating, Pa.</summary>
    HoseRatingPassed,

    /// <summary>Something was done; the event's number is the place in the timeline, from 1.</summary>
    Act,

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

    /// <summary>The vent on the line was uncovered.</summary>
    AirBreak,

    /// <summary>The closed headspace holds the liquid up.</summary>
    VacuumHeld,

    /// <summary>The liquid's yield stress holds it.</summary>
    YieldHeld,

    /// <summary>The inflow equals the outflow.</summary>
    Balanced,

    /// <summary>The receiver reached its brim.</summary>
    ReceiverFull,

    /// <summary>The tank ran over.</summary>
    Overflowed,

    /// <summary>The run time was over.</summary>
    TimeLimit,

    /// <summary>The line never carried a flow.</summary>
    NeverStarted,
}
