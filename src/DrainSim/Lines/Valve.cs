namespace DrainSim.Lines;

/// <summary>A valve at an opening; by its table row, or by its measured flow coefficient.</summary>
/// <remarks>
/// <code>K = (K1/Re + K_open)/φ(opening)²</code>
/// with K1 of its kind also where Kv is given. That the laminar rise grows with 1/φ² like the rest is a rule of
/// ours; the two-K rows for a port of 0.8 bores rise a little faster.
/// </remarks>
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

    /// <summary>
    /// What throttling multiplies the open valve's loss with, 1/φ² of <see cref="ValveCharacteristic"/>, 1;
    /// infinite when the valve is shut.
    /// </summary>
    public double Throttling
    {
        get
        {
            double capacity = Kind.Characteristic.RelativeCapacity(Opening);
            return 1 / (capacity * capacity);
        }
    }

    /// <summary>Turbulent loss coefficient when fully open, 1; from Kv where it is given.</summary>
    /// <param name="bore">inside diameter, m; greater than 0</param>
    public double OpenLoss(double bore) =>
        FlowCoefficient is { } kv ? Lines.FlowCoefficient.Loss(kv, bore) : Kind.Loss.Turbulent(bore);
}
