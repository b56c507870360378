namespace DrainSim.Tests.Integration.Problems;

/// <summary>y' = y·(1 − y), y(0) = 1/10. y = 1/(1 + 9·exp(−t)), half at t = ln 9.</summary>
public sealed class Logistic : Problem
{
    public override double[] InitialState => [0.1];

    public override void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt) => dydt[0] = y[0] * (1 - y[0]);

    public override void Exact(double t, Span<double> y) => y[0] = 1 / (1 + 9 * Math.Exp(-t));
}
