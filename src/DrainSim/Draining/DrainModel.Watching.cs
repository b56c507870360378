using System.Diagnostics;
using DrainSim.Lines;

namespace DrainSim.Draining;

/// <content>What a run watches: the event functions and what they look at.</content>
internal sealed partial class DrainModel
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
            WatchKind.HeadSettles => Unsettled(HeadToRest(line, at, delivered), line.Hydraulics.YieldHead),
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

    /// <summary>The head to be used up; none where it would draw back over an outlet in the air, through which nothing comes.</summary>
    private double HeadToRest(CompiledLine line, in Moment at, double delivered)
    {
        double head = RestHead(line, at.Surface, at.Gas, delivered);
        return head < 0 && run.SettledWithin > 0 && !line.IsSubmerged(delivered) ? 0 : head;
    }

    /// <summary>Whether something still runs in, now or later.</summary>
    private bool IsFed(double t) =>
        now.Plant.Job.Inflow is { Points: [.., var last] } && (t < last.Time || last.Flow > 0);

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
