namespace DrainSim.Liquids.Correlations;

/// <summary>True vapour pressure of a petroleum stock by two constants.</summary>
/// <param name="A">1</param>
/// <param name="B">°R</param>
/// <remarks><code>
/// P = exp(A − B/T)
///
/// P  true vapour pressure, psi
/// T  temperature, °R (1.8 K⁻¹ times that in K)
/// </code>
/// Tabulated in the source for 40 to 100 °F; within about 30 %.
/// Source: EPA AP-42, 5th ed., section 7.1 (1997), table 7.1-2.
/// </remarks>
internal sealed record StockPressure(double A, double B) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature) =>
        PoundPerSquareInch * Math.Exp(A - B / (1.8 * temperature));
}
