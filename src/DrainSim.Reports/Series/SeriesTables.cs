using CsvHelper;
using DrainSim.Draining;
using DrainSim.Reports.Measures;
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

    /// <summary>
    /// Writes the time series at <see cref="SampleTimes"/>: <see cref="Columns"/>, the flow of each line where there are
    /// several, and the clock where the job has one. A cell is empty where a quantity is absent.
    /// </summary>
    /// <param name="stream">receives UTF-8; left open</param>
    /// <param name="result">the run</param>
    /// <param name="clock">the clock of the job; null where it has none</param>
    /// <exception cref="IOException">the stream refuses</exception>
    public static void WriteSeries(Stream stream, DrainResult result, Clock? clock = null)
    {
        using CsvWriter csv = CsvWriter.Create(stream, Options, leaveOpen: true);
        csv.WriteRecord([.. SeriesColumns, .. LineColumns(result), .. ClockColumn(clock)]);
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
            foreach (double flow in now.LineFlows ?? [])
            {
                csv.WriteField(flow);
            }
            WriteClock(csv, clock, time);
            csv.EndRecord();
        }
    }

    /// <summary>Writes the events in time order.</summary>
    /// <param name="stream">receives UTF-8; left open</param>
    /// <param name="result">the run</param>
    /// <param name="clock">the clock of the job; null where it has none</param>
    /// <exception cref="IOException">the stream refuses</exception>
    public static void WriteEvents(Stream stream, DrainResult result, Clock? clock = null)
    {
        using CsvWriter csv = CsvWriter.Create(stream, Options, leaveOpen: true);
        csv.WriteRecord([.. EventsColumns, .. ClockColumn(clock)]);
        foreach (DrainEvent moment in result.Events)
        {
            csv.WriteField(moment.Time);
            csv.WriteField(ReportCodes.Of(moment.Code));
            csv.WriteField(moment.Level);
            csv.WriteField(moment.Volume);
            csv.WriteField(EventWording.Text(moment, result.Job));
            WriteClock(csv, clock, moment.Time);
            csv.EndRecord();
        }
    }

    private static IEnumerable<string> LineColumns(DrainResult result) => result.Lines.Count > 1
        ? result.Lines.Select((line, i) => $"flow_{LimitWording.NameOf(line.DrawOff.Line, i).Replace(' ', '_')}_m3_s")
        : [];

    private static string[] ClockColumn(Clock? clock) => clock is null ? [] : ["clock"];

    private static void WriteClock(CsvWriter csv, Clock? clock, double time)
    {
        if (clock is not null)
        {
            csv.WriteField(clock.Iso(time));
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
