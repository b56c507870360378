namespace DrainSim.Scenarios.Studies;

/// <summary>What a caller adds to the block <c>forecast</c>: the same texts, in the same words.</summary>
public sealed record ForecastRequest
{
    /// <summary>Values to set, each <c>PATH=VALUE</c>.</summary>
    public IReadOnlyList<string> Set { get; init; } = [];

    /// <summary>The CSV file with the readings; null for that of the block.</summary>
    public string? Readings { get; init; }

    /// <summary>Paths of the parameters to fit; empty for those of the block.</summary>
    public IReadOnlyList<string> Fit { get; init; } = [];

    /// <summary>Smallest step of the instrument; null for that of the block or 5 mm.</summary>
    public string? Resolution { get; init; }

    /// <summary>Elevation of the point that ullages are measured from; null for that of the block or the tank's top.</summary>
    public string? GaugePoint { get; init; }

    /// <summary>The seed of the band; null for that of the block or 1.</summary>
    public string? Seed { get; init; }
}
