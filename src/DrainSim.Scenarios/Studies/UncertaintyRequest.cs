namespace DrainSim.Scenarios.Studies;

/// <summary>What a caller adds to the block <c>uncertainty</c>: the same texts, in the same words.</summary>
public sealed record UncertaintyRequest
{
    /// <summary>Values to set, each <c>PATH=VALUE</c>.</summary>
    public IReadOnlyList<string> Set { get; init; } = [];

    /// <summary>Parameters with their spreads, each <c>PATH=SPREAD</c>; one takes the place of the block's of the same path.</summary>
    public IReadOnlyList<string> Vary { get; init; } = [];

    /// <summary>Rank correlations, each <c>PATH, PATH = COEFFICIENT</c>; they come after those of the block.</summary>
    public IReadOnlyList<string> Correlate { get; init; } = [];

    /// <summary>Number of samples; null for that of the block or the usual one.</summary>
    public string? Samples { get; init; }

    /// <summary>The seed; null for that of the block or 1.</summary>
    public string? Seed { get; init; }

    /// <summary><c>sobol</c> or <c>latin_hypercube</c>; null for that of the block or the first.</summary>
    public string? Sampling { get; init; }
}
