using MathNet.Numerics;

namespace DrainSim.Liquids.Correlations;

/// <summary>Density of air-free water at 101.325 kPa.</summary>
/// <param name="A">a0 to a5 of the numerator, rising powers</param>
/// <param name="B">b of the denominator, 1/°C</param>
/// <remarks><code>
/// ρ = (a0 + a1·t + a2·t² + a3·t³ + a4·t⁴ + a5·t⁵) / (1 + b·t)
///
/// ρ  density, kg/m³
/// t  temperature, °C
/// </code>
/// Valid for 0 ≤ t ≤ 100 °C (fitted to 150 °C), within 0.01 %.
/// Source: G. S. Kell, J. Chem. Eng. Data 20 (1975) 97–105.
/// </remarks>
internal sealed record KellDensity(double[] A, double B) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature)
    {
        double t = temperature - IcePoint;
        return Polynomial.Evaluate(t, A) / (1 + B * t);
    }
}
