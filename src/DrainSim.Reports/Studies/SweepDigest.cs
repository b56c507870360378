using System.Globalization;
using DrainSim.Reports.Measures;

namespace DrainSim.Reports.Studies;

/// <summary>The rows of a sweep in a few lines: outcomes counted, the quickest and the slowest, the least margin.</summary>
public sealed class SweepDigest
{
    private readonly Dictionary<string, long> outcomes = [];
    private SweepRow? quickest, slowest, tightest;
    private long count, broken;

    /// <summary>The outcomes with their counts, the most frequent first.</summary>
    public string Outcomes => string.Join(", ", outcomes.OrderByDescending(pair => pair.Value).ThenBy(pair => pair.Key, StringComparer.Ordinal)
        .Select(pair => string.Create(CultureInfo.InvariantCulture, $"{pair.Value} {pair.Key}")));

    /// <summary>Adds a row.</summary>
    public void Add(SweepRow row)
    {
        ArgumentNullException.ThrowIfNull(row);
        count++;
        outcomes[row.Outcome] = outcomes.GetValueOrDefault(row.Outcome) + 1;
        broken += row.LimitsBroken.Length > 0 ? 1 : 0;
        if (row.DrainTime is { } time)
        {
            quickest = time < (quickest?.DrainTime ?? double.PositiveInfinity) ? row : quickest;
            slowest = time > (slowest?.DrainTime ?? double.NegativeInfinity) ? row : slowest;
        }

        tightest = row.LeastMargin < (tightest?.LeastMargin ?? double.PositiveInfinity) ? row : tightest;
    }

    /// <summary>The extremes in words, each in a line with its full stop.</summary>
    /// <param name="format">writes the measures</param>
    public IEnumerable<string> Lines(MeasureFormat format)
    {
        ArgumentNullException.ThrowIfNull(format);
        if (quickest is not null && slowest is not null)
        {
            yield return $"Drain time from {MeasureFormat.Duration(quickest.DrainTime!.Value)} ({Of(quickest)}) "
                + $"to {MeasureFormat.Duration(slowest.DrainTime!.Value)} ({Of(slowest)}).";
        }

        if (tightest is not null)
            yield return $"Least margin at the low point {format.Pressure(tightest.LeastMargin!.Value)} ({Of(tightest)}).";
        if (broken > 0)
            yield return string.Create(CultureInfo.InvariantCulture, $"{broken} of {count} cases break a limit.");
    }

    private static string Of(SweepRow row) => string.Create(CultureInfo.InvariantCulture, $"case {row.Case}");
}
