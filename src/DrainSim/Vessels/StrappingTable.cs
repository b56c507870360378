namespace DrainSim.Vessels;

/// <summary>A tank known by its strapping table: measured volumes at measured levels.</summary>
/// <remarks>
/// Between the rows the volume is a monotone cubic (F. N. Fritsch and R. E. Carlson, SIAM J. Numer. Anal. 17
/// (1980) 238–246) with the slopes of F. N. Fritsch and J. Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300–304:
/// <code>
/// 3·(h0 + h1)/m = (h0 + 2·h1)/δ0 + (2·h0 + h1)/δ1
///
/// m        area at a row, m²
/// h0, h1   distance to the row below and above, m
/// δ0, δ1   mean area to the row below and above, m²
/// </code>
/// and the usual three-point formula at the ends. So the area is continuous, and follows no single row into a
/// dip or a hump. Slopes are kept between 0.1 and 2.5 of the mean areas beside them, which keeps the area
/// greater than 0 between the rows too.
/// <para>
/// The first row is level 0. Its volume is the bottoms: liquid below the dip point, that no level
/// shows and that cannot drain. It counts in every volume, and <see cref="Level"/> is 0 from there down.
/// </para>
/// <para>Two tables are equal when their rows are equal.</para>
/// </remarks>
public sealed record StrappingTable : Vessel
{
    private const int MostRows = 100_000;
    private const double LeastSlope = 0.1;
    private const double MostSlope = 2.5;
    private const double KinkThatMatters = 0.1;

    private double[] levels = [];
    private double[] volumes = [];
    private double[] areas = [];
    private double[] kinks = [];

    /// <summary>Rows of level, m, and volume, m³; both rise strictly, the first level is 0 and its volume at least 0.</summary>
    /// <exception cref="ArgumentOutOfRangeException">fewer than two rows, a row that does not rise, a first level other than 0</exception>
    public required IReadOnlyList<(double Level, double Volume)> Rows
    {
        get;
        init
        {
            (double Level, double Volume)[] rows = [.. value];
            Check(rows);
            field = rows;
            levels = [.. rows.Select(row => row.Level)];
            volumes = [.. rows.Select(row => row.Volume)];
            areas = AreasAtRows(levels, volumes);
            kinks = [.. KinksOf()];
        }
    }

    /// <inheritdoc/>
    public override double Height => levels[^1];

    /// <inheritdoc/>
    public override double Capacity => volumes[^1];

    /// <summary>Rows at which the slope of the area changes so sharply that it changes the area by a tenth from row to row, m.</summary>
    public override IReadOnlyList<double> SectionLevels => kinks;

    /// <inheritdoc/>
    public override double Volume(double level)
    {
        double h = Math.Clamp(level, 0, Height);
        int i = IntervalAt(levels, h);
        return h < levels[i + 1] ? volumes[i] + Between(i).Volume(h - levels[i]) : volumes[i + 1];
    }

    /// <inheritdoc/>
    public override double Area(double level)
    {
        double h = Math.Clamp(level, 0, Height);
        int i = IntervalAt(levels, h);
        return Between(i).Area(h - levels[i]);
    }

    /// <inheritdoc/>
    public override double Level(double volume)
    {
        double v = Math.Clamp(volume, volumes[0], Capacity);
        int i = IntervalAt(volumes, v);
        double step = levels[i + 1] - levels[i];
        double rise = v - volumes[i];
        if (rise <= 0)
            return levels[i];
        double share = rise / (volumes[i + 1] - volumes[i]);
        return share < 1
            ? levels[i] + RisingCurve.Find(new Curve(Between(i)), rise, share * step, step)
            : levels[i + 1];
    }

    /// <summary>Whether the rows are equal one by one.</summary>
    public bool Equals(StrappingTable? other) => other is not null && Rows.SequenceEqual(other.Rows);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Rows.Count, Rows[^1]);

    private static void Check((double Level, double Volume)[] rows)
    {
        Require.Within(rows.Length, 2, MostRows, "length of the strapping table", "rows");
        Require.Within(rows[0].Level, 0, 0, "level in row 1 of the strapping table", "m");
        Require.NotNegative(rows[0].Volume, "volume in row 1 of the strapping table", "m³");
        for (int i = 1; i < rows.Length; i++)
        {
            Require.Positive(rows[i].Level - rows[i - 1].Level, $"rise of the level from row {i} to row {i + 1} of the strapping table", "m");
            Require.Positive(rows[i].Volume - rows[i - 1].Volume, $"rise of the volume from row {i} to row {i + 1} of the strapping table", "m³");
        }
    }

    private static double[] AreasAtRows(double[] levels, double[] volumes)
    {
        int last = levels.Length - 1;
        double[] step = new double[last], mean = new double[last], area = new double[last + 1];
        for (int i = 0; i < last; i++)
        {
            step[i] = levels[i + 1] - levels[i];
            mean[i] = (volumes[i + 1] - volumes[i]) / step[i];
        }
        for (int i = 1; i < last; i++)
        {
            double h0 = step[i - 1], h1 = step[i];
            double m = 3 * (h0 + h1) / ((h0 + 2 * h1) / mean[i - 1] + (2 * h0 + h1) / mean[i]);
            area[i] = Math.Min(m, MostSlope * Math.Min(mean[i - 1], mean[i]));
        }
        area[0] = last > 1 ? EndArea(step[0], step[1], mean[0], mean[1]) : mean[0];
        area[last] = last > 1 ? EndArea(step[^1], step[^2], mean[^1], mean[^2]) : mean[0];
        return area;
    }

    private static double EndArea(double h0, double h1, double mean0, double mean1) =>
        Math.Clamp(((2 * h0 + h1) * mean0 - h0 * mean1) / (h0 + h1), LeastSlope * mean0, MostSlope * mean0);

    private static int IntervalAt(double[] starts, double value)
    {
        int found = Array.BinarySearch(starts, value);
        int i = found >= 0 ? found : ~found - 1;
        return Math.Clamp(i, 0, starts.Length - 2);
    }

    private TableInterval Between(int i) =>
        new(levels[i + 1] - levels[i], volumes[i + 1] - volumes[i], areas[i], areas[i + 1]);

    private IEnumerable<double> KinksOf()
    {
        for (int i = 1; i < levels.Length - 1; i++)
        {
            double step = Math.Min(levels[i] - levels[i - 1], levels[i + 1] - levels[i]);
            double bend = Math.Abs(Between(i).AreaSlope(0) - Between(i - 1).AreaSlope(levels[i] - levels[i - 1]));
            if (bend * step > KinkThatMatters * areas[i])
                yield return levels[i];
        }
    }

    private readonly struct Curve(TableInterval interval) : IRisingCurve
    {
        public (double Value, double Slope) At(double x) => (interval.Volume(x), interval.Area(x));
    }
}
