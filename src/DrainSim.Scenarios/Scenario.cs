using DrainSim.Draining;

namespace DrainSim.Scenarios;

/// <summary>A scenario that was read without a refusal.</summary>
public sealed record Scenario
{
    /// <summary>Name of the scenario and of its output files: the file's name without its ending.</summary>
    public required string Name { get; init; }

    /// <summary>Title for people; the name where the file gives none.</summary>
    public required string Title { get; init; }

    /// <summary>Free text of the author; null where there is none.</summary>
    public string? Notes { get; init; }

    /// <summary>The job itself.</summary>
    public required Job Job { get; init; }

    /// <summary>The units for people; null where the file does not say.</summary>
    public ResultUnits? Units { get; init; }

    /// <summary>The clock at the start, with its zone; null where the file does not say.</summary>
    public DateTimeOffset? Begins { get; init; }

    /// <summary>Everything that was understood, defaults included, in the order of the vocabulary.</summary>
    public required IReadOnlyList<UnderstoodValue> Understood { get; init; }

    /// <summary>What is suspicious, in file order.</summary>
    public IReadOnlyList<Problem> Warnings { get; init; } = [];
}
