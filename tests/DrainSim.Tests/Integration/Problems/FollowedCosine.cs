namespace DrainSim.Tests.Integration.Problems;

/// <summary>y' = −λ·(y − cos t) − sin t, y(0) = 1 (Prothero and Robinson). y = cos t whatever λ; mildly stiff.</summary>
public sealed class FollowedCosine(double pull) : Problem
{
    public override double[] InitialState => [1];

    public override void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt) =>
        dydt[0] = -pull * (y[0] - Math.Cos(t)) - Math.Sin(t);

    public override void Exact(double t, Span<double> y) => y[0] = Math.Cos(t);
}
