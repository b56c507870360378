namespace DrainSim.Tests.Integration.Problems;

/// <summary>y' = −k·y, y(0) = 1: laminar flow out of a prism. y = exp(−k·t).</summary>
public sealed class ExponentialDecay(double rate = 1) : Problem
{
    public override double[] InitialState => [1];

    public override void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt) => dydt[0] = -rate * y[0];

    public override void Exact(double t, Span<double> y) => y[0] = Math.Exp(-rate * t);

    public double TimeAt(double level) => -Math.Log(level) / rate;
}
