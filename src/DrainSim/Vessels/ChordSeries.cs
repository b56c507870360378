namespace DrainSim.Vessels;

/// <summary>The area under a chord of a dished or coned end, for a short chord.</summary>
/// <remarks><code>
/// s − (1 − s²)·artanh s = Σ 2·s^(2n+1)/((2n − 1)(2n + 1)),   n = 1, 2, …
/// (1 + r²)·arctan r − r = the same with r² = −s² and r³ in front
/// </code></remarks>
internal static class ChordSeries
{
    private const int Terms = 14;

    /// <summary>Coefficient of the term s^(2i + 3), 1.</summary>
    public static double Coefficient(int i) => 2.0 / ((2 * i + 1.0) * (2 * i + 3));

    /// <summary>x³·Σ c_i·uⁱ; to the last bits for |u| up to 1/16.</summary>
    /// <param name="x">half the chord as a share of its radius, 1</param>
    /// <param name="u">x² for the cone, −x² for the dish</param>
    public static double Sum(double x, double u)
    {
        double sum = 0;
        for (int i = Terms - 1; i >= 0; i--)
            sum = sum * u + Coefficient(i);
        return x * x * x * sum;
    }
}
