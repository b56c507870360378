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

    /// <summary>The least margin at the low point is thin; the number is the margin, Pa.</summary>
    ThinMargin,
}
