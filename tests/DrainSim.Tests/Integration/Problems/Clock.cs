namespace DrainSim.Tests.Integration.Problems;

/// <summary>y' = v, y(0) = 0 with v = 1 until a restart changes it: every step is exact, so what a test sees is the
/// driver alone.</summary>
public sealed class Clock : Problem
{
    public double Speed { get; set; } = 1;

    public override double[] InitialState => [0];

    public override void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt) => dydt[0] = Speed;

    public override void Exact(double t, Span<double> y) => y[0] = t;
}
