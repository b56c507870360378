using DrainSim.Draining;

namespace DrainSim.Reports.Series;

/// <summary>The times at which a run is reported: even steps, every event, and the end.</summary>
public static class SampleTimes
{
    /// <summary>Most rows that an interval chosen here makes, events not counted.</summary>
    public const int MostRows = 400;

    private static readonly double[] Intervals =
    [
        1, 2, 3, 5, 10, 15, 20, 30,
        60, 120, 180, 300, 600, 900, 1200, 1800,
        3600, 7200, 10800, 21600, 43200,
    ];

    /// <summary>
    /// The interval of a time series, s: the one asked for, else the shortest of 1, 2, 3, 5, 10, 15, 20, 30
    /// seconds or minutes, 1, 2, 3, 6, 12 hours, or 1, 2, 3, 5 times a power of ten of seconds or days outside
    /// that range, which gives at most <see cref="MostRows"/> rows.
    /// </summary>
    /// <param name="end">length of the run, s</param>
    /// <param name="asked">the interval asked for, s; null to choose</param>
    public static double Interval(double end, double? asked)
    {
        if (asked is { } interval)
        {
            return interval;
        }
        double least = end / MostRows;
        return least <= 0 ? 1
            : least < 1 ? Decimal(least, 1)
            : Array.Find(Intervals, step => step >= least) is var found and > 0 ? found
            : Decimal(least, 86400);
    }

    /// <summary>Rising times, s: 0, the even steps, the event times, the end.</summary>
    /// <param name="result">the run</param>
    public static IEnumerable<double> Of(DrainResult result)
    {
        double end = result.Trace.End;
        double interval = Interval(end, result.Job.Run.ReportEvery);
        double near = 1e-9 * end;
        double[] fixedTimes =
            [.. result.Events.Select(moment => Math.Clamp(moment.Time, 0, end)).Append(0).Append(end).Distinct().Order()];
        long step = 1;
        for (int i = 0; i < fixedTimes.Length; i++)
        {
            for (; step * interval < fixedTimes[i] - near; step++)
            {
                if (i == 0 || step * interval > fixedTimes[i - 1] + near)
                {
                    yield return step * interval;
                }
            }
            yield return fixedTimes[i];
        }
    }

    private static double Decimal(double least, double unit)
    {
        double power = unit * Math.Pow(10, Math.Floor(Math.Log10(least / unit)));
        foreach (double step in (ReadOnlySpan<double>)[1, 2, 3, 5])
        {
            if (step * power >= least * (1 - 1e-12))
            {
                return step * power;
            }
        }
        return 10 * power;
    }
}
