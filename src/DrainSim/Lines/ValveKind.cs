namespace DrainSim.Lines;

/// <summary>A kind of valve: its loss when open and how it throttles.</summary>
public sealed record ValveKind
{
    /// <summary>Name in a scenario.</summary>
    public required string Id { get; init; }

    /// <summary>What it is, for people.</summary>
    public required string Description { get; init; }

    /// <summary>Its loss coefficient when fully open.</summary>
    public required LossLaw Loss { get; init; }

    /// <summary>How much it passes when partly open.</summary>
    public required ValveCharacteristic Characteristic { get; init; }

    /// <summary>Where its coefficients are from.</summary>
    public required string Source { get; init; }
}
