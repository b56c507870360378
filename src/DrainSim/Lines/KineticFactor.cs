namespace DrainSim.Lines;

/// <summary>Kinetic energy factor α of the velocity profile.</summary>
/// <remarks>
/// <code>α = 2 for Re ≤ 2000, 1 for Re ≥ 4000, linear in Re between</code>
/// 2 is exact for the laminar parabola; 1 stands for the 1.04 to 1.08 of turbulent profiles. On the bridge
/// α·Re² rises up to Re 4000, where its slope reaches 0, so that a jet's velocity head never falls with the flow.
/// </remarks>
public static class KineticFactor
{
    private const double Span = FrictionFactor.TurbulentLimit - FrictionFactor.LaminarLimit;

    /// <summary>α, 1: 2 in laminar flow, 1 in turbulent flow, linear in Re between the limits.</summary>
    /// <param name="reynolds">Reynolds number, 1; at least 0</param>
    public static double At(double reynolds) => At(reynolds, out _);

    /// <summary>α, 1, and its slope dα/d ln Re.</summary>
    internal static double At(double re, out double slope)
    {
        if (re >= FrictionFactor.TurbulentLimit)
        {
            slope = 0;
            return 1;
        }
        if (re <= FrictionFactor.LaminarLimit)
        {
            slope = 0;
            return 2;
        }
        slope = -re / Span;
        return 2 - (re - FrictionFactor.LaminarLimit) / Span;
    }
}
