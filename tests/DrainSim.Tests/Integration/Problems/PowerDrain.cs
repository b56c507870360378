using DrainSim.Integration;

namespace DrainSim.Tests.Integration.Problems;

/// <summary>y' = −k·y^p, p below 1: a vessel that runs empty at a finite time.</summary>
/// <remarks>
/// p = 1/2: head over a constant loss in a prism (Torricelli). p = 4/7: the same with friction that goes with Re^(−1/4).
/// p = 1/6: volume of a cone, whose area goes with V^(2/3). p = −1/6: a sphere's last film. y^(1−p) = y0^(1−p) − (1−p)·k·t.
/// </remarks>
public class PowerDrain(double exponent, double rate, double initial) : Problem
{
    public override double[] InitialState => [initial];

    protected double Rate => rate;

    /// <summary>When y is 0.</summary>
    public double EmptyTime => TimeAt(0);

    public override void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt) =>
        dydt[0] = y[0] > 0 ? -rate * Math.Pow(y[0], exponent) : 0;

    public override void Exact(double t, Span<double> y) =>
        y[0] = initial * Math.Pow(Math.Max(1 - t / EmptyTime, 0), 1 / (1 - exponent));

    public override void ErrorScale(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> scale) =>
        ErrorScales.Time(dydt, EmptyTime, 1e-15 * initial, scale);

    public double TimeAt(double level) =>
        (Math.Pow(initial, 1 - exponent) - Math.Pow(level, 1 - exponent)) / ((1 - exponent) * rate);
}
