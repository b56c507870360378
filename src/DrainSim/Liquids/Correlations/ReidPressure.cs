namespace DrainSim.Liquids.Correlations;

/// <summary>True vapour pressure of a refined petroleum stock from its Reid vapour pressure.</summary>
/// <param name="Reid">Reid vapour pressure RVP, Pa; 7 to 138 kPa (1 to 20 psi)</param>
/// <param name="S">slope of the ASTM D86 distillation curve at 10 % evaporated, °F per %; 3.0 for petrol</param>
/// <remarks><code>
/// P = exp(A − B/T)
/// A = 15.64 − 1.854·S^½ − (0.8742 − 0.3280·S^½)·ln RVP
/// B = 8 742 − 1 042·S^½ − (1 049 − 179.4·S^½)·ln RVP
///
/// P    true vapour pressure, psi
/// RVP  Reid vapour pressure, psi
/// T    temperature, °R (1.8 K⁻¹ times that in K)
/// </code>
/// Tabulated in the source for 40 to 100 °F; a stock's own distillation moves the value by about 15 %.
/// Source: EPA AP-42, 5th ed., section 7.1 (1997), figures 7.1-14b and 7.1-15b; first in API Publ. 2517.
/// </remarks>
internal sealed record ReidPressure(double Reid, double S) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature)
    {
        double ln = Math.Log(Reid / PoundPerSquareInch);
        double root = Math.Sqrt(S);
        double a = 15.64 - 1.854 * root - (0.8742 - 0.3280 * root) * ln;
        double b = 8742 - 1042 * root - (1049 - 179.4 * root) * ln;
        return PoundPerSquareInch * Math.Exp(a - b / (1.8 * temperature));
    }
}
