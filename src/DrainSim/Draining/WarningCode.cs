namespace DrainSim.Draining;

/// <summary>What makes a result less sure than it looks.</summary>
public enum WarningCode
{
    /// <summary>The line's inertia is not small; the number is <see cref="SteadinessCheck.InertiaRatio"/>.</summary>
    InertiaMatters,

    /// <summary>The surface's own velocity is not small; the number is <see cref="SteadinessCheck.SurfaceVelocityRatio"/>.</summary>
    SurfaceVelocityMatters,

    /// <summary>Much of the run is in the transition; the number is <see cref="SteadinessCheck.TransitionShare"/>.</summary>
    TransitionFlow,

    /// <summary>Air may be drawn into the inlet from some moment on; the number is the submergence then, m.</summary>
    AirMayBeDrawn,

    /// <summary>The headspace passed the tank's vacuum rating; the number is the largest vacuum, Pa.</summary>
    VacuumRatingPassed,

    /// <summary>The headspace passed the tank's pressure rating; the number is the largest overpressure, Pa.</summary>
    PressureRatingPassed,

    /// <summary>The low point passed the hose's vacuum rating; the number is the largest vacuum there, Pa.</summary>
    HoseMayFlatten,

    /// <summary>
    /// The low point stays below a third of an atmosphere for long, so that dissolved gas may gather at the crest; low
    /// confidence; the number is the share of the run, 1.
    /// </summary>
    GasMayGather,

    /// <summary>The inflow is more than the line ever carries at this level; the number is the inflow that it could carry, m³/s.</summary>
    NeverEmpties,

    /// <summary>
    /// The outer leg, in which air stood at the start, never runs so fast that it clears; the number is its largest Froude
    /// number, 1.
    /// </summary>
    AirStaysInLeg,

    /// <summary>
    /// A Bingham liquid flows turbulently, for which the published forms differ; the number is the share by which the friction
    /// of <see cref="Lines.DarbyMelson"/> is less than the one taken, 1, at the largest flow.
    /// </summary>
    FrictionDiffers,

    /// <summary>The least margin at the low point is thin; the number is the margin, Pa.</summary>
    ThinMargin,
}
