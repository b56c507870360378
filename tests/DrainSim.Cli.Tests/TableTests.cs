using CsvHelper;

namespace DrainSim.Cli.Tests;

/// <summary>The built-in tables as text and as CSV.</summary>
public sealed class TableTests
{
    [Theory]
    [InlineData("liquids", "water")]
    [InlineData("fittings", "elbow_90")]
    [InlineData("materials", "smooth_hose")]
    [InlineData("sizes", "DN50")]
    [InlineData("shapes", "vertical_cylinder")]
    [InlineData("units", "mPa.s")]
    public void A_table_names_what_a_scenario_may_name_in_lines_that_fit(string table, string name)
    {
        using var folder = new TestFolder();
        Finished shown = DrainSimProcess.Run(folder, table);
        Assert.Equal(0, shown.ExitCode);
        Assert.Contains(name, shown.Output, StringComparison.Ordinal);
        Assert.InRange(shown.OutputLines.Max(line => line.Length), 40, 120);
    }

    [Theory]
    [InlineData("liquids", "density_source")]
    [InlineData("fittings", "source")]
    [InlineData("materials", "source")]
    [InlineData("sizes", "source")]
    [InlineData("units", "definition")]
    public void Every_row_of_a_CSV_table_has_its_source(string table, string column)
    {
        using var folder = new TestFolder();
        string text = DrainSimProcess.Run(folder, table, "--csv").Output;
        var strict = new CsvReaderOptions { FieldCountMismatch = CsvFieldCountHandling.Throw };
        using CsvReader rows = CsvReader.FromText(text, strict);
        int count = 0;
        while (rows.Read())
        {
            Assert.NotEqual("", rows.GetString(column));
            count++;
        }
        Assert.True(count > 20, $"{count} rows");
    }
}
