namespace DrainSim.Draining;

/// <summary>What an event function of the balance watches.</summary>
internal enum WatchKind
{
    /// <summary>The volume above the target.</summary>
    TargetReached,

    /// <summary>The volume above that at which a line's inlet uncovers.</summary>
    InletUncovers,

    /// <summary>The level above a vent on a line.</summary>
    AirBreakUncovers,

    /// <summary>The submergence of a line's inlet above the one at which air is drawn.</summary>
    AirDrawn,

    /// <summary>The margin at a line's low point in free flow.</summary>
    MarginVanishes,

    /// <summary>The head that is left to drive a line's flow held at the threshold.</summary>
    LiftExhausts,

    /// <summary>The part of a line's outer leg that its front has passed beyond the segment that it is in.</summary>
    FrontArrives,

    /// <summary>The flow of a line whose front has yet to reach the outlet.</summary>
    FrontStops,

    /// <summary>A line's driving head above the settled head.</summary>
    HeadSettles,

    /// <summary>The largest of all driving heads above the settled head.</summary>
    AllSettle,

    /// <summary>What a partly covered inlet lets in above what its line carries.</summary>
    BoreUncovers,

    /// <summary>A receiver's surface above the line's outlet.</summary>
    OutletCovers,

    /// <summary>A receiver's depth above its brim.</summary>
    ReceiverBrims,

    /// <summary>A line's flow about a limit of a flow regime.</summary>
    RegimePasses,

    /// <summary>The volume about a kink of the vessel.</summary>
    SectionPasses,

    /// <summary>The vacuum in the headspace about its rating.</summary>
    VacuumRatingPasses,

    /// <summary>The overpressure in the headspace about its rating.</summary>
    PressureRatingPasses,

    /// <summary>The pressure in the headspace about one at which a valve begins to open or is fully open.</summary>
    ValveMoves,

    /// <summary>The difference of inflow and outflow.</summary>
    FlowsBalance,

    /// <summary>The volume about the tank's capacity.</summary>
    TankBrims,

    /// <summary>The time, or the level, of an act.</summary>
    ActFalls,

    /// <summary>The time of a point of the inflow's table.</summary>
    InflowTurns,
}
