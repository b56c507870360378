namespace DrainSim.Vessels;

/// <summary>The cubic between two rows of a strapping table, over the height x above the lower row.</summary>
/// <remarks><code>
/// V = x·(m0 + x·(c2 + x·c3)),   c2 = (3δ − 2m0 − m1)/h,   c3 = (m0 + m1 − 2δ)/h²,   δ = ΔV/h
///
/// h        distance of the rows, m
/// m0, m1   area at the lower and the upper row, m²
/// </code></remarks>
internal readonly struct TableInterval(double step, double volumeStep, double lowerArea, double upperArea)
{
    private readonly double c2 = (3 * volumeStep / step - 2 * lowerArea - upperArea) / step;
    private readonly double c3 = (lowerArea + upperArea - 2 * volumeStep / step) / (step * step);

    /// <summary>Volume above the lower row, m³.</summary>
    public double Volume(double x) => x * (lowerArea + x * (c2 + x * c3));

    /// <summary>Area, m².</summary>
    public double Area(double x) => lowerArea + x * (2 * c2 + 3 * x * c3);

    /// <summary>Growth of the area per height, m.</summary>
    public double AreaSlope(double x) => 2 * c2 + 6 * x * c3;
}
