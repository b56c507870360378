namespace DrainSim.Lines.Inlets;

/// <summary>The published forms that apply to one inlet, and the band that they span.</summary>
/// <remarks>
/// The forms answer different questions and differ by a factor of two and more; all but hi_9_8 have coefficients from
/// memory. The band is what can honestly be said: low confidence. It rises with the velocity.
/// </remarks>
public sealed class CriticalSubmergence
{
    private readonly SubmergenceFormula[] design;
    private readonly SubmergenceFormula? pullThrough;
    private readonly double datumShare;

    /// <summary>Picks the forms.</summary>
    /// <param name="facing">which way the inlet looks</param>
    /// <param name="hasSuppressor">whether a cross, a floating raft or the like hinders the vortex</param>
    public CriticalSubmergence(InletFacing facing, bool hasSuppressor = false)
    {
        SubmergenceFormula[] fitting =
            [.. SubmergenceTable.All.Where(row => (row.Facing ?? facing) == facing && (hasSuppressor || !row.NeedsSuppressor))];
        design = [.. fitting.Where(row => !row.IsPullThrough)];
        pullThrough = fitting.FirstOrDefault(row => row.IsPullThrough);
        // Only a side inlet is spread over a height; elsewhere every datum is the plane of the rim.
        datumShare = facing == InletFacing.Side ? 1 : 0;
    }

    /// <summary>The design forms that span the band.</summary>
    public IReadOnlyList<SubmergenceFormula> Design => design;

    /// <summary>The form of the pull-through depth; null where none is known, as for an inlet that looks down.</summary>
    public SubmergenceFormula? PullThrough => pullThrough;

    /// <summary>The band at a velocity.</summary>
    /// <param name="velocity">velocity in the inlet, m/s; at least 0</param>
    /// <param name="diameter">diameter of the inlet, m; greater than 0</param>
    /// <param name="gravity">acceleration of gravity, m/s²; greater than 0</param>
    public SubmergenceBand At(double velocity, double diameter, double gravity)
    {
        double least = double.PositiveInfinity;
        double most = 0;
        foreach (SubmergenceFormula formula in design)
        {
            double height = Height(formula, velocity, diameter, gravity);
            least = Math.Min(least, height);
            most = Math.Max(most, height);
        }
        return new SubmergenceBand(least, most,
            pullThrough is null ? null : Height(pullThrough, velocity, diameter, gravity));
    }

    private double Height(SubmergenceFormula formula, double velocity, double diameter, double gravity) =>
        formula.Depth(velocity, diameter, gravity) + datumShare * formula.SideDatum * diameter;
}
