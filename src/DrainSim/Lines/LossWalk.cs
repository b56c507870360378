namespace DrainSim.Lines;

/// <summary>Walks along a line at one flow and adds up the loss, node by node.</summary>
/// <param name="losses">the line</param>
/// <param name="q">flow of one line, m³/s; at least 0</param>
internal struct LossWalk(LineLosses losses, double q) : ILossWalk
{
    private int wall = -1;
    private double factor;
    private double factorSlope;
    private double loss;
    private double lossRise;

    /// <summary>The node reached; −1 before the first.</summary>
    public int Node { get; private set; } = -1;

    /// <inheritdoc/>
    public double Used { get; private set; }

    /// <inheritdoc/>
    public readonly double Lost => loss;

    /// <summary>q times the derivative of <see cref="Used"/> by q, m.</summary>
    public double UsedRise { get; private set; }

    /// <inheritdoc/>
    public bool MoveNext()
    {
        if (++Node >= losses.Count)
            return false;
        if (q == 0)
            return true;
        ref readonly LossStep step = ref losses.Steps[Node];
        double square = step.Square * q * q;
        double linear = step.Linear * q;
        loss += square + linear;
        lossRise += 2 * square + linear;
        if (step.Wall >= 0)
            AddFriction(step);
        double rise = lossRise;
        Used = loss + losses.VelocityHead(Node, q, ref rise);
        UsedRise = rise;
        return true;
    }

    private void AddFriction(in LossStep step)
    {
        if (step.Wall != wall)
        {
            wall = step.Wall;
            ref readonly PipeWall pipe = ref losses.Walls[wall];
            factor = pipe.Factor(pipe.ReynoldsPerFlow * q, out factorSlope);
        }
        double friction = factor * step.Pipe * q * q;
        loss += friction;
        lossRise += (2 + factorSlope) * friction;
    }
}
