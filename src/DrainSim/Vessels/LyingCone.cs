namespace DrainSim.Vessels;

/// <summary>A cone at the end of a lying shell.</summary>
/// <remarks><code>
/// V = d·R²·K/3,   K = φ + M³·arcosh(1/M) − 2·M·√(1 − M²),   M = cos φ = 1 − h/R
/// A = d·R·[s − M²·artanh s],   s = sin φ
///
/// R   radius of the shell, m
/// d   depth of the cone, m
/// </code>
/// Source: D. Jones, Computing Fluid Tank Volumes, conical heads; note arcosh(1/M) = artanh s. Below
/// s = 1/4 both cancel and their series in s are summed instead.
/// </remarks>
internal sealed class LyingCone(double radius, double depth) : LyingHead
{
    private const double SeriesEnds = 0.25;
    private static readonly double[] KSeries = WorkOutKSeries(terms: 14);

    public override double? Kink => radius;

    public override double Volume(double h, double phi)
    {
        double s = Math.Sin(phi);
        double m = 1 - h / radius;
        double k = s < SeriesEnds
            ? s * s * s * s * s * Sum(KSeries, s * s)
            : phi - 2 * m * s + (m > 0 ? m * m * m * Math.Log((1 + s) / m) : 0);
        return depth * radius * radius / 3 * k;
    }

    public override double Area(double h)
    {
        double s = Math.Sqrt(h * (2 * radius - h)) / radius;
        double m = 1 - h / radius;
        return depth * radius * (s < SeriesEnds
            ? ChordSeries.Sum(s, s * s)
            : s - (m > 0 ? m * m * Math.Log((1 + s) / m) : 0));
    }

    private static double Sum(double[] coefficients, double u)
    {
        double sum = 0;
        for (int i = coefficients.Length - 1; i >= 0; i--)
            sum = sum * u + coefficients[i];
        return sum;
    }

    // K = ∫ 3·sin φ·[s − M²·artanh s] dφ with dφ = ds/√(1 − s²): the product of the two series, term by term.
    private static double[] WorkOutKSeries(int terms)
    {
        double[] k = new double[terms];
        double inverseRoot = 1;
        for (int j = 0; j < terms; j++)
        {
            for (int i = j; i < terms; i++)
                k[i] += inverseRoot * ChordSeries.Coefficient(i - j);
            inverseRoot *= (2 * j + 1.0) / (2 * j + 2);
        }
        for (int i = 0; i < terms; i++)
            k[i] *= 3.0 / (2 * i + 5);
        return k;
    }
}
