using System.Text.Json;
using DrainSim.Reports.Series;
using DrainSim.Reports.Wording;
using DrainSim.Studies.Sampling;
using DrainSim.Studies.Uncertainty;

namespace DrainSim.Reports.Studies;

/// <summary>All that an uncertainty study found, as one JSON object in SI units.</summary>
public static class UncertaintyDocument
{
    /// <summary>Writes the document.</summary>
    /// <param name="stream">receives UTF-8; left open</param>
    /// <param name="report">the study and how it is told</param>
    /// <exception cref="IOException">the stream refuses</exception>
    public static void Write(Stream stream, UncertaintyReport report)
    {
        ArgumentNullException.ThrowIfNull(report);
        StudyJson.Write(stream, json =>
        {
            UncertaintyResult result = report.Result;
            json.WriteString("title", report.Title);
            json.WriteString("drainsim", ResultDocument.Version);
            json.WriteString("study", "uncertainty");
            json.WriteString("sentence", UncertaintyWording.Sentence(result));
            WritePlan(json, result);
            json.List("outcomes", result.Outcomes, one =>
            {
                json.WriteString("outcome", OutcomeCodes.Code(one.Outcome));
                WriteChance(json, one.Chance);
            });
            json.List("limits", result.Limits, one =>
            {
                json.WriteString("limit", LimitWording.Code(one.Kind));
                json.Number("bound", one.Bound);
                WriteChance(json, one.Kept);
            });
            json.Number("all_limits_kept_share", result.AllLimits?.Share);
            WritePercentiles(json, "drain_time", "_s", result.DrainTime);
            WritePercentiles(json, "left_volume", "_m3", result.LeftVolume);
            json.Number("drain_time_explained", result.DrainTimeShares?.Explained);
            json.Number("left_volume_explained", result.LeftVolumeShares?.Explained);
            WriteFan(json, result.Fan);
        });
    }

    /// <summary>Writes the level over time in bands.</summary>
    internal static void WriteFan(Utf8JsonWriter json, LevelFan fan)
    {
        json.WriteStartObject("level_bands");
        json.Numbers("time_s", fan.Times);
        json.List("bands", Enumerable.Range(0, fan.Shares.Count), k =>
        {
            json.Number("share", fan.Shares[k]);
            json.Numbers("level_m", fan.Levels[k]);
        });
        json.WriteEndObject();
    }

    private static void WritePlan(Utf8JsonWriter json, UncertaintyResult result)
    {
        UncertaintyStudy study = result.Study;
        json.WriteNumber("samples", result.Count);
        json.WriteNumber("repetitions", SamplePlan.Repetitions);
        json.WriteString("sampling", study.Method == SamplingMethod.Sobol ? "sobol" : "latin_hypercube");
        json.WriteNumber("seed", study.Seed);
        json.WriteNumber("impossible", result.Refused);
        json.WriteString("impossible_because", result.FirstFault);
        json.List("parameters", Enumerable.Range(0, study.Parameters.Count), j =>
        {
            UncertainParameter parameter = study.Parameters[j];
            json.WriteString("path", parameter.Path);
            json.WriteString("unit", parameter.Unit.Length == 0 ? "1" : parameter.Unit);
            json.WriteString("spread", parameter.Spread.Text(parameter.Unit));
            json.WriteString("source", parameter.Source);
            json.Number("drain_time_share", result.DrainTimeShares?.Shares[j]);
            json.Number("left_volume_share", result.LeftVolumeShares?.Shares[j]);
        });
        json.List("correlations", study.Correlations, pair =>
        {
            json.WriteString("first", study.Parameters[pair.First].Path);
            json.WriteString("second", study.Parameters[pair.Second].Path);
            json.Number("rank_correlation", pair.Coefficient);
        });
    }

    private static void WriteChance(Utf8JsonWriter json, Chance chance)
    {
        json.WriteNumber("count", chance.Count);
        json.Number("share", chance.Share);
        json.Number("share_low", chance.Low);
        json.Number("share_high", chance.High);
    }

    private static void WritePercentiles(Utf8JsonWriter json, string name, string unit, IReadOnlyList<Percentile> percentiles) =>
        json.List(name + "_percentiles", percentiles, one =>
        {
            json.Number("share", one.Share);
            json.Number("value" + unit, one.Value);
            json.Number("error" + unit, one.Error);
        });
}
