namespace DrainSim.Integration;

/// <summary>A system of ordinary differential equations dy/dt = f(t, y).</summary>
/// <remarks>
/// No member has a default body: a default called through a struct type argument would box it at every
/// step. A system that is a struct is copied, so what changes in it stands behind a reference.
/// </remarks>
public interface IOdeSystem
{
    /// <summary>Number of components of y; at least 1 and constant during a run.</summary>
    int Dimension { get; }

    /// <summary>Writes f(t, y).</summary>
    /// <param name="t">time</param>
    /// <param name="y">state; a trial state within a step may lie outside the domain</param>
    /// <param name="dydt">receives the derivative; NaN or an infinity in any component says that y is
    /// outside the domain, and the step is then tried again shorter</param>
    void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt);

    /// <summary>Whether a quick part of the solution follows a slow one so closely that explicit steps would have to be
    /// short for stability alone; asked at the start and after every restart. Implicit steps are taken then.</summary>
    bool IsStiff { get; }

    /// <summary>Writes the slopes of f(t, y); called for implicit steps alone.</summary>
    /// <param name="t">time at the start of a step</param>
    /// <param name="y">state there</param>
    /// <param name="dydt">derivative there</param>
    /// <param name="byState">receives ∂f_i/∂y_j, row i by row</param>
    /// <param name="byTime">receives ∂f_i/∂t</param>
    /// <remarks>They are part of the method, not of an iteration: a wrong one costs accuracy.</remarks>
    void Jacobian(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> byState, Span<double> byTime);

    /// <summary>Writes the magnitude that the relative tolerance of each component is measured against.</summary>
    /// <param name="t">time at an end of a step</param>
    /// <param name="y">state there</param>
    /// <param name="dydt">derivative there</param>
    /// <param name="scale">receives one value per component, in its unit; greater than 0.
    /// <see cref="ErrorScales"/> has the usual ones</param>
    void ErrorScale(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> scale);

    /// <summary>The longest step that may start here; <see cref="double.PositiveInfinity"/> where any may. Where it
    /// no longer moves the time, the run ends with <see cref="EndingReason.StepTooSmall"/>.</summary>
    /// <param name="t">time at the start of the step</param>
    /// <param name="y">state there</param>
    /// <param name="dydt">derivative there</param>
    double LargestStep(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt);
}
