namespace DrainSim.Tests.Integration.Problems;

/// <summary>y' = −1 above y = 1 and −y below, y(0) = 2: the derivative is continuous, its slope jumps at t = 1.
/// y = 2 − t, then exp(1 − t).</summary>
public sealed class Kinked : Problem
{
    public const double KinkTime = 1;

    public override double[] InitialState => [2];

    public override void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt) =>
        dydt[0] = y[0] > 1 ? -1 : -y[0];

    public override void Exact(double t, Span<double> y) => y[0] = t < KinkTime ? 2 - t : Math.Exp(KinkTime - t);
}
