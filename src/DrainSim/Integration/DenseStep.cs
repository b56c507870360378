namespace DrainSim.Integration;

/// <summary>The solution over one step as a polynomial of degree 4 in each component.</summary>
/// <remarks>
/// Whatever stepper made it, <c>y_i(t) = c0 + c1·θ + c2·θ² + c3·θ³ + c4·θ⁴</c> with <c>θ = (t − Start)/Length</c>.
/// A view: it is valid until the trajectory that owns the coefficients is used for another run.
/// </remarks>
public readonly ref struct DenseStep
{
    /// <summary>Number of coefficients of a component.</summary>
    internal const int Terms = 5;

    private readonly ReadOnlySpan<double> coefficients;

    internal DenseStep(double start, double end, double length, ReadOnlySpan<double> coefficients)
    {
        (Start, End, Length) = (start, end, length);
        this.coefficients = coefficients;
    }

    /// <summary>Time at which the step begins.</summary>
    public double Start { get; }

    /// <summary>Time at which the step ends; where an event cut it, that of the event.</summary>
    public double End { get; }

    /// <summary>Length of the step before it was cut.</summary>
    internal double Length { get; }

    /// <summary>Writes y(t).</summary>
    /// <param name="t">time from <see cref="Start"/> to <see cref="End"/>; the caller keeps it there</param>
    /// <param name="y">receives one value per component</param>
    public void Evaluate(double t, Span<double> y)
    {
        double theta = (t - Start) / Length;
        for (int i = 0; i < y.Length; i++)
        {
            ReadOnlySpan<double> c = coefficients.Slice(i * Terms, Terms);
            y[i] = c[0] + theta * (c[1] + theta * (c[2] + theta * (c[3] + theta * c[4])));
        }
    }

    /// <summary>Writes dy/dt at t: the slope of the polynomial, one order less accurate than the value.</summary>
    /// <param name="t">time from <see cref="Start"/> to <see cref="End"/>; the caller keeps it there</param>
    /// <param name="dydt">receives one value per component</param>
    public void EvaluateDerivative(double t, Span<double> dydt)
    {
        double theta = (t - Start) / Length;
        for (int i = 0; i < dydt.Length; i++)
        {
            ReadOnlySpan<double> c = coefficients.Slice(i * Terms, Terms);
            dydt[i] = (c[1] + theta * (2 * c[2] + theta * (3 * c[3] + theta * 4 * c[4]))) / Length;
        }
    }
}
