using DrainSim.Liquids;

namespace DrainSim.Lines;

/// <summary>A line compiled for one liquid and gravity: flow for a head, head for a flow, pressures along it.</summary>
/// <remarks>
/// <code>
/// H = Σ f·(L/D)·v²/2g + Σ K·v²/2g + α·v_out²/2g
/// p_k = p_s + ρ·g·(z_s − z_k) − ρ·α·v_k²/2 − ρ·g·h(0→k)
/// </code>
/// Flows are of all parallel lines together. Nothing changes after construction and no method allocates, so one
/// object serves any number of threads. The loss H rises strictly with the flow; only where the sole loss is the
/// jet of a pure orifice does its slope touch 0, at Re 4000. For a liquid with a yield stress the loss begins at the yield
/// head Σ 4·τ_y·L/(ρ·g·D) of its runs, and a liquid at rest is taken at the point of moving.
/// </remarks>
public sealed class LineHydraulics
{
    /// <summary>Elevations closer than this are one elevation, m: what adding up rises can be off by, with room.</summary>
    private const double SameElevation = 1e-9;

    private readonly LineNode[] nodes;
    private readonly LineLosses losses;
    private readonly StressLosses? stress; // takes the place of losses for a liquid that is not Newtonian
    private readonly double parallel;
    private readonly double ownArea;
    private readonly double ownReynolds;
    private readonly double narrowestArea;
    private readonly double weight;

    /// <summary>Compiles a line.</summary>
    /// <param name="line">the line</param>
    /// <param name="liquid">the liquid in it</param>
    /// <param name="gravity">acceleration of gravity, m/s²; greater than 0</param>
    /// <exception cref="ArgumentOutOfRangeException">gravity, or a roughness as large as its bore</exception>
    public LineHydraulics(Line line, Liquid liquid, double gravity)
    {
        ArgumentNullException.ThrowIfNull(line);
        ArgumentNullException.ThrowIfNull(liquid);
        Require.Positive(gravity, "gravity", "m/s2");
        var compiled = new LineCompiler(line, liquid, gravity);
        nodes = compiled.Nodes;
        losses = compiled.Losses();
        if (liquid.FlowCurve is { IsNewtonian: false } curve)
            stress = new StressLosses(compiled, curve, liquid.Density);
        parallel = line.Parallel;
        ownArea = parallel * Area(line.Bore);
        ownReynolds = losses.Steps[0].ReynoldsPerFlow / parallel;
        narrowestArea = parallel * Area(nodes.Min(node => node.Bore));
        weight = liquid.Density * gravity;
        IsShut = compiled.IsShut;
        Inertance = compiled.Inertance / parallel;
        RegimeFlows = Array.AsReadOnly(Array.ConvertAll(
            stress?.RegimeFlows ?? compiled.RegimeFlows(compiled.RegimeBores), flow => flow * parallel));
        CrestIndex = HighestOf(nodes);
        InnerLegVolume = parallel * compiled.Volumes[CrestIndex];
        LineVolume = parallel * compiled.Volumes[^1];
    }

    /// <summary>Elevation of the inlet, m.</summary>
    public double InletElevation => nodes[0].Elevation;

    /// <summary>Elevation of the outlet, m.</summary>
    public double OutletElevation => nodes[^1].Elevation;

    /// <summary>Elevation of the highest node, m.</summary>
    public double CrestElevation => nodes[CrestIndex].Elevation;

    /// <summary>Index of the highest node; the first of several at one elevation.</summary>
    public int CrestIndex { get; }

    /// <summary>Whether the crest stands above the inlet.</summary>
    public bool RisesAboveInlet => CrestElevation > InletElevation + SameElevation;

    /// <summary>Volume of all parallel lines, m³; fittings and valves hold none.</summary>
    public double LineVolume { get; }

    /// <summary>Volume of all parallel lines from the inlet to the crest, m³.</summary>
    public double InnerLegVolume { get; }

    /// <summary>Volume of all parallel lines from the crest to the outlet, m³.</summary>
    public double OuterLegVolume => LineVolume - InnerLegVolume;

    /// <summary>Developed length of one line, m.</summary>
    public double TotalLength => nodes[^1].Distance;

    /// <summary>Area of all parallel outlets, m².</summary>
    public double OutletArea => parallel * Area(nodes[^1].Bore);

    /// <summary>Σ L/(g·n·A), s²/m²: the head that speeds the flow up by 1 m³/s in 1 s.</summary>
    public double Inertance { get; }

    /// <summary>Whether a valve is shut, so that nothing flows.</summary>
    public bool IsShut { get; }

    /// <summary>
    /// Flows at which the flow in a straight run or at the outlet stops being laminar or becomes fully turbulent,
    /// rising, m³/s: the only places where the loss has a kink.
    /// </summary>
    public IReadOnlyList<double> RegimeFlows { get; }

    /// <summary>Head that the liquid's yield stress holds before anything flows, m; 0 for a liquid without one.</summary>
    public double YieldHead => stress?.YieldHead ?? 0;

    /// <summary>Number of nodes; at least 1.</summary>
    public int NodeCount => nodes.Length;

    /// <summary>A node, counted from just inside the inlet to just inside the outlet.</summary>
    /// <param name="index">from 0 to <see cref="NodeCount"/> − 1</param>
    public LineNode Node(int index) => nodes[index];

    /// <summary>Head used up by a flow, the jet's velocity head included, m; infinite through a shut valve.</summary>
    /// <param name="flow">flow, m³/s; at least 0</param>
    public double HeadLoss(double flow) => HeadLoss(flow, out _);

    /// <summary>Head used up by a flow, m, and its slope.</summary>
    /// <param name="flow">flow, m³/s; at least 0, at which the yield head is used</param>
    /// <param name="slope">dH/dQ, s/m²; at no flow that of the laminar law</param>
    public double HeadLoss(double flow, out double slope)
    {
        if (IsShut)
        {
            slope = double.PositiveInfinity;
            return flow > 0 ? double.PositiveInfinity : 0;
        }
        if (stress is not null)
        {
            double used = stress.Used(NodeCount - 1, flow / parallel, out double usedRise);
            slope = flow > 0 ? usedRise / flow : stress.SlopeAtRest;
            return used;
        }
        if (flow == 0)
        {
            slope = (losses.Steps[^1].LinearToHere + losses.Steps[^1].LaminarToHere) / parallel;
            return 0;
        }
        double head = losses.Used(NodeCount - 1, flow / parallel, out double rise);
        slope = rise / flow;
        return head;
    }

    /// <summary>Flow under a head, m³/s; 0 for no head or a shut valve.</summary>
    /// <param name="head">driving head, m</param>
    /// <param name="guess">a flow nearby, m³/s; 0 when none is known</param>
    public double Flow(double head, double guess) => Flow(head, guess, out _);

    /// <summary>Flow under a head, m³/s, and its slope.</summary>
    /// <param name="head">driving head, m</param>
    /// <param name="guess">a flow nearby, m³/s; 0 when none is known</param>
    /// <param name="slope">dQ/dH, m²/s; 0 where nothing flows</param>
    public double Flow(double head, double guess, out double slope)
    {
        slope = 0;
        if (IsShut)
            return 0;
        double flow = FlowTo(NodeCount - 1, head, guess / parallel, out slope);
        slope *= parallel;
        return flow * parallel;
    }

    /// <summary>Velocity in the line's own bore, m/s.</summary>
    /// <param name="flow">flow, m³/s</param>
    public double Velocity(double flow) => flow / ownArea;

    /// <summary>Velocity in the narrowest bore, m/s.</summary>
    /// <param name="flow">flow, m³/s</param>
    public double LargestVelocity(double flow) => flow / narrowestArea;

    /// <summary>
    /// Reynolds number in the line's own bore, 1; for a liquid that is not Newtonian that of laminar friction 64/Re.
    /// </summary>
    /// <param name="flow">flow, m³/s</param>
    public double Reynolds(double flow) => stress is null ? flow * ownReynolds : ReynoldsAt(0, flow);

    /// <summary>Reynolds number in the bore of a node, 1.</summary>
    /// <param name="node">from 0 to <see cref="NodeCount"/> − 1</param>
    /// <param name="flow">flow, m³/s; at least 0</param>
    public double ReynoldsAt(int node, double flow) => stress is null
        ? flow / parallel * losses.Steps[node].ReynoldsPerFlow
        : stress.Reynolds(node, Math.Abs(flow) / parallel);

    /// <summary>Water starting time Σ L·v/(g·H): in which the head alone would bring the line to the flow, s.</summary>
    /// <param name="flow">flow, m³/s</param>
    /// <param name="head">driving head, m; without head the time counts as 0</param>
    public double InertiaTime(double flow, double head) => head > 0 ? Inertance * flow / head : 0;

    /// <summary>Absolute pressure at every node, Pa; negative where the liquid would have to pull.</summary>
    /// <remarks>Behind a shut valve the pressure is the one that the tank would give with the valve ajar.</remarks>
    /// <param name="flow">flow, m³/s; at least 0</param>
    /// <param name="surface">elevation of the liquid's surface in the tank, m</param>
    /// <param name="gasPressure">absolute pressure on that surface, Pa</param>
    /// <param name="pressures">receives <see cref="NodeCount"/> pressures</param>
    public void Pressures(double flow, double surface, double gasPressure, Span<double> pressures)
    {
        if (stress is null)
            Pressures(new LossWalk(losses, flow / parallel), surface, gasPressure, pressures);
        else
            Pressures(new StressWalk(stress, flow / parallel), surface, gasPressure, pressures);
    }

    /// <summary>The least absolute pressure over the nodes before the outlet, Pa.</summary>
    /// <remarks>
    /// The node at the outlet is left out, because the receiver sets the pressure there; a line of one node has
    /// its inlet for a low point. Between nodes the pressure is linear, so none lower is missed but the narrowest
    /// part of the stream inside a fitting.
    /// </remarks>
    /// <param name="flow">flow, m³/s; at least 0</param>
    /// <param name="surface">elevation of the liquid's surface in the tank, m</param>
    /// <param name="gasPressure">absolute pressure on that surface, Pa</param>
    /// <param name="node">where it is; the first of equals</param>
    public double LowPointPressure(double flow, double surface, double gasPressure, out int node)
    {
        double highest = stress is null
            ? HighestLift(new LossWalk(losses, flow / parallel), out node)
            : HighestLift(new StressWalk(stress, flow / parallel), out node);
        return gasPressure + weight * (surface - highest);
    }

    /// <summary>
    /// Head used up on the way to a place on the run in front of a node by a column that ends there, its velocity head
    /// included, m.
    /// </summary>
    /// <param name="node">a node behind a run; at least 1</param>
    /// <param name="share">place on the run, 1; 0 at its start, 1 at the node</param>
    /// <param name="flow">flow, m³/s; at least 0</param>
    public double HeadWithin(int node, double share, double flow) => stress is null
        ? HeadWithin(new LossWalk(losses, flow / parallel), node, share)
        : HeadWithin(new StressWalk(stress, flow / parallel), node, share);

    /// <summary>The least absolute pressure over the first nodes while the flow changes, Pa.</summary>
    /// <param name="flow">flow, m³/s; at least 0</param>
    /// <param name="acceleration">dQ/dt, m³/s²</param>
    /// <param name="inertances">Σ L/(g·n·A) from the inlet to each of those nodes, s²/m²</param>
    /// <param name="surface">elevation of the liquid's surface in the tank, m</param>
    /// <param name="gasPressure">absolute pressure on that surface, Pa</param>
    internal double LowPointPressure(
        double flow, double acceleration, ReadOnlySpan<double> inertances, double surface, double gasPressure)
    {
        double highest = stress is null
            ? HighestLift(new LossWalk(losses, flow / parallel), acceleration, inertances)
            : HighestLift(new StressWalk(stress, flow / parallel), acceleration, inertances);
        return gasPressure + weight * (surface - highest);
    }

    /// <summary>
    /// The largest flow at which the low point is not below a pressure (to rounding), m³/s; 0 when the static lift
    /// alone is too much.
    /// </summary>
    /// <param name="leastPressure">pressure to keep, Pa absolute</param>
    /// <param name="surface">elevation of the liquid's surface in the tank, m</param>
    /// <param name="gasPressure">absolute pressure on that surface, Pa</param>
    /// <param name="most">flow above which no answer is wanted, m³/s; at least 0</param>
    public double FlowKeepingLowPoint(double leastPressure, double surface, double gasPressure, double most)
    {
        double flow = IsShut ? 0 : most;
        int solved = -1;
        for (int turn = 0; turn < NodeCount; turn++)
        {
            double pressure = LowPointPressure(flow, surface, gasPressure, out int node);
            if (pressure >= leastPressure || node == solved || flow == 0)
                break;
            double head = (gasPressure - leastPressure) / weight + surface - nodes[node].Elevation;
            double kept = FlowTo(node, head, flow / parallel, out _);
            flow = Math.Min(flow, kept * parallel);
            solved = node;
        }
        return flow;
    }

    private double FlowTo(int node, double head, double guess, out double slope) => stress is null
        ? FlowSearch.Flow(losses, node, head, guess, out slope)
        : stress.Flow(node, head, guess, out slope);

    private void Pressures<TWalk>(TWalk walk, double surface, double gasPressure, Span<double> pressures)
        where TWalk : struct, ILossWalk
    {
        for (int i = 0; walk.MoveNext(); i++)
            pressures[i] = gasPressure + weight * (surface - (nodes[i].Elevation + walk.Used));
    }

    /// <summary>The highest sum of elevation and head used over the nodes before the outlet, m.</summary>
    private double HighestLift<TWalk>(TWalk walk, out int node)
        where TWalk : struct, ILossWalk
    {
        double highest = double.NegativeInfinity;
        node = 0;
        int count = Math.Max(1, NodeCount - 1);
        for (int i = 0; i < count; i++)
        {
            walk.MoveNext();
            double lift = nodes[i].Elevation + walk.Used;
            if (lift > highest)
            {
                highest = lift;
                node = i;
            }
        }
        return highest;
    }

    private double HighestLift<TWalk>(TWalk walk, double acceleration, ReadOnlySpan<double> inertances)
        where TWalk : struct, ILossWalk
    {
        double highest = double.NegativeInfinity;
        for (int i = 0; i < inertances.Length && walk.MoveNext(); i++)
            highest = Math.Max(highest, nodes[i].Elevation + walk.Used + acceleration * inertances[i]);
        return highest;
    }

    private static double HeadWithin<TWalk>(TWalk walk, int node, double share)
        where TWalk : struct, ILossWalk
    {
        for (int i = 0; i < node; i++)
            walk.MoveNext();
        double before = walk.Lost;
        walk.MoveNext();
        return before + share * (walk.Lost - before) + walk.Used - walk.Lost;
    }

    private static double Area(double bore) => Math.PI / 4 * bore * bore;

    private static int HighestOf(LineNode[] nodes)
    {
        int highest = 0;
        for (int i = 1; i < nodes.Length; i++)
        {
            if (nodes[i].Elevation > nodes[highest].Elevation + SameElevation)
                highest = i;
        }
        return highest;
    }
}
