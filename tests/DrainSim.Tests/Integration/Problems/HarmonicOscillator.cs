namespace DrainSim.Tests.Integration.Problems;

/// <summary>y0' = ω·y1, y1' = −ω·y0, y(0) = (0, 1). y = (sin ω·t, cos ω·t), zeros of y0 at whole multiples of π/ω.</summary>
public sealed class HarmonicOscillator(double frequency = 1) : Problem
{
    public override double[] InitialState => [0, 1];

    public override void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt)
    {
        dydt[0] = frequency * y[1];
        dydt[1] = -frequency * y[0];
    }

    public override void Exact(double t, Span<double> y) => (y[0], y[1]) = Math.SinCos(frequency * t);

    public override void ErrorScale(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> scale) =>
        scale.Fill(1);
}
