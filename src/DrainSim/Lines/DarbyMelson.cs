namespace DrainSim.Lines;

/// <summary>Friction of a Bingham liquid in a smooth pipe, from laminar to turbulent flow, as one formula.</summary>
/// <remarks><code>
/// f' = (f_L^m + f_T^m)^(1/m)        m = 1.7 + 40 000/Re
/// f_T = 10^a·Re^−0.193              a = −1.47·(1 + 0.146·exp(−2.9e−5·He))
///
/// f'   Fanning friction factor, 1; f_L that of laminar flow
/// Re   ρ·V·D/μ_p, 1
/// He   ρ·D²·τ_y/μ_p², 1 (Hedström number)
/// </code>
/// A fit to Hedström numbers of some thousands and more. It does not go over into the Newtonian law: at He 0 it is half of it,
/// and below it everywhere. So a run takes the Newtonian law for μ_p, and this formula tells how much less is published.
/// Source: R. Darby and J. Melson, Chem. Eng., 28 December 1981, 59–61.
/// </remarks>
public static class DarbyMelson
{
    /// <summary>The Darcy friction factor, 1.</summary>
    /// <param name="reynolds">Re, 1; greater than 0</param>
    /// <param name="hedstrom">He, 1; at least 0</param>
    /// <param name="laminar">Darcy friction factor of laminar flow at these, 1; greater than 0</param>
    public static double FrictionFactor(double reynolds, double hedstrom, double laminar)
    {
        double a = -1.47 * (1 + 0.146 * Math.Exp(-2.9e-5 * hedstrom));
        double turbulent = 4 * Math.Pow(10, a) * Math.Pow(reynolds, -0.193);
        double m = 1.7 + 40000 / reynolds;
        double larger = Math.Max(laminar, turbulent), smaller = Math.Min(laminar, turbulent);
        return larger * Math.Pow(1 + Math.Pow(smaller / larger, m), 1 / m); // the sum, so written that nothing overflows
    }
}
