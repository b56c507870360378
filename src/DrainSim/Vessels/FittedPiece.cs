using MathNet.Numerics.Integration;

namespace DrainSim.Vessels;

/// <summary>One piece of a <see cref="FittedVolume"/>, as two Chebyshev series.</summary>
/// <remarks><code>
/// A = σ^a·P(σ),   V = V0 + σ^m·Q(σ),   σ = s − s0,   m = a + b + 1
/// Q(σ) = ∫ τ^(m−1)·P(σ·τ)·e(s0 + σ·τ) dτ over 0 ≤ τ ≤ 1
/// </code>
/// P and e are as in <see cref="FittedQuantity"/>. Q is made from the fitted P, so that dV/dh is A as it is
/// represented; with the powers in front both keep their relative accuracy down to σ = 0.
/// </remarks>
internal sealed class FittedPiece
{
    private const int Nodes = 24;
    private const double Resolved = 4e-15;
    private const double Negligible = 1e-16;
    private static readonly GaussLegendreRule Gauss = new(0, 1, 32);

    private readonly double start;
    private readonly double startVolume;
    private readonly int areaPower;
    private readonly int volumePower;
    private readonly double[] area;
    private readonly double[] volume;

    public FittedPiece(double start, double end, double startVolume, double[] area, FittedQuantity quantity)
    {
        this.start = start;
        this.startVolume = startVolume;
        this.area = Trimmed(area);
        End = end;
        areaPower = quantity.AreaPower;
        volumePower = quantity.AreaPower + quantity.RisePower + 1;
        volume = Trimmed(Fit(start, end, s => MeanVolume(s - start, quantity.Rise)));
    }

    /// <summary>Greatest s of the piece.</summary>
    public double End { get; }

    /// <summary>Chebyshev coefficients of the area with its power taken out.</summary>
    public static double[] FitArea(double start, double end, FittedQuantity quantity) => Fit(start, end, quantity.Area);

    /// <summary>Whether the last coefficients are down to rounding.</summary>
    public static bool IsResolved(double[] coefficients)
    {
        double tail = Math.Abs(coefficients[^1]) + Math.Abs(coefficients[^2]) + Math.Abs(coefficients[^3]);
        return tail <= Resolved * coefficients.Max(Math.Abs);
    }

    /// <summary>The volume at s, m³.</summary>
    public double Volume(double s) => startVolume + Power(s - start, volumePower) * Sum(volume, Scaled(s));

    /// <summary>The area at s, m².</summary>
    public double Area(double s) => Power(s - start, areaPower) * Sum(area, Scaled(s));

    private double Scaled(double s) => 2 * (s - start) / (End - start) - 1;

    private double MeanVolume(double sigma, Func<double, double> rise)
    {
        double sum = 0;
        for (int i = 0; i < Gauss.Order; i++)
        {
            double tau = Gauss.GetAbscissa(i);
            double s = start + sigma * tau;
            sum += Gauss.GetWeight(i) * Power(tau, volumePower - 1) * Sum(area, Scaled(s)) * rise(s);
        }
        return sum;
    }

    // Drops what is below rounding from the end: half of the terms, in the volume.
    private static double[] Trimmed(double[] coefficients)
    {
        double rounding = Negligible * coefficients.Max(Math.Abs);
        int length = coefficients.Length;
        while (length > 1 && Math.Abs(coefficients[length - 1]) <= rounding)
            length--;
        return coefficients[..length];
    }

    private static double Power(double x, int power)
    {
        double product = 1;
        for (int i = 0; i < power; i++)
            product *= x;
        return product;
    }

    private static double[] Fit(double start, double end, Func<double, double> f)
    {
        double[] values = new double[Nodes];
        for (int j = 0; j < Nodes; j++)
            values[j] = f(start + (end - start) * (1 + Math.Cos(Math.PI * (j + 0.5) / Nodes)) / 2);
        double[] coefficients = new double[Nodes];
        for (int i = 0; i < Nodes; i++)
        {
            double sum = 0;
            for (int j = 0; j < Nodes; j++)
                sum += values[j] * Math.Cos(Math.PI * i * (j + 0.5) / Nodes);
            coefficients[i] = sum * (i == 0 ? 1 : 2) / Nodes;
        }
        return coefficients;
    }

    // Clenshaw's recurrence.
    private static double Sum(double[] coefficients, double x)
    {
        double next = 0, afterNext = 0;
        for (int i = coefficients.Length - 1; i > 0; i--)
            (next, afterNext) = (coefficients[i] + 2 * x * next - afterNext, next);
        return coefficients[0] + x * next - afterNext;
    }
}
