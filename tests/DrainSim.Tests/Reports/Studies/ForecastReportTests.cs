using System.Text.Json;
using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Studies;
using DrainSim.Studies;
using DrainSim.Studies.Forecasting;
using DrainSim.Tests.Draining;

namespace DrainSim.Tests.Reports.Studies;

/// <summary>What a forecast says and leaves in its folder.</summary>
public sealed class ForecastReportTests
{
    private static readonly Lazy<ForecastResult> Result = new(() =>
    {
        Job job = Jobs.OrificeDrain();
        DrainResult truth = Jobs.Run(job);
        return new ForecastStudy
        {
            Readings = [.. Enumerable.Range(0, 8).Select(i => i * truth.StoppedAt / 16).Select(t => new LevelReading(t, Math.Round(truth.Trace.At(t).Level, 2), 0.01))],
            Parameters = [new FittedParameter("Cd", "", 0.55)],
            Make = values => CaseJob.Of(() => Jobs.OrificeDrain(dischargeCoefficient: values[0])),
            Draws = 64,
        }.Run(TestContext.Current.CancellationToken);
    });

    [Fact]
    public void The_sentence_gives_the_finish_its_band_and_what_was_planned()
    {
        string sentence = ForecastWording.Sentence(Report());
        Assert.Matches(@"^Empty 21 min \d+ s after the start, between 21 min.* and 2\d min.* \(95 %\)\. As the scenario stood it would have been 23 min \d+ s after the start\.$", sentence);
    }

    [Fact]
    public void By_the_clock_the_date_is_told_once_and_the_next_day_by_name()
    {
        var begins = new DateTimeOffset(2031, 5, 12, 23, 50, 0, TimeSpan.Zero);
        ForecastReport report = Report() with { Clock = new Clock(begins) };
        Assert.Equal("13 May 00:12", report.Moment(22 * 60));
        Assert.Equal("00:12", report.Moment(22 * 60, 23 * 60));
        Assert.Equal("12 May 23:55", report.Moment(5 * 60, 23 * 60));
        Assert.Equal("00:12 the next day", (report with { HasDate = false }).Moment(22 * 60));
        Assert.Equal("23:55", (report with { HasDate = false }).Moment(5 * 60));
    }

    [Fact]
    public void The_document_holds_the_finish_the_estimates_and_the_alternatives()
    {
        using var stream = new MemoryStream();
        ForecastDocument.Write(stream, Report() with { Clock = new Clock(new DateTimeOffset(2031, 5, 12, 8, 0, 0, TimeSpan.Zero)) });
        using JsonDocument json = JsonDocument.Parse(stream.ToArray());
        JsonElement root = json.RootElement;
        Assert.Equal(Result.Value.Finish.Best, root.GetProperty("finish_s").GetDouble());
        Assert.StartsWith("2031-05-12T08:2", root.GetProperty("finish_clock").GetString(), StringComparison.Ordinal);
        Assert.Equal(0.6, root.GetProperty("estimates")[0].GetProperty("value").GetDouble(), 0.01);
        Assert.Equal(["leak", "inflow"], root.GetProperty("alternatives").EnumerateArray().Select(one => one.GetProperty("kind").GetString()));
        Assert.Equal("apart", root.GetProperty("separation").GetString());
    }

    [Fact]
    public void The_table_has_a_row_for_each_reading_and_the_picture_the_same_bytes_each_time()
    {
        using var table = new MemoryStream();
        ForecastTable.Write(table, Result.Value);
        string[] lines = System.Text.Encoding.UTF8.GetString(table.ToArray()).Split('\n', StringSplitOptions.RemoveEmptyEntries);
        Assert.Equal(string.Join(',', ForecastTable.Columns), lines[0]);
        Assert.Equal(8 + 1, lines.Length);
        Assert.Equal(Picture(), Picture());
        byte[] Picture()
        {
            using var stream = new MemoryStream();
            DrainSim.Reports.Pictures.ForecastPicture.Write(stream, Report());
            return stream.ToArray();
        }
    }

    private static ForecastReport Report() => new() { Name = "job", Title = "A job", Result = Result.Value, HasDate = true };
}
