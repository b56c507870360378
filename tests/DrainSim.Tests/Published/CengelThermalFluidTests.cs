using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Tests.Draining;

namespace DrainSim.Tests.Published;

/// <summary>
/// Y. A. Çengel and others, Fundamentals of Thermal-Fluid Sciences, Problem 14-74: a 3 m tank, 2 m of water, a sharp
/// outlet (K 0.5) into 100 m of 10 cm pipe with f = 0.015. Printed, from memory: 1.54 m/s at first and 38.9 min, three
/// digits, hence 0.2 %. The velocity head at the outlet counts, as in the book's 1 + K + f·L/d.
/// </summary>
public sealed class CengelThermalFluidTests
{
    private static readonly Job Tank = BookDrains.Of(Jobs.Cylinder(3, 2.5), 2, new Line
    {
        Bore = 0.1,
        Roughness = RoughLines.RelativeRoughness(0.015) * 0.1,
        Inlet = new() { Elevation = 0, EdgeLoss = 0.5 },
        Path = [new StraightRun { Length = 100, Rise = 0 }],
    });

    [Fact]
    public void The_water_leaves_at_the_printed_velocity() =>
        Assert.Equal(1.54, Simulation.Begin(Tank).Instant.Velocity, 1.54 * 0.002);

    [Fact]
    public void The_tank_empties_in_the_printed_time() => BookDrains.AssertTime(38.9 * 60, 2e-3, Tank);
}
