using DrainSim.Lines;

namespace DrainSim.Draining;

/// <summary>A line whose outer leg is not yet full: the column of liquid in it as a rigid body that grows; immutable.</summary>
/// <remarks><code>
/// I(x)·dQ/dt = z_s + (p_s − p_f)/(ρ·g) − z_f(x) − h(0→x, Q) − α·v²/2g        dx/dt = Q/(n·A)
///
/// x    place of the front, along the line from the inlet     z_f  its elevation, m
/// I    Σ L/(g·n·A) of the column, s²/m²                      p_f  pressure ahead of it, Pa
/// h    loss up to the front at that flow, m                  n    number of lines side by side
/// </code>
/// The equation of Bernoulli with its unsteady term from the surface to the front, at one instant: the same sum of losses as
/// in steady flow, and what the head has over goes into speeding the column up. The air ahead leaves freely, against the
/// receiver where that covers the outlet. A column shorter than 0.4 bores counts as one of that length, for the liquid before
/// the inlet moves too (8/(3·π) of the radius for a flanged opening; from memory). Between two nodes behind the front lies a
/// segment; fittings and changes of bore, which have no length, are passed at once.
/// </remarks>
internal sealed class FillingLine
{
    private const double ShortestColumn = 0.4;

    private readonly LineHydraulics hydraulics;
    private readonly int parallel;
    private readonly int[] segments;
    private readonly double[] volumes;
    private readonly double[] inertances;
    private readonly double startVolume;
    private readonly double leastInertance;

    private FillingLine(LineHydraulics hydraulics, int parallel, double gravity, int node, double share)
    {
        (this.hydraulics, this.parallel) = (hydraulics, parallel);
        volumes = new double[hydraulics.NodeCount];
        inertances = new double[hydraulics.NodeCount];
        for (int i = 1; i < hydraulics.NodeCount; i++)
        {
            double area = Math.PI / 4 * hydraulics.Node(i).Bore * hydraulics.Node(i).Bore;
            double length = hydraulics.Node(i).Distance - hydraulics.Node(i - 1).Distance;
            volumes[i] = volumes[i - 1] + length * area;
            inertances[i] = inertances[i - 1] + length / (gravity * area * parallel);
        }

        double bore = hydraulics.Node(0).Bore;
        leastInertance = ShortestColumn * bore / (gravity * Math.PI / 4 * bore * bore * parallel);
        startVolume = volumes[node - 1] + share * (volumes[node] - volumes[node - 1]);
        segments = [.. Enumerable.Range(node, hydraulics.NodeCount - node).Where(i => volumes[i] > Math.Max(volumes[i - 1], startVolume))];
        Volume = parallel * (volumes[^1] - startVolume);
    }

    /// <summary>Volume that fills all parallel lines from the front to the outlet, m³.</summary>
    public double Volume { get; }

    /// <summary>Number of segments that the front has to pass; at least 1.</summary>
    public int SegmentCount => segments.Length;

    /// <summary>The line with its front at an elevation behind the crest.</summary>
    /// <param name="hydraulics">the line</param>
    /// <param name="front">elevation of the front, m; above the crest it stands for the crest</param>
    /// <param name="parallel">number of lines side by side</param>
    /// <param name="gravity">acceleration of gravity, m/s²</param>
    /// <returns>null where the line falls to no such elevation before its outlet, and so is full</returns>
    public static FillingLine? Of(LineHydraulics hydraulics, double front, int parallel, double gravity)
    {
        for (int i = hydraulics.CrestIndex + 1; i < hydraulics.NodeCount; i++)
        {
            (LineNode from, LineNode to) = (hydraulics.Node(i - 1), hydraulics.Node(i));
            if (to.Elevation > front || to.Distance == from.Distance)
                continue;
            double share = from.Elevation <= front ? 0 : (from.Elevation - front) / (from.Elevation - to.Elevation);
            var filling = new FillingLine(hydraulics, parallel, gravity, i, share);
            return filling.SegmentCount > 0 ? filling : null;
        }

        return null;
    }

    /// <summary>How much of the empty part is filled beyond a segment, 1; negative before its end, 0 at it.</summary>
    /// <param name="segment">segment, from 0</param>
    /// <param name="delivered">volume that has left the tank, m³</param>
    public double Beyond(int segment, double delivered) =>
        (startVolume + delivered / parallel - volumes[segments[segment]]) / (volumes[^1] - startVolume);

    /// <summary>Elevation of the front, m.</summary>
    /// <param name="segment">segment that it is in, from 0</param>
    /// <param name="delivered">volume that has left the tank, m³</param>
    public double FrontElevation(int segment, double delivered)
    {
        int node = segments[segment];
        return hydraulics.Node(node - 1).Elevation
            + Share(node, delivered) * (hydraulics.Node(node).Elevation - hydraulics.Node(node - 1).Elevation);
    }

    /// <summary>Head that the liquid's yield stress holds up to the front, m.</summary>
    /// <param name="segment">segment that it is in, from 0</param>
    /// <param name="delivered">volume that has left the tank, m³</param>
    public double YieldHead(int segment, double delivered) =>
        hydraulics.HeadWithin(segments[segment], Share(segments[segment], delivered), 0);

    /// <summary>dQ/dt of all parallel lines, m³/s².</summary>
    /// <param name="segment">segment that the front is in, from 0</param>
    /// <param name="delivered">volume that has left the tank, m³</param>
    /// <param name="flow">flow, m³/s; a trial state may have a negative one</param>
    /// <param name="head">head that drives the column, from the surface to its front, m</param>
    public double Acceleration(int segment, double delivered, double flow, double head)
    {
        int node = segments[segment];
        double share = Share(node, delivered), used = hydraulics.HeadWithin(node, share, Math.Abs(flow));
        double inertance = inertances[node - 1] + share * (inertances[node] - inertances[node - 1]);
        return (head - (flow < 0 ? -used : used)) / Math.Max(inertance, leastInertance);
    }

    /// <summary>Least pressure in the column, Pa absolute.</summary>
    /// <param name="segment">segment that the front is in, from 0</param>
    /// <param name="flow">flow, m³/s; at least 0</param>
    /// <param name="acceleration">dQ/dt, m³/s²</param>
    /// <param name="surface">level in the tank, m</param>
    /// <param name="gas">pressure of the gas over it, Pa absolute</param>
    public double LowPointPressure(int segment, double flow, double acceleration, double surface, double gas) =>
        hydraulics.LowPointPressure(flow, acceleration, inertances.AsSpan(0, segments[segment]), surface, gas);

    private double Share(int node, double delivered) =>
        (startVolume + delivered / parallel - volumes[node - 1]) / (volumes[node] - volumes[node - 1]);
}
