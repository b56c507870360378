namespace DrainSim.Studies.Forecasting;

/// <summary>Whether the readings can tell the fitted parameters apart.</summary>
/// <remarks>
/// Judged by the condition index of the sensitivities, each column scaled to length 1: beyond 30 the dependence is strong,
/// beyond 100 it spoils the estimates (D. A. Belsley, E. Kuh, R. E. Welsch, Regression Diagnostics, 1980, section 3.2).
/// </remarks>
public enum Separation
{
    /// <summary>Each has its own effect on the readings.</summary>
    Apart,

    /// <summary>Their effects are much alike: trust the forecast, mistrust the single values.</summary>
    Hardly,

    /// <summary>Their effects are the same, or one has none: fit fewer.</summary>
    NotApart,
}
