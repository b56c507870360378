using System.Globalization;

namespace DrainSim.Reports.Measures;

/// <summary>The ticks of an axis at round numbers, labelled alike on every machine.</summary>
internal sealed class AxisTicks
{
    /// <summary>Share of the axis at its upper end that bears no tick, so that no label meets what stands beyond.</summary>
    private const double HeadRoom = 0.02;

    private static readonly double[] TimeSteps = [1, 2, 5, 10, 15, 20, 30, 60, 120];
    private static readonly double[] HourSteps = [0.25, 0.5, 1, 2, 3, 6, 12, 24];

    private static readonly double[] ClockSteps =
    [
        1, 2, 5, 10, 15, 30, 60, 120, 300, 600, 900, 1800, 3600, 7200, 10800, 21600, 43200, 86400, 2 * 86400,
    ];

    private AxisTicks(double least, double most, double step)
    {
        int first = (int)Math.Ceiling(least / step - 1e-9);
        int last = (int)Math.Floor((most - HeadRoom * (most - least)) / step + 1e-9);
        int decimals = Math.Max(0, (int)Math.Ceiling(-Math.Log10(step) - 1e-9));
        if (Math.Abs(step - 0.25) < 1e-9)
        {
            decimals = 2;
        }
        Positions = [.. Enumerable.Range(first, Math.Max(0, last - first + 1)).Select(count => count * step)];
        Labels = [.. Positions.Select(at => Label(at, decimals))];
    }

    private AxisTicks(double[] positions, string[] labels) => (Positions, Labels) = (positions, labels);

    /// <summary>An axis without ticks.</summary>
    public static AxisTicks None { get; } = new([], []);

    /// <summary>Where the ticks stand, in the axis's unit.</summary>
    public double[] Positions { get; }

    /// <summary>What they say.</summary>
    public string[] Labels { get; }

    /// <summary>Ticks at 1, 2 or 5 times a power of ten.</summary>
    /// <param name="least">lower end of the axis</param>
    /// <param name="most">upper end</param>
    /// <param name="count">most steps that fit</param>
    public static AxisTicks Decimal(double least, double most, int count) =>
        new(least, most, DecimalStep((most - least) / count));

    /// <summary>Ticks at a few multiples of the powers of ten, on an axis of the values' decimal logarithms.</summary>
    /// <param name="least">logarithm at the lower end of the axis</param>
    /// <param name="most">logarithm at the upper end</param>
    public static AxisTicks Logarithmic(double least, double most)
    {
        double[] values = [.. from power in Enumerable.Range((int)Math.Floor(least), (int)(Math.Ceiling(most) - Math.Floor(least)) + 1)
            from digit in most - least > 3 ? (double[])[1] : most - least > 1 ? [1, 2, 5] : [1, 1.5, 2, 3, 4, 5, 6, 8]
            let value = digit * Math.Pow(10, power)
            where Math.Log10(value) >= least - 1e-9 && Math.Log10(value) <= most - HeadRoom * (most - least)
            select value];
        return new([.. values.Select(Math.Log10)], [.. values.Select(value => value.ToString("G6", CultureInfo.InvariantCulture))]);
    }

    /// <summary>Ticks at given values.</summary>
    /// <param name="values">the values</param>
    public static AxisTicks At(double[] values) =>
        new(values, [.. values.Select(value => value.ToString("G5", CultureInfo.InvariantCulture).Replace('-', '−'))]);

    /// <summary>A tick for each word, at 0, 1, 2 and so on.</summary>
    /// <param name="words">the words</param>
    public static AxisTicks Words(IReadOnlyList<string> words) =>
        new([.. Enumerable.Range(0, words.Count).Select(i => (double)i)], [.. words]);

    /// <summary>Ticks of a time axis from 0, at steps that people count in.</summary>
    /// <param name="unit">the axis's unit</param>
    /// <param name="most">upper end in that unit</param>
    /// <param name="count">most steps that fit</param>
    public static AxisTicks Time(Unit unit, double most, int count)
    {
        double least = most / count;
        double[] steps = unit == Unit.Hour ? HourSteps : unit == Unit.Day ? [] : TimeSteps;
        double step = least < (steps.Length > 0 ? steps[0] / 2 : 0) ? 0 : Array.Find(steps, one => one >= least);
        return new(0, most, step > 0 ? step : DecimalStep(least));
    }

    /// <summary>Ticks at even times of the clock: the time of the day, and the date where a day begins.</summary>
    /// <param name="clock">the clock of the job</param>
    /// <param name="unit">the axis's unit</param>
    /// <param name="most">upper end in that unit</param>
    /// <param name="count">most steps that fit</param>
    public static AxisTicks OfClock(Clock clock, Unit unit, double most, int count)
    {
        double end = most * unit.Size;
        double step = Array.Find(ClockSteps, one => one >= end / count);
        step = step > 0 ? step : 86400 * DecimalStep(end / 86400 / count);
        var times = new List<double>();
        for (double time = clock.FirstEven(step); time <= end * (1 - HeadRoom); time += step)
        {
            times.Add(time);
        }
        return new([.. times.Select(unit.From)], [.. times.Select(time => OfClock(clock.At(time), step))]);
    }

    private static string OfClock(DateTimeOffset at, double step) => at.TimeOfDay == TimeSpan.Zero
        ? at.ToString("d MMM", CultureInfo.InvariantCulture)
        : at.ToString(step < 60 ? "HH:mm:ss" : "HH:mm", CultureInfo.InvariantCulture);

    private static double DecimalStep(double least)
    {
        double power = Math.Pow(10, Math.Floor(Math.Log10(least)));
        return least <= power * (1 + 1e-9) ? power
            : least <= 2 * power ? 2 * power
            : least <= 5 * power ? 5 * power
            : 10 * power;
    }

    private static string Label(double value, int decimals)
    {
        string text = (Math.Abs(value) < 1e-12 ? 0 : value)
            .ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        return text.Replace('-', '−');
    }
}
