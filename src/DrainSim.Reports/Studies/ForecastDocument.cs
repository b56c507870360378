using System.Text.Json;
using DrainSim.Reports.Series;
using DrainSim.Reports.Wording;
using DrainSim.Studies.Forecasting;

namespace DrainSim.Reports.Studies;

/// <summary>All that a forecast found, as one JSON object in SI units.</summary>
public static class ForecastDocument
{
    /// <summary>Writes the document.</summary>
    /// <param name="stream">receives UTF-8; left open</param>
    /// <param name="report">the forecast and how it is told</param>
    /// <exception cref="IOException">the stream refuses</exception>
    public static void Write(Stream stream, ForecastReport report)
    {
        ArgumentNullException.ThrowIfNull(report);
        StudyJson.Write(stream, json =>
        {
            ForecastResult result = report.Result;
            json.WriteString("title", report.Title);
            json.WriteString("drainsim", ResultDocument.Version);
            json.WriteString("study", "forecast");
            json.WriteString("sentence", ForecastWording.Sentence(report));
            json.WriteString("outcome", OutcomeCodes.Code(result.Run.Outcome));
            WriteFinish(json, report);
            json.WriteBoolean("converged", result.IsConverged);
            WriteEstimates(json, result);
            json.WriteNumber("readings", result.Residuals.Count);
            json.WriteNumber("degrees_of_freedom", result.DegreesOfFreedom);
            json.Number("root_mean_square_m", result.RootMeanSquare);
            json.Number("scatter", result.Scatter);
            json.List("alternatives", result.Alternatives, one => WriteAlternative(json, one));
            json.Number("left_volume_m3", result.Run.LeftVolume);
            json.Number("scenario_finish_s", result.Before.StoppedAt);
            json.WriteNumber("draws_left_out", result.RefusedDraws);
            if (result.Band is { } band)
                UncertaintyDocument.WriteFan(json, band);
        });
    }

    private static void WriteFinish(Utf8JsonWriter json, ForecastReport report)
    {
        FinishBand finish = report.Result.Finish;
        (string Name, double? Time)[] times = [("finish", finish.Best), ("finish_low", finish.Low), ("finish_high", finish.High)];
        foreach ((string name, double? time) in times)
            json.Number(name + "_s", time);
        foreach ((string name, double? time) in times)
            json.WriteString(name + "_clock", report is { Clock: { } clock, HasDate: true } && time is { } at ? clock.Iso(at) : null);
    }

    private static void WriteEstimates(Utf8JsonWriter json, ForecastResult result)
    {
        json.List("estimates", result.Estimates, estimate =>
        {
            json.WriteString("path", estimate.Parameter.Path);
            json.WriteString("unit", estimate.Parameter.Unit.Length == 0 ? "1" : estimate.Parameter.Unit);
            json.Number("scenario", estimate.Parameter.Start);
            json.Number("value", estimate.Value);
            json.Number("standard_error", estimate.StandardError);
            json.Number("low", estimate.Low);
            json.Number("high", estimate.High);
        });
        json.WriteStartArray("correlation");
        foreach (IReadOnlyList<double> row in result.Correlation)
            json.Numbers(null, row);
        json.WriteEndArray();
        json.WriteString("separation", result.Separation switch
        {
            Separation.Apart => "apart",
            Separation.Hardly => "hardly",
            _ => "not_apart",
        });
        json.Number("condition_index", result.ConditionIndex);
    }

    private static void WriteAlternative(Utf8JsonWriter json, Alternative alternative)
    {
        json.WriteString("kind", alternative.Kind == AlternativeKind.Leak ? "leak" : "inflow");
        json.WriteBoolean("found", alternative.IsFound);
        json.Number("flow_m3_s", alternative.Flow);
        json.Number("flow_error_m3_s", alternative.FlowError);
        json.Number("f_test_p", alternative.PValue);
        json.Number("aicc_gain", alternative.CriterionGain);
        json.Number("finish_s", alternative.FinishedAt);
    }
}
