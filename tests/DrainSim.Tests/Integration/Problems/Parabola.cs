namespace DrainSim.Tests.Integration.Problems;

/// <summary>y' = 2·(t − v), y(0) = v² + c. y = (t − v)² + c: a double root at v for c = 0, two roots v ± √−c below.</summary>
public sealed class Parabola(double vertex, double least) : Problem
{
    public override double[] InitialState => [vertex * vertex + least];

    public override void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt) => dydt[0] = 2 * (t - vertex);

    public override void Exact(double t, Span<double> y) => y[0] = (t - vertex) * (t - vertex) + least;
}
