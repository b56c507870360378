namespace DrainSim.Liquids.Correlations;

/// <summary>Density of a petroleum product from that at 15 °C.</summary>
/// <param name="R15">ρ15, density at 15 °C, kg/m³</param>
/// <param name="K0">constant of the product group, kg²/(m⁶·°C)</param>
/// <param name="K1">constant of the product group, kg/(m³·°C)</param>
/// <remarks><code>
/// ρ = ρ15 · exp[ −α·Δt·(1 + 0.8·α·Δt) ]
/// α = K0/ρ15² + K1/ρ15
///
/// ρ   density, kg/m³
/// α   thermal expansion at 15 °C, 1/°C
/// Δt  temperature above 15 °C, °C
/// </code>
/// Valid for −18 to 95 °C (from memory); measured pairs of petrol, kerosene, diesel and lubricants lie
/// within 0.6 %. Source: API MPMS chapter 11.1 (ASTM D1250-80).
/// </remarks>
internal sealed record PetroleumDensity(double R15, double K0, double K1) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature)
    {
        double alpha = K0 / (R15 * R15) + K1 / R15;
        double x = alpha * (temperature - IcePoint - 15);
        return R15 * Math.Exp(-x * (1 + 0.8 * x));
    }
}
