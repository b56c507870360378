using DrainSim.Lines;

namespace DrainSim.Tests.Published;

/// <summary>
/// Course notes on siphon spillways (civilnoteppt.com, slideserve.com/presley): Q = C·A·√(2·g·H) with C = 0.6, which
/// is a loss of 1/C² − 1 in front of the jet. The printed flows are rounded by up to 0.3 %, hence 0.5 %.
/// </summary>
public sealed class SiphonSpillwayTests
{
    [Theory]
    [InlineData(3, 20, 35.75)]
    [InlineData(3, 22, 37.5)]
    [InlineData(8, 15, 82.3)]
    public void A_barrel_passes_the_printed_flow(double area, double head, double printed)
    {
        LineHydraulics barrel = RoughLines.Compile(new Line
        {
            Bore = Math.Sqrt(4 * area / Math.PI),
            Roughness = 0,
            Inlet = new() { Elevation = 0, EdgeLoss = 0 },
            Path = [new PlainLoss { Coefficient = 1 / (0.6 * 0.6) - 1 }],
        }, density: 1000);
        Assert.Equal(printed, barrel.Flow(head, 0), printed * 0.005);
    }
}
