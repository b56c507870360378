namespace DrainSim.Lines;

/// <summary>A row of the table of fittings.</summary>
public sealed record FittingKind
{
    /// <summary>Name in a scenario.</summary>
    public required string Id { get; init; }

    /// <summary>What it is, for people.</summary>
    public required string Description { get; init; }

    /// <summary>Its loss coefficient.</summary>
    public required LossLaw Loss { get; init; }

    /// <summary>Where its coefficients are from.</summary>
    public required string Source { get; init; }
}
