namespace DrainSim.Liquids.Correlations;

/// <summary>Saturation pressure of ordinary water, IAPWS-IF97.</summary>
/// <param name="N">n1 to n10 of the release, in this order</param>
/// <remarks><code>
/// ps/p* = [ 2C / (−B + (B² − 4AC)^½) ]^4                                   (30)
/// A = ϑ² + n1·ϑ + n2,  B = n3·ϑ² + n4·ϑ + n5,  C = n6·ϑ² + n7·ϑ + n8
/// ϑ = Ts/T* + n9 / (Ts/T* − n10)
///
/// ps  saturation pressure, Pa;  p* = 1 MPa
/// Ts  saturation temperature, K;  T* = 1 K
/// </code>
/// Valid for 273.15 ≤ T ≤ 647.096 K, within 0.03 %.
/// Source: IAPWS R7-97(2012), equations 29b and 30.
/// </remarks>
internal sealed record SaturatedWaterPressure(IReadOnlyList<double> N) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature)
    {
        double theta = temperature + N[8] / (temperature - N[9]);
        double a = theta * theta + N[0] * theta + N[1];
        double b = N[2] * theta * theta + N[3] * theta + N[4];
        double c = N[5] * theta * theta + N[6] * theta + N[7];
        double root = 2 * c / (-b + Math.Sqrt(b * b - 4 * a * c));
        return 1e6 * Math.Pow(root, 4);
    }
}
