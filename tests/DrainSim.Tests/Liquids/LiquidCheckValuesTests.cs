using DrainSim.Liquids;

namespace DrainSim.Tests.Liquids;

/// <summary>The catalogue against figures from other sources; each row of the table names its own and its tolerance.</summary>
public sealed class LiquidCheckValuesTests
{
    [Theory]
    [InlineData("independent", 310)]
    [InlineData("table", 4)]
    [InlineData("evaluation", 204)]
    public void Every_property_meets_its_check_values(string kind, int rows)
    {
        var checks = CheckTable.Rows("Liquids.liquid-check-values.csv").Where(row => row["kind"] == kind).ToList();
        Assert.Equal(rows, checks.Count);
        Assert.Empty(checks.Select(row => row.Miss(row.Number("value"), Ours(row))).OfType<string>());
    }

    [Fact]
    public void Every_property_but_a_constant_has_check_values()
    {
        var seen = CheckTable.Rows("Liquids.liquid-check-values.csv").Select(row => (row["liquid"], row["property"])).ToHashSet();
        var fitted = LiquidLibrary.All
            .SelectMany(liquid => new[]
            {
                (liquid.Id, Property: "density", Correlation: liquid.DensityCorrelation),
                (liquid.Id, Property: "viscosity", Correlation: liquid.ViscosityCorrelation),
                (liquid.Id, Property: "psat", Correlation: liquid.VapourPressureCorrelation),
            })
            .Where(entry => entry.Correlation.EquationName != "CONSTANT")
            .Select(entry => (entry.Id, entry.Property));
        Assert.Subset(seen, fitted.ToHashSet());
    }

    private static double Ours(IReadOnlyDictionary<string, string> row)
    {
        CatalogueLiquid liquid = LiquidLibrary.Find(row["liquid"])!;
        double temperature = row.Number("temperature_C") + 273.15;
        return row["property"] switch
        {
            "density" => liquid.Density(temperature),
            "viscosity" => liquid.Viscosity(temperature),
            "psat" => liquid.VapourPressure(temperature),
            var other => throw new InvalidDataException(other),
        };
    }
}
