namespace DrainSim.Lines.Inlets;

/// <summary>A round opening in the wall; the depth counts from its invert.</summary>
/// <remarks>Critical depth in the bore, see <see cref="CriticalFlow"/>, let go 1.2 to 1.5 bores above the invert.</remarks>
public sealed record SideOpening : PartFullInlet
{
    /// <summary>Loss coefficient of the entry edge on the velocity head at the control, 1; at least 0.</summary>
    public double EdgeLoss { get; init => field = Require.NotNegative(value, "inlet loss", ""); } = 0.5;

    /// <inheritdoc/>
    public override double Limit(double depth, double gravity, out double slope)
    {
        double flow = CriticalFlow.UnderHead(depth, Bore, EdgeLoss, gravity, out slope);
        return Release(flow, depth - Bore, ref slope);
    }
}
