using DrainSim.Integration;

namespace DrainSim.Tests.Integration.Problems;

/// <summary>Robertson's three reactions: the classic of stiffness, over eleven decades of time; known at its end alone.</summary>
/// <remarks>
/// y1' = −0.04·y1 + 1e4·y2·y3, y2' = 0.04·y1 − 1e4·y2·y3 − 3e7·y2², y3' = 3e7·y2². The end is that of F. Mazzia, C. Magherini, Test
/// Set for Initial Value Problem Solvers, release 2.4 (2008), problem ROBER (from memory).
/// </remarks>
public sealed class Robertson : Problem
{
    public const double End = 1e11;

    public override double[] InitialState => [1, 0, 0];

    public override void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt)
    {
        double gain = 0.04 * y[0] - 1e4 * y[1] * y[2], loss = 3e7 * y[1] * y[1];
        (dydt[0], dydt[1], dydt[2]) = (-gain, gain - loss, loss);
    }

    public override void Jacobian(
        double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> byState, Span<double> byTime)
    {
        ReadOnlySpan<double> gain = [0.04, -1e4 * y[2], -1e4 * y[1]], loss = [0, 6e7 * y[1], 0];
        for (int j = 0; j < 3; j++)
            (byState[j], byState[3 + j], byState[6 + j]) = (-gain[j], gain[j] - loss[j], loss[j]);
        byTime.Clear();
    }

    public override void ErrorScale(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> scale) =>
        ErrorScales.Magnitude(y, 1e-12, scale);

    public override void Exact(double t, Span<double> y) =>
        (y[0], y[1], y[2]) = (0.2083340149701255e-7, 0.8333360770334713e-13, 0.9999999791665050);
}
