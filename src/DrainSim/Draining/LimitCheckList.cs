namespace DrainSim.Draining;

/// <summary>Checks a run against the bounds of its job.</summary>
internal static class LimitCheckList
{
    /// <summary>Least area of a surface whose fall counts, over the mean area, 1; common practice, no source.</summary>
    private const double LeastArea = 0.01;

    /// <summary>The checks, in the order of <see cref="LimitKind"/>; empty where the job has no bounds.</summary>
    /// <param name="result">the run</param>
    /// <param name="survey">its extremes</param>
    public static LimitCheck[] Of(DrainResult result, RunSurvey survey)
    {
        if (result.Job.Limits is not { } limits)
            return [];
        var end = new Extreme(result.StoppedAt, result.StoppedAt);
        bool isDone = result.Outcome is Outcome.Emptied or Outcome.InletUncovered or Outcome.TargetReached;
        var checks = new List<LimitCheck>();
        // A job that is not done counts as taking for ever.
        AtLeast(LimitKind.DrainTimeAtLeast, limits.DrainTimeAtLeast, () => isDone ? end : end with { Value = double.PositiveInfinity });
        AtMost(LimitKind.DrainTimeAtMost, limits.DrainTimeAtMost, () => end, isDone);
        AtMost(LimitKind.LeftVolume, limits.LeftVolume, () => new Extreme(result.LeftVolume, result.StoppedAt));
        AtMost(LimitKind.LargestFlow, limits.LargestFlow, () => result.LargestFlow);
        AtMost(LimitKind.LargestVelocity, limits.LargestVelocity, () => result.LargestVelocity);
        AtMost(LimitKind.FastestFall, limits.FastestFall,
            () => survey.Largest(i => (i.Flow - (result.JobAt(i.Time).Inflow?.Flow(i.Time) ?? 0)) / AreaAt(i.Level)));
        AtLeast(LimitKind.LeastMargin, limits.LeastMargin, () => result.LeastMargin);
        AtMost(LimitKind.LargestVacuum, limits.LargestVacuum, () => result.LargestVacuum ?? new Extreme(0, 0));
        AtMost(LimitKind.ReceiverLevel, limits.ReceiverLevel, () => survey.Largest(i => i.ReceiverLevel ?? 0));
        return [.. checks];

        // In the point of a round top or bottom the level has no speed that anybody could see.
        double AreaAt(double level) => Math.Max(result.Job.Vessel.Area(level), LeastArea * result.Job.Vessel.Capacity / result.Job.Vessel.Height);

        void AtMost(LimitKind kind, double? bound, Func<Extreme> worst, bool counts = true) =>
            Add(kind, bound, worst, counts, (value, most) => value <= most);

        void AtLeast(LimitKind kind, double? bound, Func<Extreme> worst, bool counts = true) =>
            Add(kind, bound, worst, counts, (value, least) => value >= least);

        void Add(LimitKind kind, double? bound, Func<Extreme> worst, bool counts, Func<double, double, bool> keeps)
        {
            if (bound is not { } value)
                return;
            Extreme found = worst();
            checks.Add(new LimitCheck(kind, value, found, counts && keeps(found.Value, value)));
        }
    }
}
