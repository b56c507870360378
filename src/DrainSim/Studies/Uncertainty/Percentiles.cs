using DrainSim.Studies.Sampling;
using MathNet.Numerics.Distributions;
using MathNet.Numerics.Statistics;

namespace DrainSim.Studies.Uncertainty;

/// <summary>The percentiles that a planner reads, with their sampling errors.</summary>
/// <remarks>
/// Of n values in order the percentile at share p is the (n + 1/3)·p + 1/3 th (R. J. Hyndman, Y. Fan, American
/// Statistician 50 (1996) 361–365, definition 8). Its error is Student's interval of the same percentile over the
/// independent repetitions of the plan: t·s/√R with R − 1 degrees of freedom.
/// </remarks>
public static class Percentiles
{
    private static readonly double[] ReadShares = [0.05, 0.10, 0.50, 0.90, 0.95];

    /// <summary>The shares: P5, P10, P50, P90, P95.</summary>
    public static IReadOnlyList<double> Shares => ReadShares;

    /// <summary>The percentiles of a result over all runs.</summary>
    /// <param name="values">value and repetition of each run; positive infinity for a run that never came to an end</param>
    internal static Percentile[] Of(IReadOnlyList<(double Value, int Repetition)> values)
    {
        double[] all = [.. values.Select(one => one.Value).Order()];
        double[][] parts = [.. values.GroupBy(one => one.Repetition).Select(part => part.Select(one => one.Value).Order().ToArray())];
        return [.. ReadShares.Select(share => new Percentile(share, At(all, share), Error(parts, share)))];
    }

    /// <summary>A percentile of sorted values, of which the last may be infinite; NaN for none.</summary>
    /// <param name="sorted">the values, rising</param>
    /// <param name="share">the share, from 0 to 1</param>
    internal static double At(double[] sorted, double share)
    {
        if (sorted.Length == 0 || double.IsFinite(sorted[^1]))
            return SortedArrayStatistics.Quantile(sorted, share);
        double place = Math.Clamp((sorted.Length + 1 / 3.0) * share - 2 / 3.0, 0, sorted.Length - 1);
        int below = (int)place, above = Math.Min(below + 1, sorted.Length - 1);
        double part = place - below;
        return part == 0 || double.IsInfinity(sorted[below]) ? sorted[below] : sorted[below] + part * (sorted[above] - sorted[below]);
    }

    private static double? Error(double[][] parts, double share)
    {
        double[] each = [.. parts.Select(part => At(part, share))];
        if (each.Length < SamplePlan.Repetitions || !each.All(double.IsFinite))
            return null;
        double t = StudentT.InvCDF(0, 1, each.Length - 1, 0.975);
        return t * Statistics.StandardDeviation(each) / Math.Sqrt(each.Length);
    }
}
