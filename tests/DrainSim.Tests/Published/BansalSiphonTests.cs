using DrainSim.Lines;

namespace DrainSim.Tests.Published;

/// <summary>
/// R. K. Bansal, A Textbook of Fluid Mechanics: a siphon of 200 mm bore and 500 m length joins two reservoirs 20 m
/// apart in level; its summit is 3 m above the upper one and 100 m along. f = 0.005 is Fanning's, so Darcy's is 0.02.
/// Entry and exit are neglected, as printed: 0.088 m³/s and −7.4 m at the summit, hence 0.5 %, and 0.5 % more for
/// the velocity head that our outlet keeps (1 part in 50 of the head would be 1 % of the flow).
/// </summary>
public sealed class BansalSiphonTests
{
    private static LineHydraulics Siphon(double darcy) => RoughLines.Compile(new Line
    {
        Bore = 0.2,
        Roughness = RoughLines.RelativeRoughness(darcy) * 0.2,
        Inlet = new() { Elevation = 0, EdgeLoss = 0 },
        Path = [new StraightRun { Length = 100, Rise = 3 }, new StraightRun { Length = 400, Rise = -23 }],
    }, density: 1000);

    [Fact]
    public void The_flow_is_as_printed_when_Fannings_factor_is_made_Darcys() =>
        Assert.Equal(0.088, Siphon(4 * 0.005).Flow(20, 0), 0.088 * 0.012);

    [Fact]
    public void The_flow_doubles_when_the_two_are_mixed_up() =>
        Assert.Equal(0.176, Siphon(0.005).Flow(20, 0), 0.176 * 0.05); // its jet is 1 part in 13 of the head

    [Fact]
    public void The_summit_stands_at_the_printed_suction()
    {
        LineHydraulics siphon = Siphon(4 * 0.005);
        double summit = siphon.LowPointPressure(siphon.Flow(20, 0), 0, 0, out _) / (1000 * RoughLines.Gravity);
        Assert.Equal(-7.4, summit, 7.4 * 0.012);
    }
}
