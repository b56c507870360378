using System.Globalization;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using DrainSim.Studies.Uncertainty;

namespace DrainSim.Reports.Studies;

/// <summary>What an uncertainty study says to people.</summary>
public static class UncertaintyWording
{
    /// <summary>The verdict in one sentence or two.</summary>
    public static string Sentence(UncertaintyResult result)
    {
        ArgumentNullException.ThrowIfNull(result);
        Percentile low = result.DrainTime[0], middle = result.DrainTime[2], high = result.DrainTime[^1];
        string ends = Ends(result);
        if (!double.IsFinite(middle.Value))
            return $"In more than half of the cases the job is not done. {ends}";
        string reach = double.IsFinite(high.Value)
            ? $"in 90 of 100 cases between {MeasureFormat.Duration(low.Value)} and {MeasureFormat.Duration(high.Value)}"
            : $"in 95 of 100 cases at least {MeasureFormat.Duration(low.Value)}";
        return $"Takes {MeasureFormat.Duration(middle.Value)} in the middle case, {reach}. {ends}";
    }

    /// <summary>A time with its sampling error.</summary>
    public static string Time(Percentile percentile) => !double.IsFinite(percentile.Value)
        ? "not done"
        : MeasureFormat.Duration(percentile.Value) + (percentile.Error is { } error ? $" ± {MeasureFormat.Duration(error)}" : "");

    /// <summary>A volume with its sampling error.</summary>
    public static string Volume(Percentile percentile, MeasureFormat format)
    {
        ArgumentNullException.ThrowIfNull(format);
        return format.Volume(percentile.Value) + (percentile.Error is { } error and > 0 ? $" ± {format.Volume(error)}" : "");
    }

    /// <summary>A chance in percent with its interval.</summary>
    public static string Chance(Chance chance) => string.Create(CultureInfo.InvariantCulture,
        $"{100 * chance.Share:0.##} % ({100 * chance.Low:0.#} to {100 * chance.High:0.#} %)");

    /// <summary>'P5'.</summary>
    public static string Name(Percentile percentile) => string.Create(CultureInfo.InvariantCulture, $"P{100 * percentile.Share:0.#}");

    /// <summary>A share of the spread.</summary>
    public static string Share(double share) => string.Create(CultureInfo.InvariantCulture, $"{100 * share:0} %");

    /// <summary>What the shares mean, for the foot of a table.</summary>
    public static string SharesNote(SpreadShares shares) => string.Create(CultureInfo.InvariantCulture,
        $"Shares of the spread by rising or falling effects, from a regression of normal scores; together {100 * shares.Explained:0} %. The rest is bends and interplay.");

    private static string Ends(UncertaintyResult result)
    {
        OutcomeChance first = result.Outcomes[0];
        string headline = Verdict.Headline(first.Outcome);
        if (result.Outcomes.Count == 1)
            return $"{headline} in every one of {first.Chance.Of} runs.";
        string all = string.Join("; ", result.Outcomes.Take(3).Select(one =>
            string.Create(CultureInfo.InvariantCulture, $"{Verdict.Headline(one.Outcome).ToLowerInvariant()} in {100 * one.Chance.Share:0.##} %")));
        return char.ToUpperInvariant(all[0]) + all[1..] + ".";
    }
}
