namespace DrainSim.Liquids.Correlations;

/// <summary>PPDS equation 9, for the viscosity of a liquid.</summary>
/// <param name="A">1</param>
/// <param name="B">1</param>
/// <param name="C">K</param>
/// <param name="D">K</param>
/// <param name="E">Pa·s</param>
/// <remarks><code>
/// μ = E · exp[ A·x^(1/3) + B·x^(4/3) ],  x = (C − T)/(T − D)
///
/// μ  viscosity, Pa·s
/// T  temperature, K; the cube root keeps the sign of x, so that T may pass C
/// </code>
/// The range of the constants stands in the table's row; always above D.
/// Source: VDI Heat Atlas, 2nd ed. (2010), chapter D3.1.
/// </remarks>
internal sealed record Ppds9Viscosity(double A, double B, double C, double D, double E) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature)
    {
        double x = (C - temperature) / (temperature - D);
        double root = Math.Cbrt(x);
        return E * Math.Exp(A * root + B * x * root);
    }
}
