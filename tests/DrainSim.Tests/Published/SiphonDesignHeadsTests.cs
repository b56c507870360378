using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Liquids;
using DrainSim.Tests.Draining;

namespace DrainSim.Tests.Published;

/// <summary>
/// Siphon design, section 3.7.2, probably FAO Inland Aquaculture Engineering (ADCP/REP/84/21, 1984; identification from memory): heads
/// of the atmosphere and of water vapour. The atmosphere's are rounded to 0.1 m and stand up to 0.07 m off the standard atmosphere, so
/// with the vapour's rounding a lift limit is good to 0.1 m.
/// </summary>
public sealed class SiphonDesignHeadsTests
{
    [Theory]
    [InlineData(0, 10.3)]
    [InlineData(500, 9.8)]
    [InlineData(1000, 9.2)]
    [InlineData(1500, 8.6)]
    [InlineData(2000, 8.1)]
    [InlineData(3000, 7.2)]
    public void The_lift_limit_of_cool_water_is_the_printed_head_less_its_vapours(double altitude, double head) =>
        Assert.Equal(head - 0.24, LiftLimit(293.15, StandardAtmosphere.Pressure(altitude)), 0.1);

    [Theory]
    [InlineData(10, 0.123)]
    [InlineData(20, 0.24)]
    [InlineData(30, 0.43)]
    public void Water_takes_the_printed_vapour_head_off_the_limit(double celsius, double head)
    {
        Liquid water = Water(273.15 + celsius);
        double vapour = 101325 / (water.Density * Site.StandardGravity) - LiftLimit(273.15 + celsius, 101325);
        Assert.Equal(head, vapour, 0.02 * head); // two digits, and the steam tables' 0.125, 0.239, 0.435
    }

    private static Liquid Water(double temperature) => LiquidLibrary.Find("water")!.At(temperature).Liquid!;

    private static double LiftLimit(double temperature, double atmosphere) => Simulation.Begin(Jobs.Siphon() with
    {
        Liquid = Water(temperature),
        Site = new Site { AtmosphericPressure = atmosphere },
    }).Prime!.LiftLimit;
}
