using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Tests.Draining;

namespace DrainSim.Tests.Published;

/// <summary>
/// F. M. White, Fluid Mechanics, Problem 6.27: an oil tank of diameter D drains through a vertical tube of bore d and length L into a
/// lower tank whose surface stays h below the first one's floor; t₀ = ln(1 + Z₀/h)/C, C = ρ·g·d⁴/(32·μ·L·D²). The closed
/// form was seen; the numbers were chosen here: fully laminar, and the velocity head below 0.1 % of the head, hence 0.2 %.
/// </summary>
public sealed class WhiteOilTubeTests
{
    [Fact]
    public void The_oil_runs_down_in_the_time_of_the_closed_form()
    {
        Line tube = new()
        {
            Bore = 0.01,
            Roughness = 0,
            Inlet = new() { Elevation = 0, EdgeLoss = 0.5 },
            Path = [new StraightRun { Length = 1, Rise = -1 }],
        };
        BookDrains.AssertTime(6613.1, 2e-3, BookDrains.Of(Jobs.Cylinder(0.3, 1), 0.5, tube) with
        {
            Liquid = Jobs.Water with { Density = 900, Viscosity = 0.5 },
            DrawOffs = [new DrawOff { Line = tube, Receiver = new FixedSurface { Elevation = -1 } }],
        });
    }
}
