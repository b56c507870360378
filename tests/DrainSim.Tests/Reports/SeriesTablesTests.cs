using System.Globalization;
using CsvHelper;
using DrainSim.Draining;
using DrainSim.Reports.Series;

namespace DrainSim.Tests.Reports;

public sealed class SeriesTablesTests
{
    private static readonly CsvReaderOptions Strict = new()
    {
        Separator = ',',
        MalformedData = CsvMalformedDataHandling.Throw,
        FieldCountMismatch = CsvFieldCountHandling.Throw,
    };

    [Fact]
    public void The_columns_of_the_time_series_are_the_approved_ones() => Assert.StartsWith(
        "time_s,level_m,volume_m3,flow_m3_s,velocity_m_s,reynolds,"
        + "low_point_pressure_Pa,low_point_margin_Pa,receiver_level_m,headspace_pressure_Pa\n",
        Series(new InventedRun().Result()), StringComparison.Ordinal);

    [Fact]
    public void The_columns_of_the_events_are_the_approved_ones() => Assert.StartsWith(
        "time_s,code,level_m,volume_m3,text\n", Events(new InventedRun().Result()), StringComparison.Ordinal);

    [Fact]
    public void Every_number_reads_back_to_the_last_bit()
    {
        DrainResult result = new InventedRun { ReceiverLevel = 1.0 / 3 }.Result();
        using CsvReader rows = CsvReader.FromText(Series(result), Strict);
        int count = 0;
        while (rows.Read())
        {
            Instant there = result.Trace.At(Read(rows, "time_s"));
            Assert.Equal(there.Level, Read(rows, "level_m"));
            Assert.Equal(there.Flow, Read(rows, "flow_m3_s"));
            Assert.Equal(there.LowPointMargin, Read(rows, "low_point_margin_Pa"));
            Assert.Equal(1.0 / 3, Read(rows, "receiver_level_m"));
            count++;
        }
        Assert.Equal(SampleTimes.Of(result).Count(), count);
    }

    [Fact]
    public void A_quantity_that_is_absent_leaves_its_cell_empty() =>
        Assert.All(Series(new InventedRun().Result()).TrimEnd('\n').Split('\n').Skip(1),
            row => Assert.EndsWith(",,", row, StringComparison.Ordinal));

    [Fact]
    public void The_events_read_back_in_time_order_with_their_codes()
    {
        DrainResult result = new InventedRun().Result();
        using CsvReader rows = CsvReader.FromText(Events(result), Strict);
        var codes = new List<string>();
        double before = 0;
        while (rows.Read())
        {
            Assert.True(Read(rows, "time_s") >= before);
            before = Read(rows, "time_s");
            codes.Add(rows.GetString("code"));
        }
        Assert.Equal([.. Enumerable.Repeat("tenth_gone", 9), "inlet_uncovered"], codes);
    }

    private static double Read(CsvReader rows, string column) =>
        double.Parse(rows.GetString(column), NumberStyles.Float, CultureInfo.InvariantCulture);

    private static string Series(DrainResult result) => Text(stream => SeriesTables.WriteSeries(stream, result));

    private static string Events(DrainResult result) => Text(stream => SeriesTables.WriteEvents(stream, result));

    private static string Text(Action<Stream> write)
    {
        using var stream = new MemoryStream();
        write(stream);
        return System.Text.Encoding.UTF8.GetString(stream.ToArray());
    }
}
