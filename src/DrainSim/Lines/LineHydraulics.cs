using DrainSim.Liquids;

namespace DrainSim.Lines;

/// <summary>A line compiled for one liquid and gravity: flow for a head, head for a flow, pressures along it.</summary>
public sealed class LineHydraulics
{
    private readonly LineNode[] nodes = [];

    /// <summary>Compiles a line.</summary>
    /// <param name="line">the line</param>
    /// <param name="liquid">the liquid in it</param>
    /// <param name="gravity">acceleration of gravity, m/s²; greater than 0</param>
    public LineHydraulics(Line line, Liquid liquid, double gravity)
    {
        ArgumentNullException.ThrowIfNull(line);
        ArgumentNullException.ThrowIfNull(liquid);
        Require.Positive(gravity, "gravity", "m/s2");
        throw new NotSupportedException("a line is not yet compiled");
    }

    /// <summary>Elevation of the inlet, m.</summary>
    public double InletElevation { get; }

    /// <summary>Elevation of the outlet, m.</summary>
    public double OutletElevation { get; }

    /// <summary>Elevation of the highest node, m.</summary>
    public double CrestElevation { get; }

    /// <summary>Index of the highest node; the first of several at one elevation.</summary>
    public int CrestIndex { get; }

    /// <summary>Whether the crest stands above the inlet.</summary>
    public bool RisesAboveInlet { get; }

    /// <summary>Volume of all parallel lines, m³.</summary>
    public double LineVolume { get; }

    /// <summary>Volume of all parallel lines from the inlet to the crest, m³.</summary>
    public double InnerLegVolume { get; }

    /// <summary>Volume of all parallel lines from the crest to the outlet, m³.</summary>
    public double OuterLegVolume { get; }

    /// <summary>Developed length of one line, m.</summary>
    public double TotalLength { get; }

    /// <summary>Area of all parallel outlets, m².</summary>
    public double OutletArea { get; }

    /// <summary>Σ L/(g·n·A), s²/m²: the head that speeds the flow up by 1 m³/s in 1 s.</summary>
    public double Inertance { get; }

    /// <summary>Whether a valve is shut, so that nothing flows.</summary>
    public bool IsShut { get; }

    /// <summary>
    /// Flows of all parallel lines at which the flow in a straight run or at the outlet stops being laminar or
    /// becomes fully turbulent, rising, m³/s.
    /// </summary>
    public IReadOnlyList<double> RegimeFlows { get; } = [];

    /// <summary>Number of nodes; at least 1.</summary>
    public int NodeCount => nodes.Length;

    /// <summary>A node, counted from the inlet.</summary>
    /// <param name="index">from 0 to <see cref="NodeCount"/> − 1</param>
    public LineNode Node(int index) => nodes[index];

    /// <summary>Head used up by a flow, the jet's velocity head included, m.</summary>
    /// <param name="flow">flow of all parallel lines, m³/s; at least 0</param>
    public double HeadLoss(double flow) => HeadLoss(flow, out _);

    /// <summary>Head used up by a flow, m, and its slope.</summary>
    /// <param name="flow">flow of all parallel lines, m³/s; at least 0</param>
    /// <param name="slope">dH/dQ, s/m²</param>
    public double HeadLoss(double flow, out double slope) => slope = flow * NodeCount;

    /// <summary>Flow of all parallel lines under a head, m³/s; 0 for no head or a shut valve.</summary>
    /// <param name="head">driving head, m</param>
    /// <param name="guess">a flow nearby, m³/s; 0 when none is known</param>
    public double Flow(double head, double guess) => Flow(head, guess, out _);

    /// <summary>Flow of all parallel lines under a head, m³/s, and its slope.</summary>
    /// <param name="head">driving head, m</param>
    /// <param name="guess">a flow nearby, m³/s; 0 when none is known</param>
    /// <param name="slope">dQ/dH, m²/s; 0 where nothing flows</param>
    public double Flow(double head, double guess, out double slope) => slope = head * guess * NodeCount;

    /// <summary>Velocity in the line's own bore, m/s.</summary>
    /// <param name="flow">flow of all parallel lines, m³/s</param>
    public double Velocity(double flow) => flow * OutletArea;

    /// <summary>Velocity in the narrowest bore, m/s.</summary>
    /// <param name="flow">flow of all parallel lines, m³/s</param>
    public double LargestVelocity(double flow) => flow * OutletArea;

    /// <summary>Reynolds number in the line's own bore, 1.</summary>
    /// <param name="flow">flow of all parallel lines, m³/s</param>
    public double Reynolds(double flow) => flow * OutletArea;

    /// <summary>Time in which the head alone would bring the line's liquid to the flow, Σ L·v/(g·H), s.</summary>
    /// <param name="flow">flow of all parallel lines, m³/s</param>
    /// <param name="head">driving head, m; 0 is given for no head</param>
    public double InertiaTime(double flow, double head) => head > 0 ? Inertance * flow / head : 0;

    /// <summary>Absolute pressure at every node, Pa.</summary>
    /// <param name="flow">flow of all parallel lines, m³/s</param>
    /// <param name="surface">elevation of the liquid's surface in the tank, m</param>
    /// <param name="gasPressure">absolute pressure on that surface, Pa</param>
    /// <param name="pressures">receives <see cref="NodeCount"/> pressures</param>
    public void Pressures(double flow, double surface, double gasPressure, Span<double> pressures) =>
        pressures[..NodeCount].Fill(gasPressure + flow * surface);

    /// <summary>The least absolute pressure over the nodes before the outlet, Pa.</summary>
    /// <param name="flow">flow of all parallel lines, m³/s</param>
    /// <param name="surface">elevation of the liquid's surface in the tank, m</param>
    /// <param name="gasPressure">absolute pressure on that surface, Pa</param>
    /// <param name="node">where it is</param>
    public double LowPointPressure(double flow, double surface, double gasPressure, out int node)
    {
        node = CrestIndex;
        return gasPressure + flow * surface;
    }

    /// <summary>The largest flow at which the low point is not below a pressure, m³/s.</summary>
    /// <param name="leastPressure">pressure to keep, Pa absolute</param>
    /// <param name="surface">elevation of the liquid's surface in the tank, m</param>
    /// <param name="gasPressure">absolute pressure on that surface, Pa</param>
    /// <param name="most">flow above which no answer is wanted, m³/s</param>
    public double FlowKeepingLowPoint(double leastPressure, double surface, double gasPressure, double most) =>
        gasPressure + surface > leastPressure ? most * NodeCount : 0;
}
