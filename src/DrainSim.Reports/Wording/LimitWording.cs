using System.Diagnostics;
using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Reports.Measures;

namespace DrainSim.Reports.Wording;

/// <summary>What the limits of a job and its lines say to people.</summary>
public static class LimitWording
{
    /// <summary>The code of a limit, as its key stands in a scenario.</summary>
    public static string Code(LimitKind kind) => kind switch
    {
        LimitKind.DrainTimeAtLeast => "drain_time.at_least",
        LimitKind.DrainTimeAtMost => "drain_time.at_most",
        LimitKind.LeftVolume => "left_volume",
        LimitKind.LargestFlow => "largest_flow",
        LimitKind.LargestVelocity => "largest_velocity",
        LimitKind.FastestFall => "fastest_fall",
        LimitKind.LeastMargin => "least_margin",
        LimitKind.LargestVacuum => "largest_vacuum",
        LimitKind.ReceiverLevel => "receiver_level",
        _ => throw new UnreachableException(kind.ToString()),
    };

    /// <summary>A check in one line, with its full stop.</summary>
    public static string Text(LimitCheck check, MeasureFormat format)
    {
        string kept = check.IsKept ? "kept" : "BROKEN";
        string bound = Measure(check.Kind, check.Bound, format), worst = Measure(check.Kind, check.Worst.Value, format);
        bool isTime = check.Kind is LimitKind.DrainTimeAtLeast or LimitKind.DrainTimeAtMost;
        string when = isTime || check.Kind == LimitKind.LeftVolume ? ""
            : check.Worst.Time > 0 ? $" after {MeasureFormat.Duration(check.Worst.Time)}" : " at the start";
        string found = double.IsFinite(check.Worst.Value) ? worst + when : "it is not done";
        return $"{Name(check.Kind)} {bound}: {kept}, {found}.";
    }

    /// <summary>A bound in words, without its full stop.</summary>
    /// <param name="kind">which bound</param>
    /// <param name="bound">the bound, in its SI unit</param>
    /// <param name="format">writes the measures</param>
    public static string Bound(LimitKind kind, double bound, MeasureFormat format) => $"{Name(kind)} {Measure(kind, bound, format)}";

    /// <summary>How one of several lines ended, with its full stop.</summary>
    /// <param name="line">the line</param>
    /// <param name="index">its place in the job, from 0</param>
    /// <param name="format">writes the measures</param>
    public static string Text(LineResult line, int index, MeasureFormat format)
    {
        string name = NameOf(line.DrawOff.Line, index);
        string ending = line.Outcome is { } outcome ? Verdict.Headline(outcome).ToLowerInvariant() : "still runs";
        string receiver = line.ReceiverLevel is { } depth ? $"; {format.Length(depth)} in its receiver" : "";
        return $"{name}: {ending} after {MeasureFormat.Duration(line.StoppedAt)}, {format.Volume(line.DeliveredVolume)} through it{receiver}.";
    }

    /// <summary>What one of several lines is called.</summary>
    /// <param name="line">the line</param>
    /// <param name="index">its place in the job, from 0</param>
    public static string NameOf(Line line, int index) => line.Name ?? $"line {index + 1}";

    private static string Name(LimitKind kind) => kind switch
    {
        LimitKind.DrainTimeAtLeast => "Drain time at least",
        LimitKind.DrainTimeAtMost => "Drain time at most",
        LimitKind.LeftVolume => "Left volume at most",
        LimitKind.LargestFlow => "Flow at most",
        LimitKind.LargestVelocity => "Velocity at most",
        LimitKind.FastestFall => "Fall of the level at most",
        LimitKind.LeastMargin => "Margin at the low point at least",
        LimitKind.LargestVacuum => "Vacuum in the headspace at most",
        LimitKind.ReceiverLevel => "Depth in the receiver at most",
        _ => throw new UnreachableException(kind.ToString()),
    };

    private static string Measure(LimitKind kind, double value, MeasureFormat format) => kind switch
    {
        LimitKind.DrainTimeAtLeast or LimitKind.DrainTimeAtMost => MeasureFormat.Duration(value),
        LimitKind.LeftVolume => format.Volume(value),
        LimitKind.LargestFlow => format.Flow(value),
        LimitKind.LargestVelocity => format.Velocity(value),
        LimitKind.FastestFall => $"{format.Length(value * 3600)} an hour",
        LimitKind.LeastMargin or LimitKind.LargestVacuum => format.Pressure(value),
        LimitKind.ReceiverLevel => format.Length(value),
        _ => throw new UnreachableException(kind.ToString()),
    };
}
