using CsCheck;
using DrainSim.Lines.Inlets;

namespace DrainSim.Tests.Lines.Inlets;

public sealed class FlowBlendTests
{
    private static readonly Gen<double> Flows = Gen.Double[1e-3, 1];
    private static readonly Gen<double> Ratios = Gen.Double[0.8, 1.2];

    [Fact]
    public void A_far_inlet_leaves_the_flow_of_the_line_to_the_last_bit() =>
        Gen.Select(Flows, Gen.Double[1.051, 100]).Sample((line, ratio) =>
            FlowBlend.Lesser(line, line * ratio, out double lineShare, out double inletShare) == line
            && lineShare == 1 && inletShare == 0);

    [Fact]
    public void A_far_line_leaves_the_flow_of_the_inlet_to_the_last_bit() =>
        Gen.Select(Flows, Gen.Double[0, 0.949]).Sample((line, ratio) =>
            FlowBlend.Lesser(line, line * ratio, out double lineShare, out double inletShare) == line * ratio
            && lineShare == 0 && inletShare == 1);

    [Fact]
    public void The_blend_is_at_most_1_25_percent_below_the_smaller_and_never_above() =>
        Gen.Select(Flows, Ratios).Sample((line, ratio) =>
        {
            double smaller = Math.Min(line, line * ratio);
            double flow = FlowBlend.Lesser(line, line * ratio, out _, out _);
            return flow <= smaller && flow >= smaller * 0.9875 * (1 - 1e-12);
        });

    [Fact]
    public void The_shares_are_the_slopes() =>
        Gen.Select(Flows, Ratios).Sample((line, ratio) =>
        {
            double inlet = line * ratio;
            double h = 1e-6 * line;
            FlowBlend.Lesser(line, inlet, out double lineShare, out double inletShare);
            double byLine = (Of(line + h, inlet) - Of(line - h, inlet)) / (2 * h);
            double byInlet = (Of(line, inlet + h) - Of(line, inlet - h)) / (2 * h);
            // The curvature is 1/(2·b) = 10 and jumps at the ends of the band.
            return Math.Abs(byLine - lineShare) < 2e-5 && Math.Abs(byInlet - inletShare) < 2e-5
                && lineShare is >= 0 and <= 1 && inletShare is >= 0 and <= 1;
        });

    [Fact]
    public void An_inlet_without_a_limit_leaves_the_line()
    {
        Assert.Equal(0.01, FlowBlend.Lesser(0.01, double.PositiveInfinity, out _, out double inletShare));
        Assert.Equal(0, inletShare);
    }

    [Fact]
    public void A_dry_inlet_stops_the_line() => Assert.Equal(0, Of(0.01, 0));

    [Theory]
    [InlineData(0)]
    [InlineData(-0.02)]
    public void A_line_that_does_not_run_forward_is_left_alone(double line) => Assert.Equal(line, Of(line, 0.01));

    private static double Of(double line, double inlet) => FlowBlend.Lesser(line, inlet, out _, out _);
}
