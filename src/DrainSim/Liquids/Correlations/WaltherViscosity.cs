namespace DrainSim.Liquids.Correlations;

/// <summary>Walther's equation for the viscosity of an oil.</summary>
/// <param name="A">1</param>
/// <param name="B">1</param>
/// <param name="Density">density of the same oil</param>
/// <remarks><code>
/// log10 log10(ν + 0.7) = A − B·log10 T,  μ = ν·ρ
///
/// ν  kinematic viscosity, mm²/s
/// T  temperature, K
/// μ  viscosity, Pa·s (with ν in m²/s)
/// ρ  density, kg/m³
/// </code>
/// Valid for ν above 2 mm²/s; below, the standard adds terms to 0.7. The range of the constants stands in
/// the table's row. Source: ASTM D341.
/// </remarks>
internal sealed record WaltherViscosity(double A, double B, Correlation Density) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature)
    {
        double z = Math.Pow(10, Math.Pow(10, A - B * Math.Log10(temperature)));
        return 1e-6 * (z - 0.7) * Density.At(temperature);
    }
}
