using DrainSim.Lines;

namespace DrainSim.Tests.Published;

/// <summary>
/// A university physics problem (askfilo.com, "A siphon is used to drain water from a tank"): no friction, outlet
/// 1.00 m below the surface, 101.325 kPa. Printed: 4.43 m/s, three digits, hence 0.2 %. The crest limit
/// (p_atm − p_v)/(ρ·g) − h = 9.11 m is worked out from its numbers with water at 20 °C.
/// </summary>
public sealed class UniversityPhysicsSiphonTests
{
    private static LineHydraulics SiphonWithCrest(double crest) => RoughLines.Compile(new Line
    {
        Bore = 0.02,
        Roughness = 0,
        Inlet = new() { Elevation = 0, EdgeLoss = 0 },
        Path = [RoughLines.Rise(1 + crest), RoughLines.Rise(-1 - crest), RoughLines.Rise(0)],
    }, density: 998.2);

    [Fact]
    public void The_velocity_is_as_printed()
    {
        LineHydraulics siphon = SiphonWithCrest(2);
        Assert.Equal(4.43, siphon.Velocity(siphon.Flow(1, 0)), 4.43 * 0.002);
    }

    [Fact]
    public void The_water_boils_at_the_crest_9_11_m_above_the_surface()
    {
        LineHydraulics siphon = SiphonWithCrest(9.11);
        double crest = siphon.LowPointPressure(siphon.Flow(1, 0), 1, 101325, out _);
        Assert.Equal(2339, crest, 998.2 * RoughLines.Gravity * 9.11 * 0.002);
    }
}
