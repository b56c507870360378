namespace DrainSim.Scenarios.Studies;

/// <summary>What a caller adds to the block of a study in the scenario: the same texts, in the same words.</summary>
public sealed record StudyRequest
{
    /// <summary>Values to set, each <c>PATH=VALUE</c>; they come after those of the block.</summary>
    public IReadOnlyList<string> Set { get; init; } = [];

    /// <summary>Parameters to vary, each <c>PATH=VALUES</c>; one takes the place of the block's of the same path.</summary>
    public IReadOnlyList<string> Vary { get; init; } = [];

    /// <summary>A CSV file whose rows are the cases; null for that of the block, if it has one.</summary>
    public string? Cases { get; init; }

    /// <summary>The parameter to size; null for that of the block.</summary>
    public string? Parameter { get; init; }

    /// <summary>The range to size it within, <c>20 mm..80 mm</c>; null for that of the block, if it has one.</summary>
    public string? Between { get; init; }

    /// <summary>What sizing is to reach, <c>drain_time = 4 h</c>; null for that of the block.</summary>
    public string? Target { get; init; }
}
