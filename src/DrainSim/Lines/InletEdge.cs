namespace DrainSim.Lines;

/// <summary>A row of the table of inlet edges.</summary>
public sealed record InletEdge
{
    /// <summary>Name in a scenario.</summary>
    public required string Id { get; init; }

    /// <summary>What it is, for people.</summary>
    public required string Description { get; init; }

    /// <summary>Loss coefficient on the velocity head in the line's first bore, 1; the same at every Re.</summary>
    public required double Loss { get; init => field = Require.NotNegative(value, "inlet loss", ""); }

    /// <summary>Where the coefficient is from.</summary>
    public required string Source { get; init; }
}
