namespace DrainSim.Lines;

/// <summary>A valve at an opening; by its table row, or by its measured flow coefficient.</summary>
public sealed record Valve : PathItem
{
    /// <summary>The kind of valve, with its opening characteristic.</summary>
    public required ValveKind Kind { get; init; }

    /// <summary>Opening, 1; 0 shut, 1 fully open.</summary>
    public double Opening { get; init => field = Require.Within(value, 0, 1, "valve opening", ""); } = 1;

    /// <summary>
    /// Flow coefficient Kv when fully open, m³/h at 1 bar and 1000 kg/m³; null when the table row stands.
    /// </summary>
    public double? FlowCoefficient
    {
        get;
        init => field = value is { } kv ? Require.Positive(kv, "flow coefficient Kv", "m3/h") : null;
    }
}
