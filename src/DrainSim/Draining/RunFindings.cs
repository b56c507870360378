using DrainSim.Integration;

namespace DrainSim.Draining;

/// <summary>Makes the result of a run from its trajectory.</summary>
internal static class RunFindings
{
    /// <summary>The result of a job that never moved.</summary>
    /// <param name="model">the balance at its first instant</param>
    /// <param name="outcome">why not</param>
    public static DrainResult OfNoRun(DrainModel model, Outcome outcome) =>
        Assemble(model, outcome, new RunHistory(model), FirstActs(model), new IntegrationCounters());

    /// <summary>The result of a run.</summary>
    /// <param name="model">the balance, run to its end</param>
    /// <param name="integration">how it ended</param>
    /// <param name="trajectory">its course</param>
    public static DrainResult Of(DrainModel model, IntegrationResult integration, Trajectory trajectory)
    {
        RunHistory history = trajectory.StepCount > 0
            ? new RunHistory(model, trajectory, integration.EndTime)
            : new RunHistory(model); // it ended before it moved
        return Assemble(model, OutcomeOf(model, integration), history, PassedEvents(model, integration), integration.Counters);
    }

    private static DrainResult Assemble(
        DrainModel model, Outcome outcome, RunHistory history, List<DrainEvent> passed, IntegrationCounters cost)
    {
        var survey = new RunSurvey(model, history);
        Instant last = history.Instants[^1];
        Trace trace = history.ToTrace();
        LineResult[] lines = [.. Enumerable.Range(0, model.LineCount).Select(i => LineReport.Of(model, history, survey, i))];
        LineResult worst = lines.MinBy(line => line.LeastMargin.Value)!;
        var result = new DrainResult
        {
            Job = model.Job,
            Outcome = outcome,
            NoStart = outcome == Outcome.NeverStarted ? lines[0].NoStart : null,
            StoppedAt = history.EndTime,
            InitialVolume = model.StartVolume,
            DrainedVolume = lines.Sum(line => line.DeliveredVolume),
            LeftVolume = last.Volume,
            FinalLevel = last.Level,
            FallBack = lines.Select(line => line.FallBack).FirstOrDefault(fall => fall is not null),
            LeastLowPointPressure = worst.LeastLowPointPressure,
            LeastMargin = worst.LeastMargin,
            LeastMarginNode = worst.LeastMarginNode,
            LargestFlow = lines.Length == 1 ? lines[0].LargestFlow : survey.Largest(i => i.Flow),
            LargestVelocity = lines.MaxBy(line => line.LargestVelocity.Value)!.LargestVelocity,
            EventSource = () => AllEvents(model, outcome, trace, [.. passed, .. RunWatch.Submergences(model, survey), .. RunWatch.HoseRatings(model, survey)], last),
            Trace = trace,
            PlantSource = time => model.EpochAt(time).Plant.Job,
            Prime = lines[0].Prime,
            SteadinessSource = () => survey.Steadiness(passed),
            Lines = lines,
            LargestVacuum = last.HeadspacePressure is null
                ? null
                : survey.Largest(i => model.Job.Site.AtmosphericPressure - i.HeadspacePressure!.Value),
            BalanceLevel = RunWatch.BalanceLevel(model),
            ReceiverLevel = last.ReceiverLevel,
            HeadspacePressure = last.HeadspacePressure,
            Counters = new Counters(cost.Steps, cost.RejectedSteps, cost.DerivativeEvaluations,
                model.FlowSolutions, cost.EventEvaluations),
        };
        return result with
        {
            WarningSource = () => RunWatch.Warnings(result, model, survey),
            LimitChecks = LimitCheckList.Of(result, survey),
        };
    }

    private static Outcome OutcomeOf(DrainModel model, IntegrationResult integration)
    {
        if (integration.StoppedBy is not { } index)
            return Outcome.TimeLimit;
        LineMode last = model.Epochs[^1].Modes.MaxBy(mode => mode.EndedAt);
        return model.Watches[index].Kind switch
        {
            WatchKind.TargetReached => Outcome.TargetReached,
            WatchKind.TankBrims => Outcome.Overflowed,
            WatchKind.FlowsBalance => Outcome.Balanced,
            _ => last.Ending ?? Outcome.TimeLimit,
        };
    }

    private static List<DrainEvent> PassedEvents(DrainModel model, IntegrationResult integration)
    {
        List<DrainEvent> events = FirstActs(model);
        foreach (LocatedEvent located in integration.Events)
        {
            Watch watch = model.Watches[located.Index];
            Epoch epoch = model.EpochAt(located.Time);
            double volume = model.Volume(epoch, located.Time, located.State.AsSpan());
            if (RunWatch.CodeOf(model, epoch, watch, located) is var (code, number))
                events.Add(new DrainEvent(located.Time, code, model.Job.Vessel.Level(volume), volume, number, watch.Line));
        }

        return events;
    }

    /// <summary>The acts that were done before the first instant.</summary>
    private static List<DrainEvent> FirstActs(DrainModel model)
    {
        Job job = model.Job;
        List<DrainEvent> events = [];
        for (int i = 0; i < job.Timeline.Count; i++)
        {
            if (job.Timeline[i].IsDueAtStart(job.Level))
                events.Add(new DrainEvent(0, EventCode.Act, job.Level, model.StartVolume, i + 1));
        }

        return events;
    }

    private static DrainEvent[] AllEvents(
        DrainModel model, Outcome outcome, Trace trace, List<DrainEvent> passed, Instant last)
    {
        var events = new List<DrainEvent>(passed);
        double start = model.StartVolume;
        for (int tenth = 1; tenth <= 10 && start > 0; tenth++)
        {
            double volume = start * (10 - tenth) / 10;
            if (trace.TimeAtVolume(volume) is { } time)
                events.Add(new DrainEvent(time, EventCode.TenthGone, model.Job.Vessel.Level(volume), volume, tenth));
        }

        LineMode[] modes = model.Epochs[^1].Modes;
        int line = Array.FindIndex(modes, mode => mode.Ending is not null && mode.EndedAt == trace.End);
        DrainEvent end = new(trace.End, RunWatch.EndingCode(outcome), last.Level, last.Volume, 0, Math.Max(0, line));
        bool endIsListed = events.Exists(e => e.Time == end.Time && e.Code == end.Code);
        return endIsListed ? [.. events.OrderBy(e => e.Time)] : [.. events.OrderBy(e => e.Time), end];
    }
}
