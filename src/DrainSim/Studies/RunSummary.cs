using System.Collections.Immutable;
using DrainSim.Draining;

namespace DrainSim.Studies;

/// <summary>What a study keeps of a run: its results as numbers, without its course.</summary>
public sealed record RunSummary
{
    /// <summary>How it ended.</summary>
    public required Outcome Outcome { get; init; }

    /// <summary>Why it never started; null when it did.</summary>
    public NoStart? NoStart { get; init; }

    /// <summary>When it ended, s since the start.</summary>
    public required double StoppedAt { get; init; }

    /// <summary>When half of the drainable volume was gone, s; null when it never was.</summary>
    public double? TimeTo50 { get; init; }

    /// <summary>When 90 % of the drainable volume was gone, s; null when it never was.</summary>
    public double? TimeTo90 { get; init; }

    /// <summary>When 99 % of the drainable volume was gone, s; null when it never was.</summary>
    public double? TimeTo99 { get; init; }

    /// <summary>Volume that left the tank, m³.</summary>
    public required double DrainedVolume { get; init; }

    /// <summary>Volume in the tank when the run stopped, before any fall-back from the line, m³.</summary>
    public required double LeftVolume { get; init; }

    /// <summary>Level in the tank when the run stopped, before any fall-back from the line, m.</summary>
    public required double FinalLevel { get; init; }

    /// <summary>Least margin at the low point, Pa.</summary>
    public required double LeastMargin { get; init; }

    /// <summary>Largest flow, m³/s.</summary>
    public required double LargestFlow { get; init; }

    /// <summary>Largest velocity in the narrowest bore, m/s.</summary>
    public required double LargestVelocity { get; init; }

    /// <summary>Largest vacuum in the headspace, Pa below the atmosphere; null where the tank is open.</summary>
    public double? LargestVacuum { get; init; }

    /// <summary>Depth in the first receiving tank when the run stopped, m; null where there is none.</summary>
    public double? ReceiverLevel { get; init; }

    /// <summary>The bounds of the job that the run broke, in the order of <see cref="LimitKind"/>; empty where it kept all.</summary>
    public ImmutableArray<LimitKind> BrokenLimits { get; init; } = [];

    /// <summary>What the run cost.</summary>
    public required Counters Counters { get; init; }

    /// <summary>
    /// Whether the job was done: the tank is empty, drained to the inlet, or at the level or volume asked for. Only
    /// then is <see cref="StoppedAt"/> a drain time.
    /// </summary>
    public bool IsDone => Outcome is Outcome.Emptied or Outcome.InletUncovered or Outcome.TargetReached;

    /// <summary>The time that the job took, s; null when it was not done.</summary>
    public double? DrainTime => IsDone ? StoppedAt : null;

    /// <summary>Takes the numbers of a run.</summary>
    /// <param name="result">the run; its events and warnings are not looked for</param>
    public static RunSummary Of(DrainResult result)
    {
        ArgumentNullException.ThrowIfNull(result);
        double drainable = DrainableVolume(result.Job, result.InitialVolume);
        return new RunSummary
        {
            Outcome = result.Outcome,
            NoStart = result.NoStart,
            StoppedAt = result.StoppedAt,
            TimeTo50 = TimeTo(0.5),
            TimeTo90 = TimeTo(0.9),
            TimeTo99 = TimeTo(0.99),
            DrainedVolume = result.DrainedVolume,
            LeftVolume = result.LeftVolume,
            FinalLevel = result.FinalLevel,
            LeastMargin = result.LeastMargin.Value,
            LargestFlow = result.LargestFlow.Value,
            LargestVelocity = result.LargestVelocity.Value,
            LargestVacuum = result.LargestVacuum?.Value,
            ReceiverLevel = result.ReceiverLevel,
            BrokenLimits = result.LimitChecks.Count == 0
                ? []
                : [.. result.LimitChecks.Where(check => !check.IsKept).Select(check => check.Kind)],
            Counters = result.Counters,
        };

        double? TimeTo(double share) =>
            drainable > 0 ? result.Trace.TimeAtVolume(result.InitialVolume - share * drainable) : null;
    }

    /// <summary>
    /// The volume that the job is meant to drain, m³: what stands above the lowest inlet, or above the level or the
    /// volume at which it is told to stop where that is more.
    /// </summary>
    /// <param name="job">the job</param>
    /// <param name="initial">volume in the tank at the start, m³</param>
    public static double DrainableVolume(Job job, double initial)
    {
        ArgumentNullException.ThrowIfNull(job);
        double inlet = double.PositiveInfinity;
        foreach (DrawOff drawOff in job.DrawOffs)
            inlet = Math.Min(inlet, drawOff.Line.Inlet.Elevation);
        double level = Math.Clamp(Math.Max(inlet, job.Run.StopAtLevel ?? 0), 0, job.Vessel.Height);
        double kept = Math.Max(job.Vessel.Volume(level), job.Run.StopAtVolume ?? 0);
        return Math.Max(0, initial - kept);
    }
}
