using MathNet.Numerics.RootFinding;

namespace DrainSim.Studies;

/// <summary>Finds the values of one parameter at which a result of the run meets a target.</summary>
/// <remarks>
/// The range is walked through in steps, the edges of its impossible stretches are narrowed down, and between every
/// two neighbours with the target between them the value is found by Brent's method; where that fails, as at a jump,
/// by halving. So the bracket holds in any case, and several values are found when they lie further apart than a step.
/// </remarks>
public sealed record Sizing
{
    /// <summary>Width of the last bracket against the value, 1.</summary>
    private const double Width = 1e-9;

    /// <summary>Share of the target by which the result may miss it at a value found, 1; more is a jump.</summary>
    private const double NearEnough = 1e-6;

    private const int MostHalvings = 60;
    private const int EdgeHalvings = 20;

    /// <summary>What has to be met.</summary>
    public required SizingTarget Target { get; init; }

    /// <summary>Lower end of the range, in the parameter's SI unit.</summary>
    public required double From { get; init => field = Require.Finite(value, "range", ""); }

    /// <summary>Upper end of the range; greater than <see cref="From"/>.</summary>
    public required double To { get; init => field = Require.Finite(value, "range", ""); }

    /// <summary>Number of steps through the range; at least 1.</summary>
    public int Steps { get; init => field = (int)Require.Within(value, 1, 1e6, "steps", ""); } = 48;

    /// <summary>Walks through ranges around a value, each wider than the one before, until the target is met in one.</summary>
    /// <param name="target">what has to be met</param>
    /// <param name="around">the value, in the parameter's SI unit</param>
    /// <param name="run">runs the case of a value</param>
    /// <param name="cancellation">ends the search early</param>
    /// <returns>what the first range with a value gives, or the widest</returns>
    public static SizingResult FindAround(
        SizingTarget target, double around, Func<double, CaseResult> run, CancellationToken cancellation = default)
    {
        SizingResult? found = null;
        foreach (double factor in (ReadOnlySpan<double>)[2, 8, 64])
        {
            (double from, double to) = around > 0
                ? (around / factor, around * factor)
                : (around - factor * Math.Max(1, -around), around + factor * Math.Max(1, -around));
            found = new Sizing { Target = target, From = from, To = to }.Find(run, cancellation);
            if (found.Values.Any(value => !value.IsJump || target.Quantity is null))
                break;
        }

        return found!;
    }

    /// <summary>Finds all values in the range.</summary>
    /// <param name="run">runs the case of a value</param>
    /// <param name="cancellation">ends the search early</param>
    /// <exception cref="OperationCanceledException">it was cancelled</exception>
    public SizingResult Find(Func<double, CaseResult> run, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(run);
        int runs = 0;
        List<Point> scan = [];
        for (int i = 0; i <= Steps; i++)
            scan.Add(At(Step(i)));
        for (int i = scan.Count - 1; i > 0; i--)
            scan.InsertRange(i, Edge(scan[i - 1], scan[i], At));
        List<SizedValue> values = [];
        for (int i = 0; i < scan.Count; i++)
        {
            if (scan[i].Excess == 0)
                values.Add(Sized(scan[i], scan[i], scan[i]));
            else if (i > 0 && scan[i - 1].Excess * scan[i].Excess < 0)
                values.Add(Between(scan[i - 1], scan[i], At));
        }

        return new SizingResult
        {
            Target = Target,
            From = From,
            To = To,
            Values = values,
            Scan = [.. scan.Select(point => (point.Value, point.Result))],
            Runs = runs,
        };

        Point At(double value)
        {
            cancellation.ThrowIfCancellationRequested();
            runs++;
            CaseResult result = run(value);
            return new Point(value, result, Target.Excess(result));
        }
    }

    /// <summary>Even ratios where the range is wide and above 0, else even steps.</summary>
    private double Step(int i)
    {
        double share = (double)i / Steps;
        return i == 0 ? From : i == Steps ? To
            : From > 0 && To > 2 * From ? From * Math.Pow(To / From, share)
            : From + share * (To - From);
    }

    /// <summary>The two sides of the edge between a case with the result and one without; none where both have it or neither.</summary>
    private static IEnumerable<Point> Edge(Point low, Point high, Func<double, Point> at)
    {
        if (low.Excess is null == high.Excess is null)
            return [];
        for (int i = 0; i < EdgeHalvings; i++)
        {
            Point middle = at((low.Value + high.Value) / 2);
            if (middle.Excess is null == low.Excess is null)
                low = middle;
            else
                high = middle;
        }

        return [low, high];
    }

    private SizedValue Between(Point low, Point high, Func<double, Point> at)
    {
        if (Target.Quantity is not null && TryBrent(low, high, at) is { } found)
            return found;
        for (int i = 0; i < MostHalvings && high.Value - low.Value > Width * Math.Abs(high.Value); i++)
        {
            Point middle = at((low.Value + high.Value) / 2);
            if (middle.Excess is not { } excess)
                break;
            if (excess * low.Excess > 0)
                low = middle;
            else
                high = middle;
        }

        // Of the two sides the one that keeps the limits, or that is nearer to the target.
        bool isLow = Target.Quantity is null ? low.Excess > 0 : Math.Abs(low.Excess!.Value) <= Math.Abs(high.Excess!.Value);
        return Sized(isLow ? low : high, low, high);
    }

    private SizedValue? TryBrent(Point low, Point high, Func<double, Point> at)
    {
        bool isWhole = true;
        if (!Brent.TryFindRoot(ExcessAt, low.Value, high.Value, 1e-14, 100, out double root) || !isWhole)
            return null;
        double width = Width / 2 * Math.Abs(root);
        Point found = at(root), below = at(Math.Max(low.Value, root - width)), above = at(Math.Min(high.Value, root + width));
        return below.Excess * above.Excess <= 0 && found.Excess is not null ? Sized(found, below, above) : null;

        double ExcessAt(double value)
        {
            double? excess = at(value).Excess;
            isWhole &= excess is not null;
            return excess ?? low.Excess!.Value;
        }
    }

    private SizedValue Sized(Point point, Point low, Point high)
    {
        RunSummary run = point.Result.Run!;
        double residual = Target.Quantity?.Of(run) - Target.Value ?? 0;
        bool isJump = Target.Quantity is not null && Math.Abs(point.Excess!.Value) > NearEnough;
        return new SizedValue(point.Value, low.Value, high.Value, residual, isJump, run);
    }

    /// <summary>A case with how far it is above the target.</summary>
    private readonly record struct Point(double Value, CaseResult Result, double? Excess);
}
