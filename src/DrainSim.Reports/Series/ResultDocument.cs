using System.Text.Encodings.Web;
using System.Text.Json;
using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;

namespace DrainSim.Reports.Series;

/// <summary>All that a run found, as one JSON object in SI units.</summary>
public static class ResultDocument
{
    private static readonly JsonWriterOptions Options = new()
    {
        Indented = true,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    private static readonly double[] Fractions = [0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.99, 1];

    /// <summary>Version of DrainSim that stands in the document.</summary>
    public static string Version { get; } = typeof(ResultDocument).Assembly.GetName().Version!.ToString(3);

    /// <summary>Writes the document.</summary>
    /// <param name="stream">receives UTF-8; left open</param>
    /// <param name="report">the run and how it is told</param>
    /// <exception cref="IOException">the stream refuses</exception>
    public static void Write(Stream stream, RunReport report)
    {
        using (var json = new Utf8JsonWriter(stream, Options))
        {
            json.WriteStartObject();
            json.WriteString("title", report.Title);
            json.WriteString("drainsim", Version);
            WriteFindings(json, report);
            WriteEvents(json, report);
            WriteTimes(json, report.Result);
            PlantFindings.Write(json, report.Result, report.Format);
            WriteAdvice(json, report);
            WriteChecks(json, report.Result);
            WriteInputs(json, report.Inputs);
            json.WriteEndObject();
        }
        stream.WriteByte((byte)'\n');
    }

    private static void WriteFindings(Utf8JsonWriter json, RunReport report)
    {
        DrainResult result = report.Result;
        Instant last = result.Trace.At(result.Trace.End);
        json.WriteString("outcome", OutcomeCodes.Code(result.Outcome));
        json.WriteString("reason", result.NoStart is { } reason ? ReportCodes.Of(reason) : null);
        json.WriteString("sentence", Verdict.Sentence(result, report.Format));
        json.WriteString("begins", report.Clock?.Iso(0));
        Number(json, "stopped_at_s", result.StoppedAt);
        json.WriteString("stopped_at_clock", report.Clock?.Iso(result.StoppedAt));
        Number(json, "initial_volume_m3", result.InitialVolume);
        Number(json, "drained_volume_m3", result.DrainedVolume);
        Number(json, "left_volume_m3", result.LeftVolume);
        Number(json, "final_level_m", result.FinalLevel);
        Extreme(json, "least_low_point_pressure", "_Pa", result.LeastLowPointPressure);
        Extreme(json, "least_margin", "_Pa", result.LeastMargin);
        json.WriteNumber("least_margin_node", result.LeastMarginNode);
        Extreme(json, "largest_flow", "_m3_s", result.LargestFlow);
        Extreme(json, "largest_velocity", "_m_s", result.LargestVelocity);
        Number(json, "receiver_level_m", last.ReceiverLevel);
        Number(json, "headspace_pressure_Pa", last.HeadspacePressure);
        Number(json, "largest_vacuum_Pa", result.LargestVacuum?.Value);
        Number(json, "balance_level_m", result.BalanceLevel);
    }

    private static void WriteEvents(Utf8JsonWriter json, RunReport report)
    {
        json.WriteStartArray("events");
        foreach (DrainEvent moment in report.Result.Events)
        {
            json.WriteStartObject();
            Number(json, "time_s", moment.Time);
            json.WriteString("code", ReportCodes.Of(moment.Code));
            json.WriteString("text", EventWording.Text(moment, report.Result.Job));
            Number(json, "level_m", moment.Level);
            Number(json, "volume_m3", moment.Volume);
            if (report.Clock is { } clock)
            {
                json.WriteString("clock", clock.Iso(moment.Time));
            }
            json.WriteEndObject();
        }
        json.WriteEndArray();
    }

    private static void WriteTimes(Utf8JsonWriter json, DrainResult result)
    {
        json.WriteStartArray("times_to");
        foreach (double fraction in Fractions)
        {
            json.WriteStartObject();
            Number(json, "drained_fraction", fraction);
            Number(json, "time_s", result.Trace.TimeAtVolume((1 - fraction) * result.InitialVolume));
            json.WriteEndObject();
        }
        json.WriteEndArray();
        WriteInstant(json, "first_instant", result.Trace.At(0));
    }

    private static void WriteInstant(Utf8JsonWriter json, string name, Instant now)
    {
        json.WriteStartObject(name);
        Number(json, "level_m", now.Level);
        Number(json, "volume_m3", now.Volume);
        Number(json, "flow_m3_s", now.Flow);
        Number(json, "velocity_m_s", now.Velocity);
        Number(json, "reynolds", now.Reynolds);
        Number(json, "driving_head_m", now.Head);
        Number(json, "low_point_pressure_Pa", now.LowPointPressure);
        Number(json, "low_point_margin_Pa", now.LowPointMargin);
        Number(json, "receiver_level_m", now.ReceiverLevel);
        Number(json, "headspace_pressure_Pa", now.HeadspacePressure);
        json.WriteEndObject();
    }

    private static void WriteAdvice(Utf8JsonWriter json, RunReport report)
    {
        MeasureFormat format = report.Format;
        WriteStories(json, "warnings", report.Result.Warnings.Select(warning =>
            (ReportCodes.Of(warning.Code), (double?)warning.Number, EventWording.Text(warning, format))));
        json.WriteStartArray("remedies");
        foreach (Remedy remedy in report.Result.Remedies)
        {
            json.WriteStartObject();
            json.WriteString("code", ReportCodes.Of(remedy.Kind));
            Number(json, "change", remedy.Change);
            Number(json, "value", remedy.Value);
            json.WriteString("proved_outcome", OutcomeCodes.Code(remedy.ProvedOutcome));
            Number(json, "proved_stopped_at_s", remedy.ProvedTime);
            Number(json, "proved_final_level_m", remedy.ProvedLevel);
            json.WriteString("text", EventWording.Text(remedy, format));
            json.WriteEndObject();
        }
        json.WriteEndArray();
        WriteStories(json, "cautions", Cautions.For(report.Result, format).Select(caution =>
            (caution.Code, (double?)null, caution.Text)));
    }

    private static void WriteStories(
        Utf8JsonWriter json, string name, IEnumerable<(string Code, double? Number, string Text)> stories)
    {
        json.WriteStartArray(name);
        foreach ((string code, double? number, string text) in stories)
        {
            json.WriteStartObject();
            json.WriteString("code", code);
            if (number is { } value)
            {
                Number(json, "number", value);
            }
            json.WriteString("text", text);
            json.WriteEndObject();
        }
        json.WriteEndArray();
    }

    private static void WriteChecks(Utf8JsonWriter json, DrainResult result)
    {
        WriteObject(json, "prime", result.Prime is { } prime
            ?
            [
                ("line_volume_m3", prime.LineVolume),
                ("inner_leg_volume_m3", prime.InnerLegVolume),
                ("outer_leg_volume_m3", prime.OuterLegVolume),
                ("front_elevation_m", prime.FrontElevation),
                ("static_lift_m", prime.StaticLift),
                ("lift_limit_m", prime.LiftLimit),
                ("suction_Pa", prime.Suction),
                ("front_at_start_m", prime.Front ?? double.NaN),
                ("dip_fills", prime.DipFills ?? double.NaN),
            ]
            : null);
        WriteObject(json, "fall_back", result.FallBack is { } back
            ?
            [
                ("into_tank_m3", back.IntoTank),
                ("out_of_outlet_m3", back.OutOfOutlet),
                ("level_after_m", back.LevelAfter),
            ]
            : null);
        SteadinessCheck steadiness = result.Steadiness;
        WriteObject(json, "steadiness",
        [
            ("inertia_ratio", steadiness.InertiaRatio),
            ("surface_velocity_ratio", steadiness.SurfaceVelocityRatio),
            ("transition_share", steadiness.TransitionShare),
        ]);
        Counters counters = result.Counters;
        WriteObject(json, "counters",
        [
            ("steps", counters.Steps),
            ("rejected", counters.Rejected),
            ("derivatives", counters.Derivatives),
            ("flow_solutions", counters.FlowSolutions),
            ("event_evaluations", counters.EventEvaluations),
        ]);
    }

    private static void WriteObject(Utf8JsonWriter json, string name, (string Name, double Value)[]? fields)
    {
        if (fields is null)
        {
            json.WriteNull(name);
            return;
        }
        json.WriteStartObject(name);
        foreach ((string field, double value) in fields)
        {
            Number(json, field, value);
        }
        json.WriteEndObject();
    }

    private static void WriteInputs(Utf8JsonWriter json, IReadOnlyList<UnderstoodInput> inputs)
    {
        json.WriteStartArray("inputs");
        foreach (UnderstoodInput input in inputs)
        {
            json.WriteStartObject();
            json.WriteString("path", input.Path);
            if (input.Number is not null)
            {
                Number(json, "value", input.Number);
                json.WriteString("unit", input.Unit);
            }
            else
            {
                json.WriteString("value", input.Text);
            }
            json.WriteString("as_written", input.AsWritten);
            json.WriteBoolean("default", input.IsDefault);
            json.WriteEndObject();
        }
        json.WriteEndArray();
    }

    private static void Extreme(Utf8JsonWriter json, string name, string unit, Extreme extreme)
    {
        Number(json, name + unit, extreme.Value);
        Number(json, name + "_at_s", extreme.Time);
    }

    /// <summary>JSON has no word for a number that is not finite; it is absent then.</summary>
    private static void Number(Utf8JsonWriter json, string name, double? value)
    {
        if (value is { } number && double.IsFinite(number))
        {
            json.WriteNumber(name, number);
        }
        else
        {
            json.WriteNull(name);
        }
    }
}
