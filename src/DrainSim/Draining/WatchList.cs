using DrainSim.Gas;
using DrainSim.Lines;

namespace DrainSim.Draining;

/// <summary>Draws up what a run has to watch.</summary>
/// <remarks>Of events at one instant the one that stands first here counts: a target before air, air before rest.</remarks>
internal static class WatchList
{
    /// <summary>The event functions of a job.</summary>
    /// <param name="plant">the plant at the start</param>
    /// <param name="target">volume at which the job is done, m³; null where there is none</param>
    public static Watch[] Of(Plant plant, double? target)
    {
        var watches = new List<Watch>();
        if (target is { } volume)
            watches.Add(new Watch(WatchKind.TargetReached, Value: volume));
        for (int i = 0; i < plant.Lines.Length; i++)
            watches.AddRange(OfLine(plant.Job, plant.Lines[i], i));
        watches.AddRange(OfTank(plant.Job, plant.Lines.Length, plant.Gas));
        return [.. watches];
    }

    private static IEnumerable<Watch> OfLine(Job job, CompiledLine line, int index)
    {
        Line[] asItBecomes = [.. job.Timeline.Select(act => act.After).Prepend(job).Select(plant => plant.DrawOffs[index].Line)];
        yield return new(WatchKind.InletUncovers, index);
        if (asItBecomes.Any(own => own.AirBreak is not null))
            yield return new(WatchKind.AirBreakUncovers, index);
        if (asItBecomes.Any(own => own.Inlet.AirDraw == AirDraw.Break))
            yield return new(WatchKind.AirDrawn, index);
        yield return new(WatchKind.MarginVanishes, index);
        if (line.HoldsAtVapour)
            yield return new(WatchKind.LiftExhausts, index);
        if (line.Filling is not null)
        {
            yield return new(WatchKind.FrontArrives, index);
            yield return new(WatchKind.FrontStops, index);
        }

        yield return new(WatchKind.HeadSettles, index);
        if (line.HasTail)
            yield return new(WatchKind.BoreUncovers, index);
        if (line.BrimDepth is not null)
        {
            yield return new(WatchKind.OutletCovers, index);
            yield return new(WatchKind.ReceiverBrims, index);
        }

        for (int j = 0; j < line.Hydraulics.RegimeFlows.Count; j++)
            yield return new(WatchKind.RegimePasses, index, j);
    }

    private static IEnumerable<Watch> OfTank(Job job, int lines, GasLaw gas)
    {
        if (lines > 1 || job.Timeline.Select(act => act.After).Append(job).Any(plant => plant.Inflow is not null))
            yield return new(WatchKind.AllSettle);
        foreach (double level in job.Vessel.SectionLevels)
            yield return new(WatchKind.SectionPasses, Value: job.Vessel.Volume(level));
        bool isConfined = gas.IsConfined || job.Timeline.Any(act => act.After.Headspace is Gas.ConfinedHeadspace);
        if (isConfined && job.VacuumRating is not null)
            yield return new(WatchKind.VacuumRatingPasses);
        if (isConfined && job.PressureRating is not null)
            yield return new(WatchKind.PressureRatingPasses);
        foreach (double pressure in job.Timeline.Select(act => act.After).Append(job).SelectMany(ValvePressures).Distinct())
            yield return new(WatchKind.ValveMoves, Value: pressure);
        Inflow[] inflows = [.. job.Timeline.Select(act => act.After).Prepend(job).Select(plant => plant.Inflow).OfType<Inflow>()];
        if (inflows.Length > 0 || job.DrawOffs.Any(drawOff => drawOff.Receiver is not null))
            yield return new(WatchKind.TankBrims, Value: job.Vessel.Capacity);
        if (inflows.Length > 0)
        {
            yield return new(WatchKind.FlowsBalance);
            foreach (double time in inflows.SelectMany(inflow => inflow.Points).Select(p => p.Time).Where(time => time > 0).Distinct())
                yield return new(WatchKind.InflowTurns, Value: time);
        }

        for (int j = 0; j < job.Timeline.Count; j++)
        {
            if (!job.Timeline[j].IsDueAtStart(job.Level))
                yield return new(WatchKind.ActFalls, 0, j);
        }
    }

    /// <summary>Pressures at which a valve begins to open or is fully open, Pa absolute: there the law of the headspace has a kink.</summary>
    private static IEnumerable<double> ValvePressures(Job job)
    {
        double atmosphere = job.Site.AtmosphericPressure;
        foreach (PressureValve valve in (job.Headspace as VentedHeadspace)?.Openings.OfType<PressureValve>() ?? [])
        {
            double sign = valve is ReliefValve ? 1 : -1;
            yield return atmosphere + sign * valve.SetPressure;
            yield return atmosphere + sign * valve.FullOpenPressure;
        }
    }
}
