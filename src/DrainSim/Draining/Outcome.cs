namespace DrainSim.Draining;

/// <summary>How a run ended.</summary>
public enum Outcome
{
    /// <summary>Nothing is left that the line can reach but a film, and the tank holds no heel.</summary>
    Emptied,

    /// <summary>Air reached the inlet; a heel is left.</summary>
    InletUncovered,

    /// <summary>The low point reached the vapour pressure or the least pressure allowed.</summary>
    VapourBreak,

    /// <summary>A vent on the line was uncovered.</summary>
    AirBreak,

    /// <summary>The driving head is used up: level with the outlet or with the receiver.</summary>
    Levelled,

    /// <summary>The closed headspace holds the liquid up.</summary>
    VacuumHeld,

    /// <summary>The driving head no longer exceeds the liquid's yield stress.</summary>
    YieldHeld,

    /// <summary>The inflow equals the outflow.</summary>
    Balanced,

    /// <summary>The receiver reached its brim.</summary>
    ReceiverFull,

    /// <summary>More ran in than out until the tank ran over.</summary>
    Overflowed,

    /// <summary>The level or the volume asked for was reached.</summary>
    TargetReached,

    /// <summary>The run time came first.</summary>
    TimeLimit,

    /// <summary>The line never carried a flow; <see cref="NoStart"/> says why.</summary>
    NeverStarted,
}
