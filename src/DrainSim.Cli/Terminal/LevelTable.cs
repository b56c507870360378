using System.Globalization;
using DrainSim.Draining;
using DrainSim.Reports.Measures;

namespace DrainSim.Cli.Terminal;

/// <summary>The levels that a crew should find with a dipstick while the job runs.</summary>
internal static class LevelTable
{
    /// <summary>Most even steps from the start to the end.</summary>
    private const int MostSteps = 9;

    /// <summary>Steps that a watch shows well, s.</summary>
    private static readonly double[] Steps =
    [
        1, 2, 3, 5, 10, 15, 20, 30,
        60, 120, 180, 300, 600, 900, 1200, 1800,
        3600, 2 * 3600, 3 * 3600, 6 * 3600, 12 * 3600,
        86400, 2 * 86400, 3 * 86400, 5 * 86400, 10 * 86400, 20 * 86400, 30 * 86400, 50 * 86400, 100 * 86400,
    ];

    /// <summary>The lines of the table, its heading first; none for a run that never started.</summary>
    /// <param name="result">the run</param>
    /// <param name="format">writes the measures</param>
    /// <param name="clock">the clock of the job, at whose even steps the crew then dips; null where it has none</param>
    public static IEnumerable<string> Lines(DrainResult result, MeasureFormat format, Clock? clock)
    {
        if (result.StoppedAt <= 0)
            yield break;
        Unit length = format.LengthUnit(result.Job.Level);
        Unit volume = format.VolumeUnit(result.InitialVolume);
        string heading = clock is null ? "" : $"{"clock",-14}";
        yield return $"  {heading}{"time",-12}{"level",11}{"volume",14}{"gone",9}";
        foreach (double time in clock is null ? Times(result.StoppedAt) : ClockTimes(result.StoppedAt, clock))
        {
            Instant now = result.Trace.At(time);
            string level = Measure(now.Level, length, LengthDecimals(length));
            string left = Measure(now.Volume, volume, VolumeDecimals(result.InitialVolume, volume));
            double gone = result.InitialVolume > 0 ? 1 - now.Volume / result.InitialVolume : 0;
            string share = Math.Max(0, 100 * gone).ToString("0", CultureInfo.InvariantCulture) + " %";
            string shown = clock is null ? "" : $"{(result.StoppedAt < 600 ? clock.OfDay(time, result.StoppedAt) : clock.DayAndTime(time)),-14}";
            yield return $"  {shown}{MeasureFormat.Duration(time),-12}{level,11}{left,14}{share,9}";
        }
    }

    /// <summary>The start, even steps, and the end; a step close before the end is left out.</summary>
    internal static IEnumerable<double> Times(double end)
    {
        double step = Step(end);
        for (int i = 0; i * step < end - 0.1 * step; i++)
            yield return i * step;
        yield return end;
    }

    /// <summary>The start, even steps of the clock, and the end; a step close to either is left out.</summary>
    internal static IEnumerable<double> ClockTimes(double end, Clock clock)
    {
        double step = Step(end);
        yield return 0;
        for (double time = clock.FirstEven(step); time < end - 0.1 * step; time += step)
        {
            if (time > 0.1 * step)
                yield return time;
        }
        yield return end;
    }

    private static double Step(double end)
    {
        foreach (double step in Steps)
        {
            if (end <= MostSteps * step)
                return end < Steps[0] ? end / MostSteps : step;
        }
        double days = Math.Pow(10, Math.Ceiling(Math.Log10(end / 86400 / MostSteps)));
        return days * 86400;
    }

    private static string Measure(double value, Unit unit, int decimals) =>
        unit.From(value).ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture)
        + " " + unit.Sign;

    /// <summary>A dipstick is read to a millimetre or an eighth of an inch.</summary>
    private static int LengthDecimals(Unit unit) => unit.Sign switch
    {
        "m" => 3,
        "ft" => 2,
        "in" => 1,
        _ => 0,
    };

    /// <summary>Three figures of the volume at the start.</summary>
    private static int VolumeDecimals(double initial, Unit unit) =>
        Math.Clamp(2 - (int)Math.Floor(Math.Log10(Math.Max(unit.From(initial), 1e-3))), 0, 3);
}
