using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Tests.Draining;

namespace DrainSim.Tests.Published;

/// <summary>
/// A. Boatwright, S. Hughes, J. Barry, The height limit of a siphon, Scientific Reports 5 (2015) 16790: the usual limit is about 10 m;
/// water degassed beforehand ran over 15 m. Ours is the conservative limit for ordinary water, (p_atm − p_v)/(ρ·g), between
/// 10.0 and 10.2 m at sea level and 20 °C; it knows of no liquid in tension.
/// </summary>
public sealed class BoatwrightSiphonTests
{
    [Fact]
    public void Ordinary_water_stands_10_m_high_and_no_more() =>
        Assert.InRange(Simulation.Begin(Siphon(15)).Prime!.LiftLimit, 10.0, 10.2);

    [Fact]
    public void A_siphon_of_15_m_does_not_start() => Assert.Equal(NoStart.LiftBeyondLimit, Simulation.Begin(Siphon(15)).NoStart);

    private static Job Siphon(double height) => new()
    {
        Liquid = Jobs.Water,
        Vessel = Jobs.Cylinder(1, 1),
        Level = 1,
        DrawOffs = Jobs.Only(new Line
        {
            Bore = 0.01,
            Roughness = 0,
            Inlet = new Inlet { Elevation = 0.1 },
            Path =
            [
                new StraightRun { Length = height + 0.9, Rise = height + 0.9 },
                new StraightRun { Length = height + 1.5, Rise = -height - 1.5 },
            ],
        }),
    };
}
