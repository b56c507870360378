using System.Diagnostics;
using DrainSim.Integration;
using DrainSim.Lines;

namespace DrainSim.Draining;

/// <content>What a run watches, what each event means for the lines, and how a line ends.</content>
internal sealed partial class DrainModel : IEventSet
{
    /// <inheritdoc/>
    public int EventCount => watches.Length;

    /// <summary>What the event functions watch, in the order of their indices.</summary>
    public IReadOnlyList<Watch> Watches => watches;

    /// <inheritdoc/>
    public void EventValues(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> values)
    {
        double volume = Volume(now, t, y), surface = vessel.Level(volume);
        double unclamped = StartVolume + now.InflowVolume(t);
        for (int i = 0; i < LineCount; i++)
            unclamped -= y[i];
        var moment = new Moment(t, unclamped, surface, GasPressure(now, volume, y));
        for (int i = 0; i < watches.Length; i++)
            values[i] = Value(watches[i], moment, y, dydt);
    }

    /// <inheritdoc/>
    public EventRule Rule(int index)
    {
        Watch watch = watches[index];
        EventAction action = watch.Kind switch
        {
            WatchKind.TargetReached or WatchKind.TankBrims or WatchKind.FlowsBalance => EventAction.Stop,
            WatchKind.VacuumRatingPasses or WatchKind.PressureRatingPasses => EventAction.Record,
            WatchKind.SectionPasses or WatchKind.ActFalls or WatchKind.InflowTurns or WatchKind.ValveMoves => EventAction.Restart,
            WatchKind.AllSettle => now.LinesAtWork > 1 || now.Plant.Job.Inflow is not null ? EventAction.Restart : EventAction.Ignore,
            _ when !now.Modes[watch.Line].IsAtWork => EventAction.Ignore,
            WatchKind.FrontArrives or WatchKind.FrontStops => now.Modes[watch.Line].IsFilling ? EventAction.Restart : EventAction.Ignore,
            WatchKind.RegimePasses or WatchKind.HeadSettles or WatchKind.BoreUncovers when now.Modes[watch.Line].IsFilling => EventAction.Ignore,
            WatchKind.BoreUncovers => EventAction.Record,
            WatchKind.LiftExhausts when !now.Modes[watch.Line].IsLimited => EventAction.Ignore,
            WatchKind.HeadSettles when !EndsAtRest(watch.Line) => EventAction.Ignore,
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
        if (watch.Kind == WatchKind.AllSettle)
            EndAllAtRest(t, y);
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
                or WatchKind.MarginVanishes or WatchKind.LiftExhausts or WatchKind.HeadSettles;
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
        Epoch next = now.With(t, after);
        for (int i = 0; i < LineCount; i++)
        {
            if (flowAt[i] > 0 && after.Lines[i].Hydraulics.IsShut)
                y[flowAt[i]] = 0; // a valve stops the column where it is

            // Where an act gives a line that still fills other parts, its front goes on from the nearest of them.
            int last = (after.Lines[i].Filling?.SegmentCount ?? 0) - 1;
            if (now.Modes[i].IsFilling && now.Modes[i].Segment > last)
                next = next.With(t, i, now.Modes[i] with { Segment = last });
        }

        return next;
    }

    private bool HoldsHeel(int line) =>
        now.Plant.Lines[line].Hydraulics.InletElevation > Math.Max(run.SettledWithin, 0);

    /// <summary>A line ends at rest when it hangs in the air, or when nothing else can move the surfaces again.</summary>
    private bool EndsAtRest(int line)
    {
        CompiledLine compiled = now.Plant.Lines[line];
        bool isAlone = now.LinesAtWork == 1 && now.Plant.Job.Inflow is null && now.From >= lastActTime;
        return isAlone || (compiled.DrawOff.Receiver is null && compiled.Hydraulics.RisesAboveInlet);
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

    private double Value(Watch watch, in Moment at, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt)
    {
        CompiledLine line = now.Plant.Lines[watch.Line];
        double delivered = y[watch.Line], flow = dydt[watch.Line];
        return watch.Kind switch
        {
            WatchKind.TargetReached or WatchKind.SectionPasses or WatchKind.TankBrims => (at.Volume - watch.Value) / vessel.Capacity,
            WatchKind.InletUncovers => (at.Volume - line.UncoverVolume) / vessel.Capacity,
            WatchKind.AirBreakUncovers => line.DrawOff.Line.AirBreak is { } hole ? at.Surface - hole : 1,
            WatchKind.AirDrawn => line.DrawOff.Line.Inlet.AirDraw == AirDraw.Break ? at.Surface - line.SubmergedAbove(flow) : 1,
            WatchKind.MarginVanishes when now.Modes[watch.Line] is { IsFilling: true, IsAtWork: true } mode =>
                line.FillingMargin(mode.Segment, at.Surface, at.Gas, flow, dydt[flowAt[watch.Line]]) / atmosphere,
            WatchKind.MarginVanishes => FreeMargin(watch.Line, at, delivered, flow) / atmosphere,
            WatchKind.FrontArrives => now.Modes[watch.Line] is { IsFilling: true, Segment: var segment }
                ? line.Filling!.Beyond(segment, delivered)
                : 1,
            WatchKind.FrontStops => now.Modes[watch.Line].IsFilling && !line.Hydraulics.IsShut ? flow / flowScales[watch.Line] : 1,
            WatchKind.LiftExhausts => line.Margin(0, at.Surface, at.Gas) / line.SpecificWeight - run.SettledWithin,
            WatchKind.HeadSettles => Unsettled(RestHead(line, at.Surface, at.Gas, delivered), line.Hydraulics.YieldHead),
            WatchKind.AllSettle => IsFed(at.Time) ? 1 : LargestHead(at, y) - run.SettledWithin,
            WatchKind.BoreUncovers => BoreCover(line.InletLimit(at.Surface), flow),
            WatchKind.OutletCovers => line.ReceiverSurface(delivered) - line.Hydraulics.OutletElevation,
            WatchKind.ReceiverBrims => line.ReceiverDepth(delivered)!.Value - line.BrimDepth!.Value,
            WatchKind.RegimePasses => RegimeDistance(line, watch, at, delivered),
            WatchKind.VacuumRatingPasses => (atmosphere - at.Gas - Job.VacuumRating!.Value) / atmosphere,
            WatchKind.PressureRatingPasses => (at.Gas - atmosphere - Job.PressureRating!.Value) / atmosphere,
            WatchKind.ValveMoves => (at.Gas - watch.Value) / atmosphere,
            WatchKind.FlowsBalance => Imbalance(at.Time, dydt),
            WatchKind.ActFalls => Job.Timeline[watch.Ordinal] is { Time: { } time } ? time - at.Time : at.Surface - Job.Timeline[watch.Ordinal].Level!.Value,
            WatchKind.InflowTurns => at.Time - watch.Value,
            _ => throw new UnreachableException($"no event function watches {watch.Kind}"),
        };
    }

    /// <summary>
    /// The head that has to be used up before a line rests, m. Under a vent that lets air in at any vacuum the vacuum wears
    /// off: there the liquid's own head has to be used up too, however small the driving head is meanwhile.
    /// </summary>
    private double RestHead(CompiledLine line, double surface, double gas, double delivered)
    {
        double head = line.Head(surface, gas, delivered);
        if (!now.Plant.Gas.LosesVacuum)
            return head;
        double liquid = surface - line.OutletLevel(delivered);
        return Math.Abs(liquid) > Math.Abs(head) ? liquid : head;
    }

    /// <summary>Whether something still runs in, now or later, or something is still to be done.</summary>
    private bool IsFed(double t) =>
        t <= lastActTime || (now.Plant.Job.Inflow is { Points: [.., var last] } && (t < last.Time || last.Flow > 0));

    /// <summary>
    /// The head above the yield head and the settled head, m; the head itself, which changes its sign, where neither is there.
    /// </summary>
    private double Unsettled(double head, double yield) =>
        run.SettledWithin == 0 && yield == 0 ? head : Math.Abs(head) - yield - run.SettledWithin; // 0 says that there is none

    /// <summary>
    /// The margin in free flow, Pa; the flow of the dense output serves where it is free. Where the margin cannot vanish
    /// its lower bound stands for it: of the same sign, and without a friction factor.
    /// </summary>
    private double FreeMargin(int line, in Moment at, double delivered, double flow)
    {
        double bound = now.Plant.Lines[line].MarginBound(at.Surface, at.Gas, delivered);
        if (bound > 0)
            return bound;
        double free = now.Modes[line].IsLimited ? Flow(now, line, at.Surface, at.Gas, delivered, limited: false) : flow;
        return now.Plant.Lines[line].Margin(free, at.Surface, at.Gas);
    }

    /// <summary>Positive while the inlet could let in more than the line carries; 1 where it is well covered.</summary>
    private static double BoreCover(double limit, double flow) =>
        double.IsInfinity(limit) ? 1 : limit <= 0 ? -1 : CoverAtEquality - flow / limit;

    private double RegimeDistance(CompiledLine line, Watch watch, in Moment at, double delivered)
    {
        if (line.Hydraulics.IsShut || watch.Ordinal >= line.Hydraulics.RegimeFlows.Count)
            return -1;
        double flow = line.Hydraulics.RegimeFlows[watch.Ordinal];
        return now.Modes[watch.Line].IsLimited
            ? line.Margin(flow, at.Surface, at.Gas) / atmosphere
            : Math.Abs(line.Head(at.Surface, at.Gas, delivered)) - line.RegimeHeads[watch.Ordinal];
    }

    private double LargestHead(in Moment at, ReadOnlySpan<double> y)
    {
        double largest = 0;
        for (int i = 0; i < LineCount; i++)
        {
            if (now.Modes[i] is { IsFilling: true, IsAtWork: true })
                return 1 + run.SettledWithin; // a column on its way does not rest
            if (now.Modes[i].IsAtWork)
                largest = Math.Max(largest, Math.Abs(RestHead(now.Plant.Lines[i], at.Surface, at.Gas, y[i])) - now.Plant.Lines[i].Hydraulics.YieldHead);
        }

        return largest;
    }

    /// <summary>Relative difference of inflow and outflow above that which counts as none; 1 before the inflow's last turn.</summary>
    private double Imbalance(double t, ReadOnlySpan<double> dydt)
    {
        double inflow = now.Inflow(t), outflow = 0;
        if (now.Plant.Job.Inflow is not { } table || inflow <= 0 || t < table.Points[^1].Time)
            return 1;
        for (int i = 0; i < LineCount; i++)
            outflow += dydt[i];
        return Math.Abs(inflow - outflow) / inflow - BalancedWithin;
    }

    /// <summary>Flow over inlet limit where the line alone would carry just the limit, 1; see <see cref="Lines.Inlets.FlowBlend"/>.</summary>
    private const double CoverAtEquality = 1 - Lines.Inlets.FlowBlend.HalfWidth / 4;

    /// <summary>Share of the inflow by which the outflow may differ and still count as balanced, 1.</summary>
    private const double BalancedWithin = 1e-3;

    /// <summary>What the event functions look at.</summary>
    private readonly record struct Moment(double Time, double Volume, double Surface, double Gas);
}
