using DrainSim.Lines;
using DrainSim.Lines.Inlets;
using DrainSim.Vessels;

namespace DrainSim.Draining;

/// <summary>A line and its receiver, ready to be asked for flows and pressures at any state; immutable.</summary>
internal sealed partial class CompiledLine
{
    private readonly double receiverStart, atmosphere, gravity, fixedSurface;
    private readonly Vessel? receiver;
    private readonly double receiverBottom, bore;
    private readonly int parallel;
    private readonly PartFullInlet? tail;
    private readonly bool hasOneBore;

    /// <param name="drawOff">the line and what it discharges into</param>
    /// <param name="job">the job that it belongs to</param>
    public CompiledLine(DrawOff drawOff, Job job)
    {
        DrawOff = drawOff;
        Line line = drawOff.Line;
        (atmosphere, gravity) = (job.Site.AtmosphericPressure, job.Site.Gravity);
        Hydraulics = new LineHydraulics(line, job.Liquid, gravity);
        SpecificWeight = job.Liquid.Density * gravity;
        Threshold = Math.Max(job.Liquid.VapourPressure, line.LeastPressure ?? 0);
        (bore, parallel) = (line.Bore, line.Parallel);
        hasOneBore = line.Path.All(item => item.Bore is null || item.Bore == line.Bore);
        fixedSurface = (drawOff.Receiver as FixedSurface)?.Elevation ?? double.NegativeInfinity;
        if (drawOff.Receiver is ReceivingTank tank)
        {
            (receiver, receiverBottom) = (tank.Vessel, tank.Bottom);
            receiverStart = tank.Vessel.Volume(tank.Level);
            BrimDepth = tank.BrimDepth;
        }

        Filling = drawOff.Front is { } front ? FillingLine.Of(Hydraulics, front, parallel, gravity) : null;
        tail = TailOf(line, Hydraulics);
        bool drawsAirAtCrown = Hydraulics.RisesAboveInlet && line.Inlet.Facing == InletFacing.Side;
        UncoverLevel = Hydraulics.InletElevation
            + (tail is not null ? Math.Max(job.Run.SettledWithin, LeastFilm) : drawsAirAtCrown ? Hydraulics.Node(0).Bore : 0);
        UncoverVolume = job.Vessel.Volume(UncoverLevel);
        RegimeHeads = [.. Hydraulics.RegimeFlows.Select(Hydraulics.HeadLoss)];
    }

    /// <summary>Volume in the tank at which the inlet takes air, m³.</summary>
    public double UncoverVolume { get; }

    /// <summary>Driving heads that belong to the regime flows, m; infinite behind a shut valve.</summary>
    public double[] RegimeHeads { get; }

    /// <summary>Film that a partly full inlet leaves where no settled head is given, m; common practice, no source.</summary>
    private const double LeastFilm = 1e-4;

    /// <summary>The line and what it discharges into, as given.</summary>
    public DrawOff DrawOff { get; }

    /// <summary>The line compiled for the liquid.</summary>
    public LineHydraulics Hydraulics { get; }

    /// <summary>Weight of the liquid per volume ρ·g, Pa/m.</summary>
    public double SpecificWeight { get; }

    /// <summary>The vapour pressure or the stricter least pressure allowed, Pa absolute.</summary>
    public double Threshold { get; }

    /// <summary>Whether the flow is held at the threshold instead of the column parting.</summary>
    public bool HoldsAtVapour => DrawOff.Line.AtVapour == AtVapour.Limit;

    /// <summary>Level at which the inlet takes air and the line is finished, m.</summary>
    public double UncoverLevel { get; }

    /// <summary>Whether the line goes on as a partly full inlet once its bore is uncovered.</summary>
    public bool HasTail => tail is not null;

    /// <summary>Depth at which the receiver runs over, m; null where it is no tank.</summary>
    public double? BrimDepth { get; }

    /// <summary>The column that has yet to fill the outer leg; null for a line that starts full.</summary>
    public FillingLine? Filling { get; }

    /// <summary>Head from the surface in the tank to the front of a line that fills, m.</summary>
    /// <param name="segment">segment that the front is in, from 0</param>
    /// <param name="surface">level in the tank, m</param>
    /// <param name="gas">pressure of the gas over it, Pa absolute</param>
    /// <param name="delivered">volume that has left the tank, m³</param>
    public double FrontHead(int segment, double surface, double gas, double delivered) =>
        surface - Filling!.FrontElevation(segment, delivered) + (gas - atmosphere) / SpecificWeight
        - (OutletLevel(delivered) - Hydraulics.OutletElevation);

    /// <summary>dQ/dt of a line that fills, m³/s².</summary>
    /// <param name="segment">segment that the front is in, from 0</param>
    /// <param name="surface">level in the tank, m</param>
    /// <param name="gas">pressure of the gas over it, Pa absolute</param>
    /// <param name="delivered">volume that has left the tank, m³</param>
    /// <param name="flow">flow, m³/s</param>
    public double Acceleration(int segment, double surface, double gas, double delivered, double flow) =>
        Hydraulics.IsShut ? 0 : Filling!.Acceleration(segment, delivered, flow, FrontHead(segment, surface, gas, delivered));

    /// <summary>Least pressure in a line that fills less the threshold, Pa.</summary>
    /// <param name="segment">segment that the front is in, from 0</param>
    /// <param name="surface">level in the tank, m</param>
    /// <param name="gas">pressure of the gas over it, Pa absolute</param>
    /// <param name="flow">flow, m³/s</param>
    /// <param name="acceleration">dQ/dt, m³/s²</param>
    public double FillingMargin(int segment, double surface, double gas, double flow, double acceleration) =>
        Filling!.LowPointPressure(segment, Math.Max(0, flow), acceleration, surface, gas) - Threshold;

    /// <summary>Froude number v/√(g·D) in the widest bore behind the crest, 1.</summary>
    /// <param name="flow">flow, m³/s</param>
    public double OuterLegFroude(double flow)
    {
        double widest = 0;
        for (int i = Hydraulics.CrestIndex; i < Hydraulics.NodeCount; i++)
            widest = Math.Max(widest, Hydraulics.Node(i).Bore);
        return flow / (parallel * Math.PI / 4 * widest * widest) / Math.Sqrt(gravity * widest);
    }

    /// <summary>Depth in the receiver, m; null where it is no tank.</summary>
    /// <param name="delivered">volume that the line has delivered, m³</param>
    public double? ReceiverDepth(double delivered) => receiver?.Level(Math.Max(0, receiverStart + Arrived(delivered)));

    /// <summary>Elevation of the receiving surface, m; negative infinity in the open air.</summary>
    /// <param name="delivered">volume that the line has delivered, m³</param>
    public double ReceiverSurface(double delivered) =>
        receiver is null ? fixedSurface : receiverBottom + receiver.Level(Math.Max(0, receiverStart + Arrived(delivered)));

    /// <summary>Of a volume that has left the tank, what has not stayed in the line, m³.</summary>
    private double Arrived(double delivered) => Filling is null ? delivered : Math.Max(0, delivered - Filling.Volume);

    /// <summary>Whether the outlet is under the receiving surface.</summary>
    /// <param name="delivered">volume that the line has delivered, m³</param>
    public bool IsSubmerged(double delivered) => ReceiverSurface(delivered) >= Hydraulics.OutletElevation;

    /// <summary>The higher of outlet and receiving surface, m.</summary>
    /// <param name="delivered">volume that the line has delivered, m³</param>
    public double OutletLevel(double delivered) => Math.Max(Hydraulics.OutletElevation, ReceiverSurface(delivered));

    /// <summary>Driving head, m; negative when the line would run backwards.</summary>
    /// <param name="surface">level in the tank, m</param>
    /// <param name="gas">pressure of the gas over it, Pa absolute</param>
    /// <param name="delivered">volume that the line has delivered, m³</param>
    public double Head(double surface, double gas, double delivered) =>
        surface - OutletLevel(delivered) + (gas - atmosphere) / SpecificWeight;

    /// <summary>Driving head, whichever way it acts, above what the yield stress holds, m; negative while that holds it.</summary>
    /// <param name="surface">level in the tank, m</param>
    /// <param name="gas">pressure of the gas over it, Pa absolute</param>
    /// <param name="delivered">volume that the line has delivered, m³</param>
    public double MovingHead(double surface, double gas, double delivered) =>
        Math.Abs(Head(surface, gas, delivered)) - Hydraulics.YieldHead;

    /// <summary>Flow out of the tank, m³/s; negative when a submerged line runs backwards.</summary>
    /// <param name="state">level, gas pressure, delivered volume and whether the flow is held at the threshold</param>
    public double Flow(in LineConditions state)
    {
        KnownFlow known = default;
        return Flow(state, ref known);
    }

    /// <summary>Flow out of the tank, m³/s; negative when a submerged line runs backwards.</summary>
    /// <param name="state">level, gas pressure, delivered volume and whether the flow is held at the threshold</param>
    /// <param name="known">the flow that was found last; becomes this one, where there is one</param>
    public double Flow(in LineConditions state, ref KnownFlow known)
    {
        double head = Head(state.Surface, state.Gas, state.Delivered);
        if (head <= 0)
        {
            if (head == 0 || !IsSubmerged(state.Delivered) || receiverStart + Arrived(state.Delivered) <= 0 && receiver is not null)
                return 0;
            double back = Hydraulics.Flow(-head, Math.Abs(known.Flow));
            if (back > 0)
                known = new KnownFlow(-back);
            return -back;
        }

        double free = Hydraulics.Flow(head, Math.Max(0, known.Near(head)), out double slope);
        if (free > 0)
            known = new KnownFlow(free, head, slope);
        if (state.IsLimited)
            return Hydraulics.FlowKeepingLowPoint(Threshold, state.Surface, state.Gas, free);
        return tail is null
            ? free
            : parallel * tail.Flow(state.Surface - Hydraulics.InletElevation, gravity, free / parallel, 0, out _);
    }

    /// <summary>Most flow that the partly covered inlet lets in, m³/s; infinite where it is well covered or has no tail.</summary>
    /// <param name="surface">level in the tank, m</param>
    public double InletLimit(double surface) => tail is null
        ? double.PositiveInfinity
        : parallel * tail.Limit(surface - Hydraulics.InletElevation, gravity, out _);

    private static readonly CriticalSubmergence[] Submergences =
        [.. Enum.GetValues<InletFacing>().Select(facing => new CriticalSubmergence(facing))];

    /// <summary>The submergences at which air may be drawn at a flow.</summary>
    /// <param name="flow">flow of all parallel lines, m³/s</param>
    public SubmergenceBand Submergence(double flow) =>
        Submergences[(int)DrawOff.Line.Inlet.Facing].At(Hydraulics.Velocity(Math.Max(0, flow)), bore, gravity);

    /// <summary>Level under which air is drawn by the least of the published forms, m.</summary>
    /// <param name="flow">flow of all parallel lines, m³/s</param>
    public double SubmergedAbove(double flow) => Hydraulics.InletElevation + Submergence(flow).Least;

    /// <summary>Least pressure in the line less the threshold, Pa.</summary>
    /// <param name="flow">flow, m³/s</param>
    /// <param name="surface">level in the tank, m</param>
    /// <param name="gas">pressure of the gas over it, Pa absolute</param>
    public double Margin(double flow, double surface, double gas) =>
        Hydraulics.LowPointPressure(Math.Max(0, flow), surface, gas, out _) - Threshold;

    /// <summary>
    /// A pressure that the margin at the low point is not below in free flow, Pa: the crest's at rest less all of the driving
    /// head. Negative infinity for a line of several bores, in which a wider bore gives pressure back.
    /// </summary>
    /// <param name="surface">level in the tank, m</param>
    /// <param name="gas">pressure of the gas over it, Pa absolute</param>
    /// <param name="delivered">volume that the line has delivered, m³</param>
    public double MarginBound(double surface, double gas, double delivered)
    {
        if (!hasOneBore)
            return double.NegativeInfinity;
        double used = Math.Max(Hydraulics.YieldHead, Head(surface, gas, delivered));
        return gas + SpecificWeight * (surface - Hydraulics.CrestElevation - used) - Threshold;
    }

    /// <summary>The limit of a regime, as a Reynolds number, that one of the bores passes at a flow, 1.</summary>
    /// <param name="flow">one of the line's regime flows, m³/s</param>
    public double RegimeLimit(double flow)
    {
        double limit = FrictionFactor.LaminarLimit, nearest = double.PositiveInfinity;
        for (int i = 0; i < Hydraulics.NodeCount; i++)
        {
            double re = Hydraulics.ReynoldsAt(i, flow);
            foreach (double candidate in (ReadOnlySpan<double>)[FrictionFactor.LaminarLimit, FrictionFactor.TurbulentLimit])
            {
                if (Math.Abs(re - candidate) < nearest)
                    (limit, nearest) = (candidate, Math.Abs(re - candidate));
            }
        }

        return limit;
    }

    /// <summary>Volume of all parallel lines between the inlet and the crest that stands above an elevation, m³.</summary>
    /// <param name="elevation">elevation, m</param>
    public double InnerLegVolumeAbove(double elevation)
    {
        double volume = 0;
        for (int i = 1; i <= Hydraulics.CrestIndex; i++)
        {
            (LineNode from, LineNode to) = (Hydraulics.Node(i - 1), Hydraulics.Node(i));
            double low = Math.Min(from.Elevation, to.Elevation), high = Math.Max(from.Elevation, to.Elevation);
            double share = low >= elevation ? 1 : high <= elevation ? 0 : (high - elevation) / (high - low);
            volume += share * (to.Distance - from.Distance) * Math.PI * to.Bore * to.Bore / 4;
        }

        return volume * parallel;
    }

    private static PartFullInlet? TailOf(Line line, LineHydraulics hydraulics)
    {
        Inlet inlet = line.Inlet;
        if (hydraulics.RisesAboveInlet || (inlet.Facing == InletFacing.Down && inlet.FloorClearance is null))
            return null;
        return PartFullInlet.Of(inlet.Facing, hydraulics.Node(0).Bore, inlet.EdgeLoss, inlet.FloorClearance ?? 0);
    }
}
