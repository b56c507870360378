using CsvHelper;
using DrainSim.Draining;
using DrainSim.Reports.Wording;

namespace DrainSim.Reports.Series;

/// <summary>The time series and the events of a run as CSV: SI, invariant, shortest round-trip numbers.</summary>
public static class SeriesTables
{
    /// <summary>The columns of the time series, in order.</summary>
    public static IReadOnlyList<string> Columns => SeriesColumns;

    /// <summary>The columns of the events, in order.</summary>
    public static IReadOnlyList<string> EventColumns => EventsColumns;

    private static readonly string[] SeriesColumns =
    [
        "time_s", "level_m", "volume_m3", "flow_m3_s", "velocity_m_s", "reynolds",
        "low_point_pressure_Pa", "low_point_margin_Pa", "receiver_level_m", "headspace_pressure_Pa",
    ];

    private static readonly string[] EventsColumns = ["time_s", "code", "level_m", "volume_m3", "text"];

    private static readonly CsvWriterOptions Options = new() { NewLine = "\n" };

    /// <summary>Writes the time series at <see cref="SampleTimes"/>; a cell is empty where a quantity is absent.</summary>
    /// <param name="stream">receives UTF-8; left open</param>
    /// <param name="result">the run</param>
    /// <exception cref="IOException">the stream refuses</exception>
    public static void WriteSeries(Stream stream, DrainResult result)
    {
        using CsvWriter csv = CsvWriter.Create(stream, Options, leaveOpen: true);
        csv.WriteRecord(SeriesColumns);
        foreach (double time in SampleTimes.Of(result))
        {
            Instant now = result.Trace.At(time);
            csv.WriteField(time);
            csv.WriteField(now.Level);
            csv.WriteField(now.Volume);
            csv.WriteField(now.Flow);
            csv.WriteField(now.Velocity);
            csv.WriteField(now.Reynolds);
            csv.WriteField(now.LowPointPressure);
            csv.WriteField(now.LowPointMargin);
            WriteOptional(csv, now.ReceiverLevel);
            WriteOptional(csv, now.HeadspacePressure);
            csv.EndRecord();
        }
    }

    /// <summary>Writes the events in time order.</summary>
    /// <param name="stream">receives UTF-8; left open</param>
    /// <param name="result">the run</param>
    /// <exception cref="IOException">the stream refuses</exception>
    public static void WriteEvents(Stream stream, DrainResult result)
    {
        using CsvWriter csv = CsvWriter.Create(stream, Options, leaveOpen: true);
        csv.WriteRecord(EventsColumns);
        foreach (DrainEvent moment in result.Events)
        {
            csv.WriteField(moment.Time);
            csv.WriteField(ReportCodes.Of(moment.Code));
            csv.WriteField(moment.Level);
            csv.WriteField(moment.Volume);
            csv.WriteField(EventWording.Text(moment, result.Job));
            csv.EndRecord();
        }
    }

    private static void WriteOptional(CsvWriter csv, double? value)
    {
        if (value is { } number)
        {
            csv.WriteField(number);
        }
        else
        {
            csv.WriteField("");
        }
    }
}
