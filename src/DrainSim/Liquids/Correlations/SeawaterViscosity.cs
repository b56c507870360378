namespace DrainSim.Liquids.Correlations;

/// <summary>Viscosity of sea water.</summary>
/// <param name="S">salinity, kg/kg</param>
/// <remarks><code>
/// μ = μ_w · (1 + A·S + B·S²)                                              (22)
/// A = 1.541 + 1.998e−2·t − 9.52e−5·t²
/// B = 7.974 − 7.561e−2·t + 4.724e−4·t²
/// μ_w = 4.2844e−5 + 1 / (0.157·(t + 64.993)² − 91.296)                    (23)
///
/// μ, μ_w  viscosity of sea water and of pure water, Pa·s
/// t       temperature, °C
/// </code>
/// Valid for 0 ≤ t ≤ 180 °C and 0 ≤ S ≤ 0.15, within 1.5 %.
/// Source: M. H. Sharqawy, J. H. Lienhard, S. M. Zubair, Desalination and Water Treatment 16 (2010) 354–380.
/// </remarks>
internal sealed record SeawaterViscosity(double S) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature)
    {
        double t = temperature - IcePoint;
        double a = 1.541 + 1.998e-2 * t - 9.52e-5 * t * t;
        double b = 7.974 - 7.561e-2 * t + 4.724e-4 * t * t;
        double water = 4.2844e-5 + 1 / (0.157 * (t + 64.993) * (t + 64.993) - 91.296);
        return water * (1 + a * S + b * S * S);
    }
}
