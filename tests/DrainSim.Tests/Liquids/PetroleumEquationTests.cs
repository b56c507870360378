using DrainSim.Liquids.Correlations;

namespace DrainSim.Tests.Liquids;

/// <summary>The three petroleum equations with constants of their own against printed and measured values.</summary>
public sealed class PetroleumEquationTests
{
    [Theory]
    [InlineData("API_RVP", 14)]
    [InlineData("AP42_AB", 4)]
    [InlineData("API_VCF", 14)]
    public void Every_petroleum_equation_meets_its_check_values(string equation, int rows)
    {
        var checks = CheckTable.Rows("Liquids.petroleum-check-values.csv").Where(row => row["equation"] == equation).ToList();
        Assert.Equal(rows, checks.Count);
        Assert.Empty(checks.Select(row => row.Miss(row.Number("value"), Ours(row))).OfType<string>());
    }

    private static double Ours(IReadOnlyDictionary<string, string> row)
    {
        double given = row.Number("temperature");
        double temperature = row["temperature_unit"] == "degF" ? (given + 459.67) / 1.8 : given + 273.15;
        double c1 = row.Number("c1");
        double c2 = row.Number("c2");
        Correlation equation = row["equation"] switch
        {
            "API_RVP" => new ReidPressure(c1 * Correlation.PoundPerSquareInch, c2),
            "AP42_AB" => new StockPressure(c1, c2),
            "API_VCF" => new PetroleumDensity(c1, c2, row.Number("c3")),
            var other => throw new InvalidDataException(other),
        };
        return equation.At(temperature);
    }
}
