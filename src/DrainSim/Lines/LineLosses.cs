namespace DrainSim.Lines;

/// <summary>Head used up along one line, as flat arrays over its nodes.</summary>
/// <remarks><code>
/// h(0→k) = Σ f·P·q² + S·q² + B·q        P = (L/D)/(2·g·A²),  S = K∞/(2·g·A²),  B = K1·q/(Re·2·g·A²)
/// used(k) = h(0→k) + α·J·q²             J = 1/(2·g·A²) of the node's own bore
/// </code>
/// q is the flow of one line. Runs of one bore and roughness share their friction factor, so that cutting a run in
/// two neither costs nor changes anything.
/// </remarks>
internal sealed class LineLosses
{
    /// <summary>One entry per distinct bore and roughness.</summary>
    public required PipeWall[] Walls { get; init; }

    /// <summary>What lies between the node before and each node.</summary>
    public required LossStep[] Steps { get; init; }

    /// <summary>P of the whole line for each wall, s²/m⁵.</summary>
    public required double[] TotalPipe { get; init; }

    /// <summary>Flows of one line at which a bore passes a regime limit, m³/s, rising.</summary>
    public required double[] Kinks { get; init; }

    /// <summary>Number of nodes.</summary>
    public int Count => Steps.Length;

    /// <summary>Head used up to a node, its velocity head included, m, and d ln(used)/d ln q times it.</summary>
    /// <param name="node">node</param>
    /// <param name="q">flow of one line, m³/s; greater than 0</param>
    /// <param name="rise">q times the derivative by q, m</param>
    public double Used(int node, double q, out double rise)
    {
        if (node < Count - 1)
        {
            var walk = new LossWalk(this, q);
            while (walk.Node < node)
                walk.MoveNext();
            rise = walk.UsedRise;
            return walk.Used;
        }
        ref readonly LossStep last = ref Steps[node];
        double square = last.SquareToHere * q * q;
        double linear = last.LinearToHere * q;
        double used = square + linear;
        rise = 2 * square + linear;
        for (int i = 0; i < Walls.Length; i++)
        {
            double f = Walls[i].Factor(Walls[i].ReynoldsPerFlow * q, out double slope);
            double loss = f * TotalPipe[i] * q * q;
            used += loss;
            rise += (2 + slope) * loss;
        }
        return used + VelocityHead(node, q, ref rise);
    }

    /// <summary>Velocity head α·v²/2g in a node's bore, m.</summary>
    /// <param name="node">node</param>
    /// <param name="q">flow of one line, m³/s</param>
    /// <param name="rise">has q times the derivative by q added, m</param>
    public double VelocityHead(int node, double q, ref double rise)
    {
        ref readonly LossStep step = ref Steps[node];
        double alpha = KineticFactor.At(step.ReynoldsPerFlow * q, out double slope);
        double head = step.Jet * q * q;
        rise += (2 * alpha + slope) * head;
        return alpha * head;
    }
}
