namespace DrainSim.Draining;

/// <summary>Finds the smallest changes that would let a stopped job go on, or keep its tank within its rating.</summary>
/// <remarks>
/// Each change is bracketed and bisected on whole runs of the changed job: the same program that found the stop
/// decides whether it is gone, so a change that trades one stop for another is not offered as a cure.
/// </remarks>
public static class RemedySearch
{
    /// <summary>Width of the bracket at which a change is settled, m or share.</summary>
    private const double Width = 1e-3;

    /// <summary>Ratio of the bracket's ends at which a throttle or a vent is settled, 1.</summary>
    private const double Ratio = 1.01;

    /// <summary>Share of the contents that a changed job must drain to count as going on, 1.</summary>
    private const double WorthTheWork = 0.001;

    /// <summary>Drain time over that of the open tank up to which a vent counts as wide, 1; common practice, no source.</summary>
    private const double FreelyVented = 1.1;

    /// <summary>The changes that would let a job go on, each proved by a run; empty where none is needed or none helps.</summary>
    /// <param name="result">the run that stopped</param>
    /// <param name="cancellation">ends the search early with an <see cref="OperationCanceledException"/></param>
    public static IReadOnlyList<Remedy> Find(DrainResult result, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(result);
        var found = new List<Remedy>();
        foreach (RemedyKind kind in Candidates(result))
        {
            if (Solve(result, kind, cancellation) is { } remedy)
                found.Add(remedy);
        }

        return found;
    }

    private static IEnumerable<RemedyKind> Candidates(DrainResult result)
    {
        if (result.Outcome == Outcome.VacuumHeld || PassesRating(result))
            yield return RemedyKind.WidenVent;
        bool hasTank = result.Job.DrawOffs[0].Receiver is ReceivingTank;
        foreach (RemedyKind kind in OfEnding(result.Outcome, result.NoStart))
            yield return kind == RemedyKind.LowerOutlet && hasTank ? RemedyKind.LowerReceiver : kind;
    }

    private static RemedyKind[] OfEnding(Outcome outcome, NoStart? noStart) => (outcome, noStart) switch
    {
        (Outcome.Levelled or Outcome.YieldHeld, _) => [RemedyKind.LowerOutlet],
        (Outcome.VapourBreak, _) => [RemedyKind.LowerCrest, RemedyKind.ThrottleOutlet],
        (Outcome.Balanced or Outcome.Overflowed, _) => [RemedyKind.LessInflow],
        (Outcome.ReceiverFull, _) => [RemedyKind.HigherBrim],
        (Outcome.NeverStarted, NoStart.NoDrivingHead or NoStart.YieldHolds) => [RemedyKind.LowerOutlet],
        (Outcome.NeverStarted, NoStart.LiftBeyondLimit) => [RemedyKind.LowerCrest],
        (Outcome.NeverStarted, NoStart.InletAboveLevel) => [RemedyKind.LowerInlet],
        _ => [],
    };

    private static bool PassesRating(DrainResult result) =>
        result.LargestVacuum is { } vacuum && vacuum.Value > result.Job.VacuumRating;

    private static Remedy? Solve(DrainResult result, RemedyKind kind, CancellationToken cancellation)
    {
        bool isRatio = RemedyChange.IsRatio(kind);
        double most = RemedyChange.Most(result.Job, kind);
        double good = Math.Min(RemedyChange.First(kind), most), bad = 0;
        if (most <= 0)
            return null;
        Func<DrainResult, bool> goesOn = Goal(result, kind, cancellation);
        DrainResult? proof;
        while ((proof = Prove(result.Job, kind, good, goesOn, cancellation)) is null)
        {
            if (good >= most)
                return null;
            bad = good;
            good = Math.Min(2 * good, most);
        }

        while (isRatio ? good > Ratio * Math.Max(bad, 1e-3) : good - bad > Width)
        {
            double middle = isRatio && bad > 0 ? Math.Sqrt(good * bad) : (good + bad) / 2;
            DrainResult? tried = Prove(result.Job, kind, middle, goesOn, cancellation);
            if (tried is null)
                bad = middle;
            else
                (good, proof) = (middle, tried);
        }

        return new Remedy(kind, good, RemedyChange.ValueAfter(result.Job, kind, good), proof.Outcome, proof.StoppedAt, proof.FinalLevel);
    }

    /// <summary>The run of the changed job where the change is enough, else null.</summary>
    private static DrainResult? Prove(
        Job job, RemedyKind kind, double change, Func<DrainResult, bool> goesOn, CancellationToken cancellation)
    {
        if (RemedyChange.Apply(job, kind, change) is not { } changed)
            return null;
        DrainResult tried = Simulation.Run(changed, cancellation);
        return goesOn(tried) ? tried : null;
    }

    /// <summary>When a changed job counts as cured: it runs on, and a vent keeps the tank within its rating, or hardly delays it.</summary>
    private static Func<DrainResult, bool> Goal(DrainResult result, RemedyKind kind, CancellationToken cancellation)
    {
        if (kind != RemedyKind.WidenVent)
            return RunsOn;
        if (result.Job.VacuumRating is not null)
            return tried => RunsOn(tried) && !PassesRating(tried);
        DrainResult open = Simulation.Run(result.Job with { Headspace = new Gas.OpenHeadspace() }, cancellation);
        return tried => RunsOn(tried) && tried.StoppedAt <= FreelyVented * open.StoppedAt;
    }

    private static bool RunsOn(DrainResult tried) =>
        tried.Outcome is not (Outcome.Levelled or Outcome.VapourBreak or Outcome.NeverStarted or Outcome.VacuumHeld
            or Outcome.YieldHeld or Outcome.Balanced or Outcome.Overflowed or Outcome.ReceiverFull)
        && tried.DrainedVolume > WorthTheWork * tried.InitialVolume;
}
