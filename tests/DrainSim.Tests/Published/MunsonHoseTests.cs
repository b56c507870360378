using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Tests.Draining;
using MathNet.Numerics.RootFinding;

namespace DrainSim.Tests.Published;

/// <summary>
/// B. R. Munson, D. F. Young, T. H. Okiishi, Fundamentals of Fluid Mechanics, Example 3.10: a hose over a hill, outlet 5 ft below
/// the tank's floor, water at 60 °F (0.256 psia) under 14.7 psia, no friction. Printed, from memory: cavitation when the hill
/// is 28.2 ft over the floor; it rounds a pressure to −14.4 psi where 28.35 ft is exact, hence 0.6 %.
/// </summary>
public sealed class MunsonHoseTests
{
    private const double Foot = 0.3048;
    private const double Psi = 6894.757;

    [Fact]
    public void The_water_boils_when_the_hill_is_as_high_as_printed()
    {
        double hill = Brent.FindRoot(crest => Margin(crest) / Psi, 5, 10, 1e-9);
        Assert.Equal(28.2, hill / Foot, 28.2 * 0.006);
    }

    private static double Margin(double crest) => Simulation.Begin(BookDrains.Of(Jobs.Cylinder(5, 5), 15 * Foot, new Line
    {
        Bore = 0.025,
        Roughness = 0,
        Inlet = new() { Elevation = 0, EdgeLoss = 0 },
        Path = [RoughLines.Rise(crest), RoughLines.Rise(-crest - 5 * Foot), RoughLines.Rise(0)],
    }) with
    {
        Liquid = BookDrains.Thin with { Density = 999.0, VapourPressure = 0.256 * Psi },
        Site = new Site { AtmosphericPressure = 14.7 * Psi },
    }).Instant.LowPointMargin;
}
