using DrainSim.Integration;

namespace DrainSim.Tests.Integration.Problems;

/// <summary>y' = −1 above y = 1 and −y below, y(0) = 2: the derivative is continuous, its slope jumps at t = 1.
/// y = 2 − t, then exp(1 − t).</summary>
/// <remarks>Declared, it keeps to its branch until a restart at y = 1 lets it change over, as a system should.</remarks>
public sealed class Kinked : Problem
{
    public const double KinkTime = 1;

    private bool isDeclared;
    private bool isBelow;

    public override double[] InitialState => [2];

    public override void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt) =>
        dydt[0] = (isDeclared ? isBelow : y[0] <= 1) ? -y[0] : -1;

    public override void Exact(double t, Span<double> y) => y[0] = t < KinkTime ? 2 - t : Math.Exp(KinkTime - t);

    public static Kinked Declared()
    {
        Kinked kinked = new() { isDeclared = true };
        kinked.Answer = (_, _, _) => kinked.isBelow = true;
        return kinked.When((_, y, _) => y[0] - 1, EventAction.Restart, EventDirection.Falling);
    }
}
