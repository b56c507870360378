namespace DrainSim.Lines;

/// <summary>A loss that is the same at every Reynolds number.</summary>
public sealed record PlainLoss : PathItem
{
    /// <summary>Loss coefficient K on the local velocity head, 1; at least 0.</summary>
    public required double Coefficient { get; init => field = Require.NotNegative(value, "loss coefficient", ""); }
}
