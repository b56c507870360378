namespace DrainSim.Liquids.Correlations;

/// <summary>DIPPR equation 101, for vapour pressures and viscosities.</summary>
/// <remarks><code>
/// ln y = C1 + C2/T + C3·ln T + C4·T^C5
///
/// y  vapour pressure, Pa, or viscosity, Pa·s
/// T  temperature, K
/// </code>
/// The range of the constants stands in the table's row. The last term is 0 where C4 = 0.
/// Source: Perry's Chemical Engineers' Handbook, 8th ed. (2008), tables 2-8 and 2-313.
/// </remarks>
internal sealed record Dippr101(double C1, double C2, double C3, double C4, double C5) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature) =>
        Math.Exp(C1 + C2 / temperature + C3 * Math.Log(temperature) + C4 * Math.Pow(temperature, C5));
}
