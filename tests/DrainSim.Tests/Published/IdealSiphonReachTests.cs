using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Liquids;
using DrainSim.Tests.Draining;

namespace DrainSim.Tests.Published;

/// <summary>
/// Reach and rate of an ideal siphon; common practice, no source: ethanol near 20 °C crests a little over 12 m high without losses, water
/// about 10 m; a 10 mm bore under that drop carries about 1.2 L/s at a little over 15 m/s; 24 times less drop takes about
/// 5 times longer.
/// </summary>
public sealed class IdealSiphonReachTests
{
    [Theory]
    [InlineData("ethanol", 12.0, 12.5)]
    [InlineData("water", 10.0, 10.2)]
    public void A_liquid_crests_as_high_as_its_vapour_lets_it(string liquid, double low, double high) =>
        Assert.InRange(Start(LiquidLibrary.Find(liquid)!.At(293.15).Liquid!, 1).Prime!.LiftLimit, low, high);

    [Fact]
    public void A_drop_of_12_m_drives_1_2_litres_a_second_through_10_mm()
    {
        Instant start = Start(BookDrains.Thin, 12.3).Instant;
        Assert.Equal(1.2e-3, start.Flow, 0.05e-3);
        Assert.InRange(start.Velocity, 15, 16);
    }

    [Fact]
    public void A_24th_of_the_drop_takes_five_times_as_long() =>
        Assert.Equal(5, Start(BookDrains.Thin, 12.3).Instant.Flow / Start(BookDrains.Thin, 12.3 / 24).Instant.Flow, 0.15);

    private static FirstInstant Start(Liquid liquid, double drop) => Simulation.Begin(
        BookDrains.Of(Jobs.Prism(10, 2), 1, new Line
        {
            Bore = 0.01,
            Roughness = 0,
            Inlet = new() { Elevation = 0, EdgeLoss = 0 },
            Path = [RoughLines.Rise(1.1), RoughLines.Rise(-0.1 - drop)],
        }) with
        { Liquid = liquid });
}
