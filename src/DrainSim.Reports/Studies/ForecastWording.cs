using System.Diagnostics;
using System.Globalization;
using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using DrainSim.Studies.Forecasting;

namespace DrainSim.Reports.Studies;

/// <summary>What a forecast says to people.</summary>
public static class ForecastWording
{
    /// <summary>The verdict in a few sentences: when it will be over, how sure that is, and what was planned.</summary>
    public static string Sentence(ForecastReport report)
    {
        ArgumentNullException.ThrowIfNull(report);
        ForecastResult result = report.Result;
        FinishBand finish = result.Finish;
        string band = finish switch
        {
            { Low: { } low, High: { } high } => $", between {report.Moment(low, finish.Best)} and {report.Moment(high, finish.Best)} (95 %)",
            { Low: { } low } => $", not before {report.Moment(low, finish.Best)} (95 %), and it may never end so",
            _ => ", with no band: the readings do not tell the parameters",
        };
        string planned = result.Before.Outcome == result.Run.Outcome
            ? $" As the scenario stood it would have been {report.Moment(result.Before.StoppedAt)}."
            : $" As the scenario stood: {Verdict.Headline(result.Before.Outcome)}, {report.Moment(result.Before.StoppedAt)}.";
        string found = Best(result) is { } best ? $" But the readings speak of {Name(best)}: look for it." : "";
        return $"{Headline(result.Run.Outcome)} {report.Moment(finish.Best)}{band}.{planned}{found}";
    }

    /// <summary>What an estimate says: value, interval, and what the scenario had.</summary>
    public static string Text(Estimate estimate)
    {
        ArgumentNullException.ThrowIfNull(estimate);
        string unit = estimate.Parameter.Unit.Length == 0 ? "" : " " + estimate.Parameter.Unit;
        string interval = double.IsFinite(estimate.Low) ? $"{Figure(estimate.Low)} to {Figure(estimate.High)}{unit}" : "not told by the readings";
        return $"{Figure(estimate.Value)}{unit} ({interval}); scenario {Figure(estimate.Parameter.Start)}{unit}";
    }

    /// <summary>Whether the parameters are told apart.</summary>
    public static string Text(ForecastResult result, Separation separation)
    {
        ArgumentNullException.ThrowIfNull(result);
        string index = double.IsFinite(result.ConditionIndex)
            ? string.Create(CultureInfo.InvariantCulture, $" (condition index {result.ConditionIndex:0.#})") : "";
        return separation switch
        {
            Separation.Apart when result.Estimates.Count == 1 => "The readings tell the parameter.",
            Separation.Apart => $"The readings tell the parameters apart{index}.",
            Separation.Hardly => $"The readings hardly tell the parameters apart{index}: trust the finish, mistrust the single values.",
            Separation.NotApart => $"The readings do not tell the parameters apart{index}: fit fewer.",
            _ => throw new UnreachableException(separation.ToString()),
        };
    }

    /// <summary>How the readings scatter.</summary>
    public static string Scatter(ForecastResult result, MeasureFormat format)
    {
        ArgumentNullException.ThrowIfNull(result);
        ArgumentNullException.ThrowIfNull(format);
        string size = string.Create(CultureInfo.InvariantCulture, $"The {result.Residuals.Count} readings lie {format.Length(result.RootMeanSquare)} about the curve (root mean square), {result.Scatter:0.0} times what the instrument's resolution leaves");
        return result.Scatter > 1 ? $"{size}; the intervals are widened by that." : $"{size}; the intervals are those of the instrument.";
    }

    /// <summary>What another explanation is worth.</summary>
    public static string Text(Alternative alternative, ForecastReport report)
    {
        ArgumentNullException.ThrowIfNull(alternative);
        ArgumentNullException.ThrowIfNull(report);
        string name = Name(alternative);
        if (alternative.FinishedAt is not { } finish)
            return $"No sign of {name}: the readings want none.";
        Measures.Unit unit = report.Format.FlowUnit(alternative.Flow);
        string flow = MeasureFormat.Number(unit.From(alternative.Flow))
            + (alternative.FlowError is { } error ? $" ± {MeasureFormat.Number(unit.From(error))}" : "") + " " + unit.Sign;
        string test = string.Create(CultureInfo.InvariantCulture, $"F-test {alternative.PValue:0.000}")
            + (alternative.CriterionGain is { } gain ? string.Create(CultureInfo.InvariantCulture, $", AICc {(gain > 0 ? "better" : "worse")} by {Math.Abs(gain):0.0}") : "");
        return !alternative.IsFound ? $"No reason to look for {name}: it would not explain the readings better ({test})."
            : alternative == Best(report.Result)
                ? $"LOOK FOR {name.ToUpperInvariant()}: {flow} explains the readings better ({test}); the finish would then be {report.Moment(finish)}."
                : $"{char.ToUpperInvariant(name[0])}{name[1..]} of {flow} would explain them too ({test}), with the finish {report.Moment(finish)}.";
    }

    /// <summary>The alternative that is found and explains the readings best; null where none is.</summary>
    public static Alternative? Best(ForecastResult result)
    {
        ArgumentNullException.ThrowIfNull(result);
        return result.Alternatives.Where(one => one.IsFound).MaxBy(one => one.CriterionGain);
    }

    private static string Name(Alternative alternative) => alternative.Kind == AlternativeKind.Leak ? "a leak" : "a steady inflow";

    private static string Headline(Outcome outcome) => outcome switch
    {
        Outcome.Emptied => "Empty",
        Outcome.TimeLimit => "Not done by",
        _ => Verdict.Headline(outcome) + ":",
    };

    private static string Figure(double value) => value.ToString("G4", CultureInfo.InvariantCulture).Replace('-', '−');
}
