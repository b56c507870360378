using DrainSim.Integration;

namespace DrainSim.Draining;

/// <content>The rules of the events, what each means for the lines, and how a line ends.</content>
internal sealed partial class DrainModel : IEventSet
{
    /// <inheritdoc/>
    public EventRule Rule(int index)
    {
        Watch watch = watches[index];
        EventAction action = watch.Kind switch
        {
            WatchKind.FlowsBalance when timeActsLeft > 0 => EventAction.Ignore,
            WatchKind.TargetReached or WatchKind.TankBrims or WatchKind.FlowsBalance => EventAction.Stop,
            WatchKind.VacuumRatingPasses or WatchKind.PressureRatingPasses => EventAction.Record,
            WatchKind.SectionPasses or WatchKind.ActFalls or WatchKind.InflowTurns or WatchKind.ValveMoves => EventAction.Restart,
            WatchKind.AllSettle => (now.LinesAtWork > 1 || now.Plant.Job.Inflow is not null) && Array.Exists(now.Modes, mode => mode.Flows)
                ? EventAction.Restart
                : EventAction.Ignore,
            _ when !now.Modes[watch.Line].IsAtWork => EventAction.Ignore,
            WatchKind.FrontArrives or WatchKind.FrontStops => now.Modes[watch.Line].IsFilling ? EventAction.Restart : EventAction.Ignore,
            WatchKind.RegimePasses or WatchKind.HeadSettles or WatchKind.BoreUncovers when now.Modes[watch.Line].IsFilling => EventAction.Ignore,
            WatchKind.BoreUncovers => EventAction.Record,
            WatchKind.LiftExhausts when !now.Modes[watch.Line].IsLimited => EventAction.Ignore,
            WatchKind.HeadSettles when now.Modes[watch.Line].IsResting || !(EndsAtRest(watch.Line) || IsAlone) => EventAction.Ignore,
            _ => EventAction.Restart,
        };
        EventDirection direction = watch.Kind switch
        {
            WatchKind.MarginVanishes when now.Modes[watch.Line].IsLimited => EventDirection.Rising,
            WatchKind.HeadSettles when run.SettledWithin == 0 => EventDirection.Either,
            _ => Direction(watch.Kind),
        };
        return new EventRule(direction, action, HasKink(watch.Kind));
    }

    /// <inheritdoc/>
    public bool OnRestart(int index, double t, Span<double> y)
    {
        Watch watch = watches[index];
        if (watch.Kind == WatchKind.ActFalls)
        {
            Begin(AfterAct(watch.Ordinal, t, y));
            JudgeAfterAct(t, y);
        }
        else
        {
            React(watch, t, y);
        }

        return now.LinesAtWork > 0;
    }

    private void React(Watch watch, double t, Span<double> y)
    {
        LineMode mode = now.Modes[watch.Line];
        if (watch.Kind == WatchKind.AllSettle && timeActsLeft > 0)
            Begin(now.With(t, [.. now.Modes.Select(own => own with { IsResting = own.IsAtWork })]));
        else if (watch.Kind == WatchKind.AllSettle)
            EndAllAtRest(t, y);
        else if (watch.Kind == WatchKind.HeadSettles && !EndsAtRest(watch.Line))
            Begin(now.With(t, watch.Line, mode with { IsResting = true }));
        else if (watch.Kind == WatchKind.FrontArrives)
            Advance(watch.Line, t, y);
        else if (watch.Kind == WatchKind.MarginVanishes && now.Plant.Lines[watch.Line].HoldsAtVapour && !mode.IsFilling)
            Begin(now.With(t, watch.Line, mode with { IsLimited = !mode.IsLimited }));
        else if (EndingOf(watch, t, y) is { } ending)
            Begin(now.With(t, watch.Line, mode with { Ending = ending, EndedAt = t }));
    }

    /// <summary>
    /// An act may leave a line where its end is behind it already, its inlet lifted out of the liquid or its head gone:
    /// there nothing crosses zero any more, so what would end the line is looked at once.
    /// </summary>
    private void JudgeAfterAct(double t, Span<double> y)
    {
        Span<double> dydt = stackalloc double[Dimension];
        Span<double> values = stackalloc double[watches.Length];
        Derivative(t, y, dydt);
        EventValues(t, y, dydt, values);
        for (int i = 0; i < watches.Length; i++)
        {
            bool ends = watches[i].Kind is WatchKind.InletUncovers or WatchKind.AirBreakUncovers or WatchKind.AirDrawn
                or WatchKind.MarginVanishes or WatchKind.LiftExhausts or WatchKind.HeadSettles or WatchKind.AllSettle;
            if (!ends || Rule(i) is not { Action: EventAction.Restart } rule)
                continue;
            if (rule.Direction == EventDirection.Rising ? values[i] > 0 : values[i] < 0)
                React(watches[i], t, y);
        }
    }

    /// <summary>How the line of a watch ends when it fires; null where it does not end.</summary>
    public Outcome? EndingOf(Watch watch, double t, ReadOnlySpan<double> y) => watch.Kind switch
    {
        WatchKind.InletUncovers => HoldsHeel(watch.Line) ? Outcome.InletUncovered : Outcome.Emptied,
        WatchKind.AirDrawn => Outcome.InletUncovered,
        WatchKind.AirBreakUncovers => Outcome.AirBreak,
        WatchKind.MarginVanishes or WatchKind.LiftExhausts => Outcome.VapourBreak,
        WatchKind.FrontStops => Outcome.NeverStarted,
        WatchKind.HeadSettles => RestOf(watch.Line, t, y),
        WatchKind.ReceiverBrims => Outcome.ReceiverFull,
        WatchKind.OutletCovers when RunsBack(watch.Line, t, y) => Outcome.Levelled, // the receiver sank to the outlet
        _ => null,
    };

    /// <summary>Whether the balance is another beyond the event whatever is done there; where a mode changes it goes on as it was.</summary>
    private static bool HasKink(WatchKind kind) => kind is WatchKind.TankBrims or WatchKind.OutletCovers or WatchKind.ReceiverBrims
        or WatchKind.SectionPasses or WatchKind.RegimePasses or WatchKind.InflowTurns or WatchKind.ValveMoves;

    private static EventDirection Direction(WatchKind kind) => kind switch
    {
        WatchKind.RegimePasses or WatchKind.SectionPasses or WatchKind.OutletCovers
            or WatchKind.BoreUncovers or WatchKind.ValveMoves => EventDirection.Either,
        WatchKind.ReceiverBrims or WatchKind.VacuumRatingPasses or WatchKind.PressureRatingPasses or WatchKind.TankBrims
            or WatchKind.InflowTurns or WatchKind.FrontArrives => EventDirection.Rising,
        _ => EventDirection.Falling,
    };

    /// <summary>
    /// The front goes on into the next segment; behind the last the line runs full, its flow from then on that of its head. A
    /// column that reaches the limit at its low point on the way parts, also where a full line would hold its flow there.
    /// </summary>
    private void Advance(int line, double t, Span<double> y)
    {
        LineMode mode = now.Modes[line];
        bool isLast = mode.Segment == now.Plant.Lines[line].Filling!.SegmentCount - 1;
        if (isLast)
            y[flowAt[line]] = 0;
        Begin(now.With(t, line, mode with { Segment = isLast ? -1 : mode.Segment + 1 }));
    }

    private void Begin(Epoch next)
    {
        epochs.Add(next);
        now = next;
    }

    private Epoch AfterAct(int ordinal, double t, Span<double> y)
    {
        Plant after = new(Job.Timeline[ordinal].ChangeOf(now.Plant.Job, Job));
        if (hasPressure && after.Gas.IsConfined)
            y[LineCount] = GasPressure(now, Volume(now, t, y), y);
        if (Job.Timeline[ordinal].Time is not null)
            timeActsLeft--;
        Epoch next = now.With(t, after).With(t, [.. now.Modes.Select(mode => mode with { IsResting = false })]);
        for (int i = 0; i < LineCount; i++)
        {
            if (flowAt[i] > 0 && after.Lines[i].Hydraulics.IsShut)
                y[flowAt[i]] = 0; // a valve stops the column where it is

            // Where an act gives a line that still fills other parts, its front goes on from the nearest of them.
            int last = (after.Lines[i].Filling?.SegmentCount ?? 0) - 1;
            if (now.Modes[i].IsFilling && now.Modes[i].Segment > last)
                next = next.With(t, i, next.Modes[i] with { Segment = last });
        }

        return next;
    }

    private bool HoldsHeel(int line) =>
        now.Plant.Lines[line] is var own && (own.HasTail ? own.Hydraulics.InletElevation : own.UncoverLevel) > Math.Max(run.SettledWithin, 0);

    /// <summary>Whether nothing but the one line at work moves the surfaces.</summary>
    private bool IsAlone => now.LinesAtWork == 1 && now.Plant.Job.Inflow is null;

    /// <summary>A line ends at rest when it hangs in the air, or when nothing else can move the surfaces again.</summary>
    private bool EndsAtRest(int line)
    {
        CompiledLine compiled = now.Plant.Lines[line];
        return (IsAlone && timeActsLeft == 0) || (compiled.DrawOff.Receiver is null && compiled.Hydraulics.RisesAboveInlet
            && compiled.Hydraulics.CrestElevation > compiled.Hydraulics.OutletElevation);
    }

    private void EndAllAtRest(double t, ReadOnlySpan<double> y)
    {
        for (int i = 0; i < LineCount; i++)
        {
            if (now.Modes[i].IsAtWork)
                Begin(now.With(t, i, now.Modes[i] with { Ending = RestOf(i, t, y), EndedAt = t }));
        }
    }

    private bool RunsBack(int line, double t, ReadOnlySpan<double> y)
    {
        double volume = Volume(now, t, y);
        return now.Plant.Lines[line].Head(vessel.Level(volume), GasPressure(now, volume, y), y[line]) < 0;
    }

    private Outcome RestOf(int line, double t, ReadOnlySpan<double> y)
    {
        double volume = Volume(now, t, y), surface = vessel.Level(volume);
        double liquidHead = surface - now.Plant.Lines[line].OutletLevel(y[line]), yield = now.Plant.Lines[line].Hydraulics.YieldHead;
        if (now.Plant.Gas.IsConfined && liquidHead > yield + 2 * run.SettledWithin)
            return Outcome.VacuumHeld;
        if (!HoldsHeel(line) && surface <= 2 * run.SettledWithin)
            return Outcome.Emptied;
        return yield > run.SettledWithin ? Outcome.YieldHeld : Outcome.Levelled;
    }
}
