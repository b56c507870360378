using DrainSim.Lines;

namespace DrainSim.Tests.Published;

/// <summary>
/// J. F. Douglas, J. M. Gasiorek, J. A. Swaffield, Fluid Mechanics, Example 14.1: a rough short siphon.
/// Bore 0.1 m, 5 m up and 10 m down, Fanning's f = 0.08 (Darcy 0.32), entry loss 0.5, crest 1.5 m above and outlet
/// 4 m below the surface, g = 9.81 m/s². Printed: 1.26 m/s and −28.6 kPa at the crest, rounded to three digits,
/// hence 0.5 %. Its friction factor is had from a fully rough wall, ε/D = 3.7·10^(−1/(2√f)).
/// </summary>
public sealed class DouglasSiphonTests
{
    private static readonly LineHydraulics Siphon = RoughLines.Compile(new Line
    {
        Bore = 0.1,
        Roughness = RoughLines.RelativeRoughness(darcy: 4 * 0.08) * 0.1,
        Inlet = new() { Elevation = 0, EdgeLoss = 0.5 },
        Path = [new StraightRun { Length = 5, Rise = 1.5 }, new StraightRun { Length = 10, Rise = -5.5 }],
    }, density: 1000);

    [Fact]
    public void The_velocity_is_as_printed() => Assert.Equal(1.26, Siphon.Velocity(Siphon.Flow(4, 0)), 1.26 * 0.005);

    [Fact]
    public void The_crest_pressure_is_as_printed()
    {
        double crest = Siphon.LowPointPressure(Siphon.Flow(4, 0), surface: 0, gasPressure: 0, out int node);
        Assert.Equal(1, node);
        Assert.Equal(-28.6e3, crest, 28.6e3 * 0.005);
    }
}
