namespace DrainSim.Liquids.Correlations;

/// <summary>PPDS equation 2, for the density of a saturated liquid.</summary>
/// <param name="Rc">ρc, critical density, kg/m³</param>
/// <param name="A">kg/m³</param>
/// <param name="B">kg/m³</param>
/// <param name="C">kg/m³</param>
/// <param name="D">kg/m³</param>
/// <param name="Tc">critical temperature, K</param>
/// <remarks><code>
/// ρ = ρc + A·x^0.35 + B·x^(2/3) + C·x + D·x^(4/3),  x = 1 − T/Tc
///
/// ρ  density, kg/m³
/// T  temperature, K
/// </code>
/// The range of the constants stands in the table's row; always below Tc.
/// Source: VDI Heat Atlas, 2nd ed. (2010), chapter D3.1.
/// </remarks>
internal sealed record Ppds2Density(double Rc, double A, double B, double C, double D, double Tc) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature)
    {
        double x = 1 - temperature / Tc;
        return Rc + A * Math.Pow(x, 0.35) + B * Math.Pow(x, 2.0 / 3) + C * x + D * Math.Pow(x, 4.0 / 3);
    }
}
