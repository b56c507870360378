namespace DrainSim.Liquids.Correlations;

/// <summary>Wagner's vapour pressure equation in its 2.5, 5 form.</summary>
/// <param name="A">1</param>
/// <param name="B">1</param>
/// <param name="C">1</param>
/// <param name="D">1</param>
/// <param name="Tc">critical temperature, K</param>
/// <param name="Pc">critical pressure, Pa</param>
/// <remarks><code>
/// ln(p/pc) = (Tc/T) · (A·x + B·x^1.5 + C·x^2.5 + D·x^5),  x = 1 − T/Tc
///
/// p  vapour pressure, Pa
/// T  temperature, K
/// </code>
/// The range of the constants stands in the table's row; always below Tc.
/// Source: VDI Heat Atlas, 2nd ed. (2010), chapter D3.1.
/// </remarks>
internal sealed record WagnerPressure(double A, double B, double C, double D, double Tc, double Pc) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature)
    {
        double x = 1 - temperature / Tc;
        double sum = A * x + B * Math.Pow(x, 1.5) + C * Math.Pow(x, 2.5) + D * Math.Pow(x, 5);
        return Pc * Math.Exp(sum * Tc / temperature);
    }
}
