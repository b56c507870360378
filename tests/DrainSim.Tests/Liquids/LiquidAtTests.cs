using DrainSim.Liquids;

namespace DrainSim.Tests.Liquids;

public sealed class LiquidAtTests
{
    private const double IcePoint = 273.15;

    [Fact]
    public void Water_at_20_degC_comes_without_a_word()
    {
        LiquidAt answer = At("water", 20);
        Assert.Null(answer.Refusal);
        Assert.Empty(answer.Warnings);
        Assert.Equal("Water", answer.Liquid!.Name);
        Assert.Equal(293.15, answer.Liquid.Temperature);
        Assert.Equal(998.2, answer.Liquid.Density, 0.1); // IAPWS: 998.207 kg/m³, 1.0016 mPa·s, 2.339 kPa
        Assert.Equal(1.0016e-3, answer.Liquid.Viscosity, 1e-6);
        Assert.Equal(2339, answer.Liquid.VapourPressure, 1.0);
        Assert.Equal(LiquidHazards.None, answer.Liquid.Hazards);
    }

    [Theory]
    [InlineData("water", 102, "Water at 102 degC is above the range of its data, 0.01 to 99 degC; its figures are extrapolated, and it may boil or change.")]
    [InlineData("water", -3, "Water at -3 degC is below the range of its data, 0.01 to 99 degC; its figures are extrapolated, and it may freeze or thicken.")]
    public void Within_the_margin_there_is_a_liquid_and_one_warning(string id, double celsius, string warning)
    {
        LiquidAt answer = At(id, celsius);
        Assert.False(answer.IsRefused);
        Assert.NotNull(answer.Liquid);
        Assert.Equal([warning], answer.Warnings);
    }

    [Theory]
    [InlineData("water", 104.5)]
    [InlineData("water", -5.5)]
    [InlineData("jet_a1", -400)]
    public void Beyond_the_margin_the_liquid_is_refused_with_its_range(string id, double celsius)
    {
        LiquidAt answer = At(id, celsius);
        Assert.True(answer.IsRefused);
        Assert.Null(answer.Liquid);
        Assert.Empty(answer.Warnings);
        Assert.Contains("degC is outside its data, which hold from ", answer.Refusal, StringComparison.Ordinal);
    }

    [Fact]
    public void The_refusal_reads_as_a_sentence_with_the_range_in_degC() => Assert.Equal(
        "Water at 130 degC is outside its data, which hold from 0.01 to 99 degC; "
        + "give density, viscosity and vapour_pressure instead of the name.",
        At("water", 130).Refusal);

    [Fact]
    public void At_either_end_of_the_range_every_liquid_comes_without_a_warning_of_range() =>
        Assert.All(LiquidLibrary.All, liquid => Assert.All([liquid.LeastTemperature, liquid.MostTemperature], temperature =>
            Assert.DoesNotContain(liquid.At(temperature).Warnings, warning => warning.Contains("extrapolated", StringComparison.Ordinal))));

    [Theory]
    [InlineData("brine", 0.20, null)]
    [InlineData("brine", 0.2005, null)]
    [InlineData("brine", 0.22, "The data of brine_nacl_20 hold for a strength of 20 % by mass only, not 22 %; for another give density, viscosity and vapour_pressure instead of the name.")]
    [InlineData("seawater", 0.035, null)]
    [InlineData("seawater", 0.042, "The data of seawater_35 hold for a strength of 3.5 % by mass of sea salt only, not 4.2 %; for another give density, viscosity and vapour_pressure instead of the name.")]
    [InlineData("caustic_soda", 0.5, null)]
    [InlineData("sulfuric_acid", 0.98, null)]
    [InlineData("sulfuric_acid", 0.96, "The data of h2so4_98 hold for a strength of 98 % by mass only, not 96 %; for another give density, viscosity and vapour_pressure instead of the name.")]
    [InlineData("wine", 0.12, null)]
    [InlineData("ethanol", 1, null)]
    [InlineData("ethanol", 0.4, "Ethanol takes no strength; for a mixture give density, viscosity and vapour_pressure instead of the name.")]
    [InlineData("diesel", 1, "Diesel fuel (EN 590 type) takes no strength; for a mixture give density, viscosity and vapour_pressure instead of the name.")]
    public void A_strength_other_than_that_of_the_data_is_refused(string id, double strength, string? refusal) =>
        Assert.Equal(refusal, LiquidLibrary.Find(id)!.At(IcePoint + 25, strength).Refusal);

    [Fact]
    public void A_given_Reid_vapour_pressure_takes_the_place_of_the_grade()
    {
        CatalogueLiquid petrol = LiquidLibrary.Find("petrol")!;
        LiquidAt grade = petrol.At(IcePoint + 20);
        LiquidAt given = petrol.At(IcePoint + 20, reidVapourPressure: 90e3);
        Assert.Contains("a Reid vapour pressure of 60 kPa is taken", Assert.Single(grade.Warnings), StringComparison.Ordinal);
        Assert.Empty(given.Warnings);
        Assert.Equal("Petrol / gasoline, summer grade (RVP 90 kPa)", given.Liquid!.Name);
        Assert.True(given.Liquid.VapourPressure > 1.3 * grade.Liquid!.VapourPressure);
        Assert.Equal(grade.Liquid.Density, given.Liquid.Density);
    }

    [Theory]
    [InlineData("petrol", 60, "A Reid vapour pressure of 0.06 kPa is outside its equation, which holds from 6.9 to 137.9 kPa.")]
    [InlineData("petrol", double.NaN, "A Reid vapour pressure of NaN kPa is outside its equation, which holds from 6.9 to 137.9 kPa.")]
    [InlineData("water", 60e3, "Water takes no Reid vapour pressure; only petrol does.")]
    public void A_Reid_vapour_pressure_that_means_nothing_is_refused(string id, double reid, string refusal) =>
        Assert.Equal(refusal, LiquidLibrary.Find(id)!.At(IcePoint + 20, reidVapourPressure: reid).Refusal);

    [Theory]
    [InlineData("water", 59.9, LiquidHazards.None)]
    [InlineData("water", 60, LiquidHazards.Hot)]
    [InlineData("milk", 65, LiquidHazards.Hot | LiquidHazards.Polluting)]
    [InlineData("methanol", 0, LiquidHazards.Flammable | LiquidHazards.Toxic | LiquidHazards.Polluting)]
    [InlineData("diesel", 20, LiquidHazards.Flammable | LiquidHazards.Toxic | LiquidHazards.Polluting)]
    [InlineData("propylene_glycol", 100, LiquidHazards.Combustible | LiquidHazards.Polluting | LiquidHazards.Hot)]
    [InlineData("propylene_glycol", 107, LiquidHazards.Combustible | LiquidHazards.Polluting | LiquidHazards.Hot | LiquidHazards.Flammable)]
    [InlineData("oil_vg46", 20, LiquidHazards.Combustible | LiquidHazards.Polluting)]
    [InlineData("sulfuric_acid", 20, LiquidHazards.Corrosive | LiquidHazards.Polluting)]
    [InlineData("dichloromethane", 20, LiquidHazards.Toxic | LiquidHazards.Polluting)]
    public void Hazards_follow_the_liquid_its_flash_point_and_its_temperature(string id, double celsius, LiquidHazards hazards) =>
        Assert.Equal(hazards, At(id, celsius).Liquid!.Hazards);

    [Fact]
    public void A_temperature_that_is_no_number_is_an_error() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => LiquidLibrary.Find("water")!.At(double.NaN));

    private static LiquidAt At(string id, double celsius) => LiquidLibrary.Find(id)!.At(IcePoint + celsius);
}
