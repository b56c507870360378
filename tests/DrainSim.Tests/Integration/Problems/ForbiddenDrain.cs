namespace DrainSim.Tests.Integration.Problems;

/// <summary>The drain y' = −k·√y that has no derivative below zero, with a bound on the step that keeps it above:
/// at most the share of the time y/|y'| that is left at the present speed.</summary>
public sealed class ForbiddenDrain(double rate, double initial, double largestShare) : PowerDrain(0.5, rate, initial)
{
    public override void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt) =>
        dydt[0] = -Rate * Math.Sqrt(y[0]);

    public override double LargestStep(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt) =>
        largestShare * y[0] / Math.Abs(dydt[0]);
}
