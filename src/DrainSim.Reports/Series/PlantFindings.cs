using System.Text.Json;
using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;

namespace DrainSim.Reports.Series;

/// <summary>What a result document says of the job's limits and of each line.</summary>
internal static class PlantFindings
{
    /// <summary>Writes the arrays <c>limits</c> and <c>lines</c>.</summary>
    public static void Write(Utf8JsonWriter json, DrainResult result, MeasureFormat format)
    {
        json.WriteStartArray("limits");
        foreach (LimitCheck check in result.LimitChecks)
        {
            json.WriteStartObject();
            json.WriteString("limit", LimitWording.Code(check.Kind));
            json.WriteBoolean("kept", check.IsKept);
            json.WriteNumber("bound", check.Bound);
            Number(json, "worst", double.IsFinite(check.Worst.Value) ? check.Worst.Value : null);
            json.WriteNumber("time_s", check.Worst.Time);
            json.WriteString("text", LimitWording.Text(check, format));
            json.WriteEndObject();
        }
        json.WriteEndArray();
        json.WriteStartArray("lines");
        for (int i = 0; i < result.Lines.Count; i++)
        {
            WriteLine(json, result.Lines[i]);
        }
        json.WriteEndArray();
    }

    private static void WriteLine(Utf8JsonWriter json, LineResult line)
    {
        json.WriteStartObject();
        json.WriteString("name", line.DrawOff.Line.Name);
        json.WriteString("outcome", line.Outcome is { } outcome ? OutcomeCodes.Code(outcome) : null);
        json.WriteNumber("stopped_at_s", line.StoppedAt);
        json.WriteNumber("delivered_volume_m3", line.DeliveredVolume);
        json.WriteNumber("least_low_point_pressure_Pa", line.LeastLowPointPressure.Value);
        json.WriteNumber("least_margin_Pa", line.LeastMargin.Value);
        json.WriteNumber("largest_flow_m3_s", line.LargestFlow.Value);
        json.WriteNumber("largest_velocity_m_s", line.LargestVelocity.Value);
        Number(json, "ran_full_at_s", line.RanFullAt);
        Number(json, "outer_leg_froude", line.OuterLegFroude);
        Number(json, "yield_head_m", line.YieldHead);
        Number(json, "receiver_level_m", line.ReceiverLevel);
        json.WriteEndObject();
    }

    private static void Number(Utf8JsonWriter json, string name, double? value)
    {
        if (value is { } number)
        {
            json.WriteNumber(name, number);
        }
        else
        {
            json.WriteNull(name);
        }
    }
}
