namespace DrainSim.Liquids.Correlations;

/// <summary>DIPPR equation 105, for the density of a saturated liquid (Rackett's form).</summary>
/// <param name="C1">mol/m³</param>
/// <param name="C2">1</param>
/// <param name="C3">critical temperature, K</param>
/// <param name="C4">1</param>
/// <param name="M">molar mass, kg/mol</param>
/// <remarks><code>
/// ρ = M · C1 / C2^[1 + (1 − T/C3)^C4]
///
/// ρ  density, kg/m³ (the source gives mol/dm³, without M)
/// T  temperature, K
/// </code>
/// The range of the constants stands in the table's row; always below C3.
/// Source: Perry's Chemical Engineers' Handbook, 8th ed. (2008), table 2-32.
/// </remarks>
internal sealed record Dippr105(double C1, double C2, double C3, double C4, double M) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature) =>
        M * C1 / Math.Pow(C2, 1 + Math.Pow(1 - temperature / C3, C4));
}
