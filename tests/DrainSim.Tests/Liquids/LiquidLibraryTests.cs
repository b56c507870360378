using DrainSim.Liquids;

namespace DrainSim.Tests.Liquids;

public sealed class LiquidLibraryTests
{
    [Theory]
    [InlineData("water", "water")]
    [InlineData("brine", "brine_nacl_20")]
    [InlineData("seawater", "seawater_35")]
    [InlineData("petrol", "petrol_summer")]
    [InlineData("gasoline", "petrol_summer")]
    [InlineData("winter_petrol", "petrol_winter")]
    [InlineData("kerosene", "jet_a1")]
    [InlineData("Jet A-1", "jet_a1")]
    [InlineData("milk", "milk_whole")]
    [InlineData("wine", "wine_12")]
    [InlineData("caustic_soda", "naoh_50")]
    [InlineData("sulfuric_acid", "h2so4_98")]
    [InlineData("Sulphuric Acid", "h2so4_98")]
    [InlineData("mineral_oil_vg46", "oil_vg46")]
    [InlineData("ISO VG 68", "oil_vg68")]
    [InlineData("gear_oil_vg220", "oil_vg220")]
    [InlineData("HLP 46", "oil_vg46")]
    [InlineData("o-xylene", "o_xylene")]
    [InlineData("N_HEXANE", "n_hexane")]
    [InlineData("  diesel ", "diesel")]
    [InlineData("GASOLINE_WINTER", "petrol_winter")]
    public void A_usual_name_finds_its_liquid_in_any_case(string name, string id) =>
        Assert.Equal(id, LiquidLibrary.Find(name)?.Id);

    [Theory]
    [InlineData("")]
    [InlineData("watr")]
    [InlineData("heavy_oil")]
    [InlineData("oil")]
    [InlineData("glycol")]
    [InlineData("ISOPROPANO\u0130")]
    public void A_name_that_says_too_little_or_is_misspelt_finds_nothing(string name) =>
        Assert.Null(LiquidLibrary.Find(name));

    [Fact]
    public void The_catalogue_holds_36_liquids_each_under_its_own_id()
    {
        Assert.Equal(36, LiquidLibrary.All.Count);
        Assert.All(LiquidLibrary.All, liquid => Assert.Same(liquid, LiquidLibrary.Find(liquid.Id)));
        Assert.All(LiquidLibrary.All, liquid => Assert.All(liquid.Aliases, alias => Assert.Same(liquid, LiquidLibrary.Find(alias))));
    }

    [Fact]
    public void Every_row_of_the_table_of_aliases_belongs_to_a_liquid() => Assert.Equal(
        EmbeddedTable.Rows("Liquids.liquid-aliases.csv", reader => reader.GetString("alias")).Order(StringComparer.Ordinal),
        LiquidLibrary.All.SelectMany(liquid => liquid.Aliases).Order(StringComparer.Ordinal));

    [Fact]
    public void Every_figure_names_its_source_and_its_range() => Assert.All(
        LiquidLibrary.All.SelectMany(liquid => new[] { liquid.DensityCorrelation, liquid.ViscosityCorrelation, liquid.VapourPressureCorrelation }),
        property =>
        {
            Assert.NotEmpty(property.Source);
            Assert.NotEmpty(property.EquationName);
            Assert.InRange(property.Uncertainty, 1e-5, 1);
            Assert.True(property.LeastTemperature < property.MostTemperature);
        });

    [Fact]
    public void The_range_of_a_liquid_lies_within_that_of_each_of_its_constants()
    {
        const double rounding = 0.2; // K: the table of constants writes some ends as whole kelvins
        Assert.All(LiquidLibrary.All, liquid => Assert.All(
            [liquid.DensityCorrelation, liquid.ViscosityCorrelation, liquid.VapourPressureCorrelation], property =>
            {
                Assert.True(property.LeastTemperature <= liquid.LeastTemperature + rounding);
                Assert.True(property.MostTemperature >= liquid.MostTemperature - rounding);
            }));
    }

    [Fact]
    public void A_liquid_that_burns_has_a_flash_point_and_a_flammable_one_has_it_at_or_below_60_degC() =>
        Assert.All(LiquidLibrary.All, liquid =>
        {
            if (liquid.Hazards.HasFlag(LiquidHazards.Combustible))
                Assert.True(liquid.FlashPoint > 333.15);
            if (liquid.IsFlammable)
                Assert.True(liquid.FlashPoint <= 333.15);
            Assert.NotEmpty(liquid.FlashPointSource);
            Assert.NotEmpty(liquid.HazardSource);
        });
}
