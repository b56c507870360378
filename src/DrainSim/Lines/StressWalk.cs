namespace DrainSim.Lines;

/// <summary>Walks along a line of a liquid that is not Newtonian at one flow and adds up the loss, node by node.</summary>
/// <param name="losses">the line</param>
/// <param name="q">flow of one line, m³/s; at 0 the liquid stands at the point of moving</param>
internal struct StressWalk(StressLosses losses, double q) : ILossWalk
{
    private int wall = -1;
    private int bore = -1;
    private double wallSquare, wallRise;
    private double boreSquare, boreRise;
    private double loss, lossRise;

    /// <summary>The node reached; −1 before the first.</summary>
    public int Node { get; private set; } = -1;

    /// <summary>Head used up to the node above what the yield stress holds, its velocity head included, m.</summary>
    public double Excess { get; private set; }

    /// <summary>q times the derivative of <see cref="Excess"/> by q, m.</summary>
    public double ExcessRise { get; private set; }

    /// <inheritdoc/>
    public readonly double Used => Excess + losses.Steps[Node].YieldToHere;

    /// <inheritdoc/>
    public readonly double Lost => loss + losses.Steps[Node].YieldToHere;

    /// <inheritdoc/>
    public bool MoveNext()
    {
        if (++Node >= losses.Count)
            return false;
        if (q == 0)
            return true;
        ref readonly StressStep step = ref losses.Steps[Node];
        double square = step.Square * q * q;
        loss += square;
        lossRise += 2 * square;
        if (step.Laminar > 0)
            AddLaminar(step);
        if (step.Wall >= 0)
            AddFriction(step);
        double alpha = losses.Bores[step.Bore].KineticFactor(q, out double slope);
        double head = step.Jet * q * q;
        Excess = loss + alpha * head;
        ExcessRise = lossRise + (2 * alpha + slope) * head;
        return true;
    }

    private void AddLaminar(in StressStep step)
    {
        if (step.Bore != bore)
        {
            bore = step.Bore;
            BoreStress stress = losses.Bores[bore];
            boreSquare = stress.SquarePerStress * stress.Excess(q, out double slope);
            boreRise = slope * boreSquare;
        }

        loss += step.Laminar * boreSquare / FrictionFactor.LaminarProduct;
        lossRise += step.Laminar * boreRise / FrictionFactor.LaminarProduct;
    }

    private void AddFriction(in StressStep step)
    {
        if (step.Wall != wall)
        {
            wall = step.Wall;
            wallSquare = losses.Walls[wall].Square(q, out wallRise);
        }

        loss += step.Pipe * wallSquare;
        lossRise += step.Pipe * wallRise;
    }
}
