using CsCheck;
using DrainSim.Liquids;
using MathNet.Numerics.RootFinding;

namespace DrainSim.Tests.Liquids;

/// <summary>What holds for every liquid of the catalogue at every temperature that it accepts.</summary>
public sealed class CatalogueLiquidTests
{
    // The last bits of two temperatures that all but agree.
    private const double Rounding = 1 + 1e-12;

    private static readonly Gen<CatalogueLiquid> AnyLiquid = Gen.Int[0, LiquidLibrary.All.Count - 1].Select(i => LiquidLibrary.All[i]);

    [Fact]
    public void Density_viscosity_and_vapour_pressure_are_greater_than_0_up_to_the_margin() =>
        Gen.Select(AnyLiquid, Gen.Double[0, 1]).Sample((liquid, share) =>
        {
            double temperature = Stretched(liquid, share);
            return liquid.Density(temperature) is > 500 and < 2000
                && liquid.Viscosity(temperature) is > 1e-4 and < 30
                && liquid.VapourPressure(temperature) is > 0 and < 2e5;
        }, iter: 20_000);

    [Fact]
    public void A_warmer_liquid_is_never_more_viscous() =>
        Gen.Select(AnyLiquid, Gen.Double[0, 1], Gen.Double[0, 1]).Sample((liquid, one, other) =>
            liquid.Viscosity(Within(liquid, Math.Max(one, other))) <= Rounding * liquid.Viscosity(Within(liquid, Math.Min(one, other))),
            iter: 20_000);

    [Fact]
    public void A_warmer_liquid_never_has_a_lower_vapour_pressure() =>
        Gen.Select(AnyLiquid, Gen.Double[0, 1], Gen.Double[0, 1]).Sample((liquid, one, other) =>
            Rounding * liquid.VapourPressure(Within(liquid, Math.Max(one, other))) >= liquid.VapourPressure(Within(liquid, Math.Min(one, other))),
            iter: 20_000);

    [Fact]
    public void A_warmer_liquid_is_never_denser_but_for_water_below_4_degC() =>
        Gen.Select(AnyLiquid, Gen.Double[0, 1], Gen.Double[0, 1]).Sample((liquid, one, other) =>
        {
            double warm = Within(liquid, Math.Max(one, other));
            double cold = Within(liquid, Math.Min(one, other));
            return liquid.Density(warm) <= Rounding * liquid.Density(cold) || (liquid.Id == "water" && cold < 273.15 + 4);
        }, iter: 20_000);

    [Fact]
    public void Petrol_of_a_higher_Reid_vapour_pressure_has_a_higher_vapour_pressure() =>
        Gen.Select(Gen.Double[0, 1], Gen.Double[7e3, 130e3], Gen.Double[0, 7e3]).Sample((share, reid, more) =>
        {
            CatalogueLiquid petrol = LiquidLibrary.Find("petrol")!;
            double temperature = Within(petrol, share);
            return Rounding * petrol.VapourPressure(temperature, reid + more) >= petrol.VapourPressure(temperature, reid);
        });

    /// <summary>Normal boiling points: water by IAPWS (99.974 °C on ITS-90), the others from the CRC Handbook of
    /// Chemistry and Physics, 95th ed.; 0.5 K is what 2 % of the vapour pressure makes there.</summary>
    [Theory]
    [InlineData("water", 99.974, 0.005)]
    [InlineData("ethanol", 78.24, 0.5)]
    [InlineData("methanol", 64.5, 0.5)]
    [InlineData("toluene", 110.6, 0.5)]
    [InlineData("n_octane", 125.62, 0.5)]
    public void The_vapour_pressure_reaches_the_atmosphere_at_the_boiling_point(string id, double boiling, double tolerance)
    {
        CatalogueLiquid liquid = LiquidLibrary.Find(id)!;
        double root = Brent.FindRoot(t => liquid.VapourPressure(t) / 101325 - 1,
            liquid.LeastTemperature, liquid.MostTemperature + CatalogueLiquid.Margin, 1e-12);
        Assert.Equal(boiling, root - 273.15, tolerance);
    }

    [Fact]
    public void A_property_beyond_the_margin_is_an_error_that_names_the_liquid()
    {
        CatalogueLiquid water = LiquidLibrary.Find("water")!;
        var error = Assert.Throws<ArgumentOutOfRangeException>(() => water.Density(400));
        Assert.Contains("temperature of water", error.Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => water.Viscosity(260));
        Assert.Throws<ArgumentOutOfRangeException>(() => water.VapourPressure(double.NaN));
    }

    [Fact]
    public void Only_petrol_has_a_Reid_vapour_pressure()
    {
        Assert.Equal(["petrol_summer", "petrol_winter"],
            LiquidLibrary.All.Where(liquid => liquid.ReidVapourPressure is not null).Select(liquid => liquid.Id));
        Assert.Equal(60e3, LiquidLibrary.Find("petrol_summer")!.ReidVapourPressure!.Value, 1.0);
        Assert.Throws<ArgumentException>(() => LiquidLibrary.Find("diesel")!.VapourPressure(293.15, 60e3));
    }

    private static double Within(CatalogueLiquid liquid, double share) =>
        liquid.LeastTemperature + share * (liquid.MostTemperature - liquid.LeastTemperature);

    private static double Stretched(CatalogueLiquid liquid, double share) =>
        liquid.LeastTemperature - CatalogueLiquid.Margin
        + share * (liquid.MostTemperature - liquid.LeastTemperature + 2 * CatalogueLiquid.Margin * 0.9999);
}
