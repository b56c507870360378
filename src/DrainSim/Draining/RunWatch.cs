using System.Diagnostics;
using DrainSim.Integration;
using DrainSim.Lines;
using MathNet.Numerics.RootFinding;

namespace DrainSim.Draining;

/// <summary>What the moments of a run mean, and what makes its result less sure.</summary>
internal static class RunWatch
{
    /// <summary>Inertia ratio above which the result is less sure, 1; common practice, no source.</summary>
    private const double NoticeableInertia = 0.02;

    /// <summary>Surface velocity ratio above which the result is less sure, 1; common practice, no source.</summary>
    private const double NoticeableSurfaceVelocity = 0.01;

    /// <summary>Share of the run in the transition above which the result is less sure, 1; common practice, no source.</summary>
    private const double NoticeableTransition = 0.1;

    /// <summary>Margin below which the limit was reached, which the outcome says, Pa; far below what a gauge tells.</summary>
    private const double Touching = 1;

    /// <summary>Share of the atmosphere below which dissolved gas comes out of a liquid, 1; common practice, no source.</summary>
    private const double GasComesOut = 1.0 / 3;

    /// <summary>Time below that pressure after which gas may have gathered, s; common practice, no source.</summary>
    private const double GasGathers = 600;

    /// <summary>
    /// Froude number above which a falling leg clears pockets of air, 1; below 0.3 they rise out of it by themselves, and between
    /// it carries them irregularly. From memory and a process engineer's web text.
    /// </summary>
    private const double ClearsAir = 1;

    /// <summary>Margin at the low point of a siphon below which it is thin, Pa; common practice, no source.</summary>
    private const double ThinMargin = 5000;

    private static readonly EventCode[] DrawnAir = [EventCode.AirMayBeDrawn, EventCode.AirDrawn];

    /// <summary>The code and the number of a located event; null for one that nobody needs to know.</summary>
    public static (EventCode Code, double Number)? CodeOf(DrainModel model, Epoch epoch, Watch watch, LocatedEvent located)
    {
        bool falls = located.Direction == EventDirection.Falling;
        CompiledLine line = epoch.Plant.Lines[watch.Line];
        switch (watch.Kind)
        {
            case WatchKind.RegimePasses:
                double limit = line.RegimeLimit(line.Hydraulics.RegimeFlows[watch.Ordinal]);
                return (RegimeCode(falls, limit >= FrictionFactor.TurbulentLimit), limit);
            case WatchKind.MarginVanishes when line.HoldsAtVapour && !epoch.Modes[watch.Line].IsFilling:
                return (falls ? EventCode.VapourLimitBegins : EventCode.VapourLimitEnds, 0);
            case WatchKind.BoreUncovers:
                return falls ? (EventCode.BoreUncovered, 0) : null;
            case WatchKind.FrontArrives:
                return epoch.Modes[watch.Line].Segment == line.Filling!.SegmentCount - 1 ? (EventCode.RunsFull, 0) : null;
            case WatchKind.OutletCovers:
                return (falls ? EventCode.OutletFreed : EventCode.OutletCovered, 0);
            case WatchKind.VacuumRatingPasses:
                return (EventCode.VacuumRatingPassed, model.Job.VacuumRating!.Value);
            case WatchKind.PressureRatingPasses:
                return (EventCode.PressureRatingPassed, model.Job.PressureRating!.Value);
            case WatchKind.ActFalls:
                return (EventCode.Act, watch.Ordinal + 1);
            default:
                return model.EndingOf(watch, located.Time, located.State.AsSpan()) is { } ending ? (EndingCode(ending), 0) : null;
        }
    }

    /// <summary>The code of an ending.</summary>
    public static EventCode EndingCode(Outcome outcome) => outcome switch
    {
        Outcome.Emptied => EventCode.Emptied,
        Outcome.InletUncovered => EventCode.InletUncovered,
        Outcome.VapourBreak => EventCode.VapourBreak,
        Outcome.AirBreak => EventCode.AirBreak,
        Outcome.Levelled => EventCode.Levelled,
        Outcome.VacuumHeld => EventCode.VacuumHeld,
        Outcome.YieldHeld => EventCode.YieldHeld,
        Outcome.Balanced => EventCode.Balanced,
        Outcome.ReceiverFull => EventCode.ReceiverFull,
        Outcome.Overflowed => EventCode.Overflowed,
        Outcome.TargetReached => EventCode.TargetReached,
        Outcome.TimeLimit => EventCode.TimeLimit,
        Outcome.NeverStarted => EventCode.NeverStarted,
        _ => throw new UnreachableException($"no event ends a run with {outcome}"),
    };

    /// <summary>The moments at which the submergence of each line falls through the band of the published forms.</summary>
    public static IEnumerable<DrainEvent> Submergences(DrainModel model, RunSurvey survey)
    {
        for (int i = 0; i < model.LineCount; i++)
        {
            int index = i;
            CompiledLine line = model.Epochs[0].Plant.Lines[index];
            foreach (EventCode code in DrawnAir)
            {
                if (survey.FirstFall(index, at => at.Level - line.Hydraulics.InletElevation - Depth(RunSurvey.FlowOf(at, index), code)) is not { } time)
                    continue;
                (Instant instant, double depth) = survey.At(time, state => Depth(RunSurvey.FlowOf(state, index), code));
                yield return new DrainEvent(time, code, instant.Level, instant.Volume, depth, index);
            }

            double Depth(double flow, EventCode code) =>
                line.Submergence(flow) is var band && code == EventCode.AirDrawn ? band.Least : band.Most;
        }
    }

    /// <summary>The moments at which the suction in each line passes what its hose stands.</summary>
    public static IEnumerable<DrainEvent> HoseRatings(DrainModel model, RunSurvey survey)
    {
        for (int i = 0; i < model.LineCount; i++)
        {
            int index = i;
            if (model.Epochs[0].Plant.Lines[index].DrawOff.Line.VacuumRating is not { } rating)
                continue;
            double least = model.Job.Site.AtmosphericPressure - rating;
            if (survey.FirstFall(index, instant => survey.LowPointPressure(index, instant) - least) is not { } time)
                continue;
            (Instant at, _) = survey.At(time, _ => 0);
            yield return new DrainEvent(time, EventCode.HoseRatingPassed, at.Level, at.Volume, rating, index);
        }
    }

    /// <summary>Level at which the last inflow and the outflow balance, m; null where there is none within the tank.</summary>
    public static double? BalanceLevel(DrainModel model)
    {
        Epoch first = model.Epochs[0];
        if (model.Job.Inflow is not { } inflow || inflow.Points[^1].Flow <= 0)
            return null;
        double wanted = inflow.Points[^1].Flow, gas = model.Job.Site.AtmosphericPressure;
        double low = first.Plant.Lines.Min(line => line.UncoverLevel), high = model.Job.Vessel.Height;
        return Excess(low) < 0 && Excess(high) > 0 && Brent.TryFindRoot(Excess, low, high, 1e-12, 200, out double level)
            ? level
            : null;

        double Excess(double level) => first.Plant.Lines
            .Where(line => level > line.UncoverLevel)
            .Sum(line => line.Flow(new LineConditions(level, gas, 0, false))) / wanted - 1;
    }

    /// <summary>What makes the result less sure.</summary>
    public static RunWarning[] Warnings(DrainResult result, DrainModel model, RunSurvey survey)
    {
        var warnings = new List<RunWarning>();
        (SteadinessCheck check, Job job) = (result.Steadiness, result.Job);
        Add(WarningCode.InertiaMatters, check.InertiaRatio, check.InertiaRatio > NoticeableInertia);
        Add(WarningCode.SurfaceVelocityMatters, check.SurfaceVelocityRatio, check.SurfaceVelocityRatio > NoticeableSurfaceVelocity);
        Add(WarningCode.TransitionFlow, check.TransitionShare, check.TransitionShare > NoticeableTransition);
        DrainEvent air = result.Events.FirstOrDefault(e => e.Code == EventCode.AirMayBeDrawn);
        Add(WarningCode.AirMayBeDrawn, air.Number, air.Code == EventCode.AirMayBeDrawn && air.Number > 0);
        bool siphons = model.Epochs[0].Plant.Lines.Any(line => line.Hydraulics.RisesAboveInlet);
        Add(WarningCode.ThinMargin, result.LeastMargin.Value,
            siphons && result.StoppedAt > 0 && result.LeastMargin.Value is > Touching and < ThinMargin);
        foreach (LineResult line in result.Lines.Where(l => l is { RanFullAt: not null, OuterLegFroude: < ClearsAir }))
            Add(WarningCode.AirStaysInLeg, line.OuterLegFroude!.Value, true);
        double differs = TurbulentYield.ShareLess(model.Epochs[0].Plant.Lines[0], job, result.Lines[0].LargestFlow.Value);
        Add(WarningCode.FrictionDiffers, differs, differs > 0);
        double vacuum = result.LargestVacuum?.Value ?? 0;
        Add(WarningCode.VacuumRatingPassed, vacuum, vacuum > job.VacuumRating);
        double over = result.LargestVacuum is null ? 0 : survey.Largest(i => i.HeadspacePressure!.Value - job.Site.AtmosphericPressure).Value;
        Add(WarningCode.PressureRatingPassed, over, over > job.PressureRating);
        foreach (LineResult line in result.Lines)
        {
            double suction = job.Site.AtmosphericPressure - line.LeastLowPointPressure.Value;
            Add(WarningCode.HoseMayFlatten, suction, suction > line.DrawOff.Line.VacuumRating);
        }

        double share = survey.ShareBelow(GasComesOut * job.Site.AtmosphericPressure);
        Add(WarningCode.GasMayGather, share, share * result.StoppedAt > GasGathers);
        if (job.Inflow is not null && result.Outcome is Outcome.Balanced or Outcome.Overflowed)
            Add(WarningCode.NeverEmpties, InflowThatEmpties(model), true);
        return [.. warnings];

        void Add(WarningCode code, double number, bool applies)
        {
            if (applies)
                warnings.Add(new RunWarning(code, number));
        }
    }

    /// <summary>The largest inflow that the lines still carry when the last inlet uncovers, m³/s.</summary>
    private static double InflowThatEmpties(DrainModel model)
    {
        Plant plant = model.Epochs[0].Plant;
        double level = plant.Lines.Min(line => line.UncoverLevel);
        return plant.Lines.Where(line => line.UncoverLevel <= level)
            .Sum(line => line.Flow(new LineConditions(level, model.Job.Site.AtmosphericPressure, 0, false)));
    }

    private static EventCode RegimeCode(bool falls, bool atTurbulent) => (falls, atTurbulent) switch
    {
        (true, true) => EventCode.LeftTurbulent,
        (true, false) => EventCode.BecameLaminar,
        (false, true) => EventCode.BecameTurbulent,
        (false, false) => EventCode.LeftLaminar,
    };
}
