namespace DrainSim.Gas;

/// <summary>A headspace that a supply keeps at one pressure.</summary>
public sealed record HeldPressure : Headspace
{
    /// <summary>Pressure above the atmosphere, Pa; at least 0.</summary>
    public required double Overpressure { get; init => field = Require.NotNegative(value, "overpressure", "Pa"); }
}
