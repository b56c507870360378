namespace DrainSim.Draining;

/// <summary>How fair the picture of a quasi-steady flow is for a run.</summary>
/// <param name="InertiaRatio">largest ratio of the line's inertia time to the time the head takes to change, 1</param>
/// <param name="SurfaceVelocityRatio">largest ratio of the surface's velocity head to the driving head, 1</param>
/// <param name="TransitionShare">share of the run time with a Reynolds number between 2000 and 4000, 1</param>
public sealed record SteadinessCheck(double InertiaRatio, double SurfaceVelocityRatio, double TransitionShare);
