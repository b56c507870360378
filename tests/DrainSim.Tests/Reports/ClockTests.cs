using System.Globalization;
using System.Text;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Series;

namespace DrainSim.Tests.Reports;

/// <summary>The clock of a job on paper.</summary>
public sealed class ClockTests
{
    private static readonly Clock Morning = new(new DateTimeOffset(2031, 5, 4, 6, 42, 30, TimeSpan.FromHours(2)));

    [Fact]
    public void A_moment_is_told_with_day_and_minute()
    {
        Assert.Equal("Sun 4 May 2031 06:43", Morning.Moment(0)); // to the nearest minute
        Assert.Equal("Mon 5 May 2031 06:42", Morning.Moment(86400 - 31));
        Assert.Equal("4 May 07:43", Morning.DayAndTime(3600));
        Assert.Equal("06:42:31", Morning.OfDay(1, 300));
        Assert.Equal("UTC+02:00", Morning.Zone);
        Assert.Equal("2031-05-04T06:42:30+02:00", Morning.Iso(0));
    }

    [Theory]
    [InlineData(60, 30)]
    [InlineData(3600, 1050)]
    [InlineData(86400, 62250)]
    public void Even_steps_are_those_of_the_clock(double step, double first) => Assert.Equal(first, Morning.FirstEven(step), 1e-6);

    [Fact]
    public void The_tables_gain_a_column()
    {
        string[] lines = Text(stream => SeriesTables.WriteSeries(stream, new InventedRun().Result(), Morning));
        Assert.EndsWith(",headspace_pressure_Pa,clock", lines[0], StringComparison.Ordinal);
        Assert.EndsWith(",2031-05-04T06:42:30+02:00", lines[1], StringComparison.Ordinal);
        Assert.All(lines.Skip(1), line => Assert.True(DateTimeOffset.TryParse(line.Split(',')[^1], CultureInfo.InvariantCulture, out _)));
        Assert.EndsWith(",text,clock", Text(stream => SeriesTables.WriteEvents(stream, new InventedRun().Result(), Morning))[0], StringComparison.Ordinal);
    }

    private static string[] Text(Action<Stream> write)
    {
        using var stream = new MemoryStream();
        write(stream);
        return Encoding.UTF8.GetString(stream.ToArray()).TrimEnd('\n').Split('\n');
    }
}
