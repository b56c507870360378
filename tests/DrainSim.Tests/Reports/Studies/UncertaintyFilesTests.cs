using System.Text.Json;
using DrainSim.Reports.Studies;
using DrainSim.Studies;
using DrainSim.Studies.Sampling;
using DrainSim.Studies.Uncertainty;
using DrainSim.Tests.Draining;
using SkiaSharp;

namespace DrainSim.Tests.Reports.Studies;

/// <summary>What an uncertainty study leaves in its folder.</summary>
public sealed class UncertaintyFilesTests : IDisposable
{
    private readonly string folder = Path.Combine(Path.GetTempPath(), "drainsim-uncertainty-" + Guid.NewGuid().ToString("N"));

    public void Dispose()
    {
        if (Directory.Exists(folder))
            Directory.Delete(folder, recursive: true);
    }

    [Fact]
    public void Rows_document_and_picture_are_the_same_bytes_for_any_number_of_threads()
    {
        Write("one", 1);
        Write("four", 4);
        foreach (string ending in UncertaintyFiles.Endings)
            Assert.Equal(File.ReadAllBytes(Path.Combine(folder, "one" + ending)), File.ReadAllBytes(Path.Combine(folder, "four" + ending)));
    }

    [Fact]
    public void The_table_has_a_row_for_each_sample_and_the_document_the_percentiles_of_its_drain_times()
    {
        UncertaintyReport report = Write("job", 2);
        string[] rows = File.ReadAllLines(Path.Combine(folder, "job.uncertainty.csv"));
        Assert.StartsWith("case,bore_m,outcome,reason,", rows[0], StringComparison.Ordinal);
        Assert.Equal(64 + 1, rows.Length);
        int column = Array.IndexOf(rows[0].Split(','), "drain_time_s");
        int below = rows.Skip(1).Count(row => double.Parse(row.Split(',')[column], System.Globalization.CultureInfo.InvariantCulture) < report.Result.DrainTime[2].Value);
        Assert.Equal(32, below); // half of them
        using JsonDocument json = JsonDocument.Parse(File.ReadAllText(Path.Combine(folder, "job.uncertainty.json")));
        JsonElement root = json.RootElement;
        Assert.Equal(report.Result.DrainTime[2].Value, root.GetProperty("drain_time_percentiles")[2].GetProperty("value_s").GetDouble());
        Assert.Equal("emptied", root.GetProperty("outcomes")[0].GetProperty("outcome").GetString());
        Assert.Equal(1, root.GetProperty("parameters")[0].GetProperty("drain_time_share").GetDouble(), 0.01);
        Assert.Equal(UncertaintyWording.Sentence(report.Result), root.GetProperty("sentence").GetString());
    }

    [Fact]
    public void A_study_that_is_stopped_leaves_nothing_behind()
    {
        using var stop = new CancellationTokenSource();
        Assert.ThrowsAny<OperationCanceledException>(() => UncertaintyFiles.Write(folder, "job", Study(2), ["bore_m"], Report, _ => stop.Cancel(), stop.Token));
        Assert.False(Directory.Exists(folder));
    }

    [Fact]
    public void The_picture_is_a_page()
    {
        Write("job", 2);
        using SKBitmap picture = SKBitmap.Decode(Path.Combine(folder, "job.uncertainty.png"));
        Assert.Equal((1240, 1700), (picture.Width, picture.Height));
    }

    private UncertaintyReport Write(string name, int threads) =>
        UncertaintyFiles.Write(folder, name, Study(threads), ["bore_m"], Report, _ => { }, TestContext.Current.CancellationToken).Report;

    private static UncertaintyStudy Study(int threads) => new()
    {
        Parameters = [new UncertainParameter("bore", "m", new LogNormalSpread { Median = 0.05, LogDeviation = 0.03 })],
        Make = values => CaseJob.Of(() => Jobs.OrificeDrain(bore: values[0])),
        Samples = 64,
        Runs = new OrderedRuns { Threads = threads },
    };

    private static UncertaintyReport Report(UncertaintyResult result) => new()
    {
        Name = "job",
        Title = "A job",
        Result = result,
        Job = Jobs.OrificeDrain(),
    };
}
