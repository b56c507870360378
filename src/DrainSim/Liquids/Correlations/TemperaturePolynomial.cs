using MathNet.Numerics;

namespace DrainSim.Liquids.Correlations;

/// <summary>A polynomial in the Celsius temperature.</summary>
/// <param name="C">c1, c2, … in rising powers</param>
/// <remarks><code>
/// y = c1 + c2·t + c3·t² + …
///
/// y  the property, SI
/// t  temperature, °C
/// </code>
/// The source and the range of the constants stand in the table's row.
/// </remarks>
internal sealed record TemperaturePolynomial(double[] C) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature) => Polynomial.Evaluate(temperature - IcePoint, C);
}
