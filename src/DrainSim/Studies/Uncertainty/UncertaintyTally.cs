using DrainSim.Draining;

namespace DrainSim.Studies.Uncertainty;

/// <summary>Gathers the runs of a study in their order and makes its result.</summary>
internal sealed class UncertaintyTally(UncertaintyStudy study)
{
    /// <summary>Part of the slowest runs that the fan leaves out, so that a few stragglers do not squeeze it.</summary>
    private const double FanEnd = 0.98;

    private readonly List<SampleRun> runs = [];
    private readonly List<LevelTrack> tracks = [];
    private readonly List<(LimitKind Kind, double Bound, int Kept)> limits = [];
    private int count, keptAll;
    private string? firstFault;

    /// <summary>Adds the next run.</summary>
    public void Add(SampleRun run, LevelTrack? track, IReadOnlyList<LimitCheck> checks)
    {
        count++;
        firstFault ??= run.Fault;
        if (track is null)
            return;
        runs.Add(run);
        tracks.Add(track);
        keptAll += checks.All(check => check.IsKept) ? 1 : 0;
        for (int i = 0; i < checks.Count; i++)
        {
            if (limits.Count <= i)
                limits.Add((checks[i].Kind, checks[i].Bound, 0));
            limits[i] = limits[i] with { Kept = limits[i].Kept + (checks[i].IsKept ? 1 : 0) };
        }
    }

    /// <summary>The result of all runs.</summary>
    /// <exception cref="ArgumentOutOfRangeException">no sample makes a job</exception>
    public UncertaintyResult Result()
    {
        if (runs.Count == 0)
            throw new ArgumentOutOfRangeException(null, $"no sample makes a job: {firstFault}");
        double[] times = [.. runs.Select(run => run.Run!.DrainTime ?? double.PositiveInfinity)];
        double[] left = [.. runs.Select(run => run.Run!.LeftVolume)];
        double[] stops = [.. runs.Select(run => run.Run!.StoppedAt).Order()];
        double[][] parameters = [.. Enumerable.Range(0, study.Parameters.Count).Select(j => runs.Select(run => run.Values[j]).ToArray())];
        return new UncertaintyResult
        {
            Study = study,
            Count = count,
            Refused = count - runs.Count,
            FirstFault = firstFault,
            Outcomes = [.. runs.GroupBy(run => run.Run!.Outcome)
                .Select(group => new OutcomeChance(group.Key, new Chance(group.Count(), runs.Count)))
                .OrderByDescending(one => one.Chance.Count).ThenBy(one => one.Outcome)],
            Limits = [.. limits.Select(limit => new LimitChance(limit.Kind, limit.Bound, new Chance(limit.Kept, runs.Count)))],
            AllLimits = limits.Count == 0 ? null : new Chance(keptAll, runs.Count),
            DrainTime = PercentilesOf(times),
            LeftVolume = PercentilesOf(left),
            DrainTimeShares = SpreadShares.Of(parameters, times),
            LeftVolumeShares = SpreadShares.Of(parameters, left),
            Fan = LevelFan.Of(tracks, 1.02 * Percentiles.At(stops, FanEnd), Percentiles.Shares),
        };
    }

    private Percentile[] PercentilesOf(double[] values) =>
        Percentiles.Of([.. values.Zip(runs, (value, run) => (value, run.Repetition))]);
}
