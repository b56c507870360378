using DrainSim.Lines;

namespace DrainSim.Draining;

/// <summary>Finds the smallest changes that would let a stopped job go on.</summary>
/// <remarks>
/// Each change is bracketed and bisected on whole runs of the changed job: the same program that found the stop
/// decides whether it is gone, so a change that trades one stop for another is not offered as a cure.
/// </remarks>
public static class RemedySearch
{
    /// <summary>Width of the bracket at which a change of elevation is settled, m.</summary>
    private const double ElevationWidth = 1e-3;

    /// <summary>Largest change of elevation that is tried, m.</summary>
    private const double LargestDrop = 64;

    /// <summary>Ratio of the bracket's ends at which a throttle is settled, 1.</summary>
    private const double LossRatio = 1.01;

    /// <summary>Largest loss coefficient that is tried as a throttle, 1.</summary>
    private const double LargestLoss = 1e6;

    /// <summary>Share of the contents that a changed job must drain to count as going on, 1.</summary>
    private const double WorthTheWork = 0.001;

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

    private static RemedyKind[] Candidates(DrainResult result) => (result.Outcome, result.NoStart) switch
    {
        (Outcome.Levelled or Outcome.YieldHeld, _) => [RemedyKind.LowerOutlet],
        (Outcome.VapourBreak, _) => [RemedyKind.LowerCrest, RemedyKind.ThrottleOutlet],
        (Outcome.NeverStarted, NoStart.NoDrivingHead or NoStart.YieldHolds) => [RemedyKind.LowerOutlet],
        (Outcome.NeverStarted, NoStart.LiftBeyondLimit) => [RemedyKind.LowerCrest],
        (Outcome.NeverStarted, NoStart.InletAboveLevel) => [RemedyKind.LowerInlet],
        _ => [],
    };

    private static Remedy? Solve(DrainResult result, RemedyKind kind, CancellationToken cancellation)
    {
        bool isThrottle = kind == RemedyKind.ThrottleOutlet;
        double most = kind switch
        {
            RemedyKind.ThrottleOutlet => LargestLoss,
            RemedyKind.LowerCrest => CrestRoom(result.Job),
            RemedyKind.LowerInlet => result.Job.Line.Inlet.Elevation,
            _ => LargestDrop,
        };
        double good = Math.Min(isThrottle ? 1 : 2 * ElevationWidth, most), bad = 0;
        if (most <= 0)
            return null;
        DrainResult? proof;
        while ((proof = Prove(result, kind, good, cancellation)) is null)
        {
            if (good >= most)
                return null;
            bad = good;
            good = Math.Min(2 * good, most);
        }

        while (isThrottle ? good > LossRatio * Math.Max(bad, 1e-3) : good - bad > ElevationWidth)
        {
            double middle = isThrottle && bad > 0 ? Math.Sqrt(good * bad) : (good + bad) / 2;
            DrainResult? tried = Prove(result, kind, middle, cancellation);
            if (tried is null)
                bad = middle;
            else
                (good, proof) = (middle, tried);
        }

        return new Remedy(kind, good, ValueAfter(result.Job, kind, good), proof.Outcome, proof.StoppedAt, proof.FinalLevel);
    }

    /// <summary>The run of the changed job where the change is enough, else null.</summary>
    private static DrainResult? Prove(DrainResult result, RemedyKind kind, double change, CancellationToken cancellation)
    {
        if (Changed(result.Job, kind, change) is not { } job)
            return null;
        DrainResult tried = Simulation.Run(job, cancellation);
        bool goesOn = tried.Outcome is not (Outcome.Levelled or Outcome.YieldHeld or Outcome.VapourBreak or Outcome.NeverStarted)
            && tried.DrainedVolume > WorthTheWork * tried.InitialVolume;
        return goesOn ? tried : null;
    }

    private static Job? Changed(Job job, RemedyKind kind, double change)
    {
        Line? line = kind switch
        {
            RemedyKind.LowerOutlet => LineChanges.WithLowerOutlet(job.Line, change),
            RemedyKind.LowerCrest => LineChanges.WithLowerCrest(job.Line, change),
            RemedyKind.LowerInlet => LineChanges.WithLowerInlet(job.Line, change),
            RemedyKind.ThrottleOutlet => LineChanges.WithThrottle(job.Line, change),
            _ => null,
        };
        if (line is null)
            return null;
        DrawOff first = job.DrawOffs[0] with { Line = line };
        if (kind == RemedyKind.LowerOutlet)
            first = first with { Receiver = Lowered(first.Receiver, change) };
        return job with { DrawOffs = [first, .. job.DrawOffs.Skip(1)] };
    }

    /// <summary>How far the crest can come down, m: to the rim where the line hangs over it, else to the inlet.</summary>
    private static double CrestRoom(Job job)
    {
        var hydraulics = new LineHydraulics(job.Line, job.Liquid, job.Site.Gravity);
        double rim = job.Vessel.Height, crest = hydraulics.CrestElevation;
        return crest - (crest >= rim ? rim : hydraulics.InletElevation);
    }

    private static Receiver? Lowered(Receiver? receiver, double drop) => receiver switch
    {
        FixedSurface water => water with { Elevation = water.Elevation - drop },
        ReceivingTank tank => tank with { Bottom = tank.Bottom - drop },
        _ => receiver,
    };

    private static double ValueAfter(Job job, RemedyKind kind, double change)
    {
        var hydraulics = new LineHydraulics(job.Line, job.Liquid, job.Site.Gravity);
        return kind switch
        {
            RemedyKind.LowerOutlet => hydraulics.OutletElevation - change,
            RemedyKind.LowerCrest => hydraulics.CrestElevation - change,
            RemedyKind.LowerInlet => hydraulics.InletElevation - change,
            _ => change,
        };
    }
}
