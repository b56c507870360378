using CsCheck;
using DrainSim.Gas;

namespace DrainSim.Tests.Gas;

public sealed class GasSpaceTests
{
    private const double Atmosphere = 101325;

    private static readonly Gen<GasSpace> Spaces =
        Gen.Select(Gen.Double[2e4, 3e5], Gen.Double[250, 380], Gen.Double[0, 0.9], Gen.Double[1, 1.67])
            .Select((p, t, share, n) => new GasSpace(p, t, share * p, n));

    [Fact]
    public void Air_at_the_standard_sea_level_weighs_1_225_kg_per_cubic_metre() =>
        // ISO 2533:1975, printed with four digits.
        Assert.Equal(1.225, new GasSpace(Atmosphere, 288.15, 0).Density(Atmosphere), 5e-5);

    [Fact]
    public void At_exponent_1_pressure_times_volume_is_constant()
    {
        GasSpace space = new(Atmosphere, 293.15, 0);
        double mass = space.Mass(Atmosphere, 2);
        Assert.Equal(Atmosphere * 2 / 5, space.Pressure(mass, 5), 1e-9);
    }

    [Fact]
    public void Without_heat_a_doubled_volume_leaves_0_379_of_the_pressure()
    {
        GasSpace space = new(Atmosphere, 293.15, 0, 1.4);
        double mass = space.Mass(Atmosphere, 2);
        Assert.Equal(Atmosphere * Math.Pow(2, -1.4), space.Pressure(mass, 4), 1e-9);
    }

    [Fact]
    public void A_vapour_takes_its_share_of_the_pressure_from_the_gas()
    {
        GasSpace space = new(Atmosphere, 333.15, 19946);
        Assert.Equal((Atmosphere - 19946) / (287.05287 * 333.15), space.Density(Atmosphere), 1e-12);
    }

    [Fact]
    public void A_vast_volume_leaves_the_vapour_pressure() =>
        Assert.Equal(2339, new GasSpace(Atmosphere, 293.15, 2339).Pressure(1, 1e12), 1e-3);

    [Fact]
    public void Mass_and_volume_lead_back_to_the_pressure() =>
        Gen.Select(Spaces, Gen.Double[0.01, 100], Gen.Double[0.1, 10]).Sample((space, volume, squeeze) =>
        {
            double pressure = space.VapourPressure + 1e4 * squeeze;
            double mass = space.Mass(pressure, volume);
            return Math.Abs(space.Pressure(mass, volume) / pressure - 1) < 1e-13
                && Math.Abs(space.Volume(pressure, mass) / volume - 1) < 1e-13;
        });

    /// <summary>The pressure of a known mass and volume, both changing, against the rate.</summary>
    [Fact]
    public void The_rate_is_that_of_the_pressure() =>
        Gen.Select(Spaces, Gen.Double[0.01, 100], Gen.Double[0.1, 10], Gen.Double[-1, 1], Gen.Double[-1, 1]).Sample((space, volume, squeeze, flow, growth) =>
        {
            const double dt = 1e-5;
            double pressure = space.VapourPressure + 1e4 * squeeze, mass = space.Mass(pressure, volume);
            double massFlow = flow * mass, volumeFlow = growth * volume;
            double later = space.Pressure(mass + massFlow * dt, volume + volumeFlow * dt);
            double before = space.Pressure(mass - massFlow * dt, volume - volumeFlow * dt);
            return Math.Abs((later - before) / (2 * dt) - space.Rate(pressure, volume, massFlow, 0, volumeFlow).Rate) < 1e-5 * pressure;
        });

    [Fact]
    public void The_slopes_are_those_of_the_rate() =>
        Gen.Select(Spaces, Gen.Double[0.01, 100], Gen.Double[0.1, 10], Gen.Double[-1, 1], Gen.Double[-1, 1]).Sample((space, volume, squeeze, flow, growth) =>
        {
            const double H = 1e-5, massFlowSlope = -1e-4;
            double pressure = space.VapourPressure + 1e4 * squeeze;
            PressureRate rate = At(pressure, volume, growth);
            double byPressure = (At(pressure + 1, volume, growth).Rate - At(pressure - 1, volume, growth).Rate) / 2;
            double byVolume = (At(pressure, volume * (1 + H), growth).Rate - At(pressure, volume * (1 - H), growth).Rate) / (2 * H * volume);
            double byGrowth = (At(pressure, volume, growth + 1).Rate - At(pressure, volume, growth - 1).Rate) / 2;
            double size = 1e-5 * pressure * (1 + volume) / volume;
            return Math.Abs(byPressure - rate.ByPressure) < size / pressure && Math.Abs(byVolume - rate.ByVolume) < size / volume
                && Math.Abs(byGrowth - rate.ByGrowth) < size;

            PressureRate At(double p, double v, double g) => space.Rate(p, v, flow + massFlowSlope * (p - pressure), massFlowSlope, g);
        });

    [Fact]
    public void A_sealed_tank_stops_where_the_vacuum_holds_the_rest_of_the_liquid()
    {
        // p0·V0/(V0 + A·x) + ρ·g·(h0 − x) = p_atm with A = 1 m², 2 m high, filled to 1.8 m with water of 20 °C.
        const double RhoG = 998.2 * 9.80665;
        double b = 0.2 * RhoG - 1.8 * RhoG + Atmosphere;
        double drop = (-b + Math.Sqrt(b * b + 4 * RhoG * 0.2 * 1.8 * RhoG)) / (2 * RhoG);
        GasSpace space = new(Atmosphere, 293.15, 0);
        double pressure = space.Pressure(space.Mass(Atmosphere, 0.2), 0.2 + drop);
        Assert.Equal(Atmosphere, pressure + RhoG * (1.8 - drop), 1e-6);
        // A hand calculation printed with two digits: 0.041 m and −17.2 kPa.
        Assert.Equal(0.041, drop, 5e-4);
        Assert.Equal(-17.2e3, pressure - Atmosphere, 50.0);
    }

    [Fact]
    public void A_liquid_that_boils_under_the_pressure_is_refused() => Assert.StartsWith(
        "headspace pressure above the vapour pressure must be greater than 0 Pa",
        Assert.Throws<ArgumentOutOfRangeException>(() => new GasSpace(Atmosphere, 373.15, 101418)).Message, StringComparison.Ordinal);
}
