using System.Diagnostics.CodeAnalysis;

namespace DrainSim.Scenarios;

/// <summary>What the reading of a file gives: a scenario, or the problems for which it is refused.</summary>
public sealed record ScenarioReading
{
    /// <summary>The file as the user named it.</summary>
    public required string FileName { get; init; }

    /// <summary>The scenario; null when it is refused.</summary>
    public Scenario? Scenario { get; init; }

    /// <summary>Why it is refused, in file order; at most the first hundred.</summary>
    public IReadOnlyList<Problem> Problems { get; init; } = [];

    /// <summary>How many more problems there are than <see cref="Problems"/> holds.</summary>
    public int Untold { get; init; }

    /// <summary>What is suspicious, in file order; also for a refused scenario.</summary>
    public IReadOnlyList<Problem> Warnings { get; init; } = [];

    /// <summary>Everything that was understood, also of a refused scenario.</summary>
    internal IReadOnlyList<UnderstoodValue> Understood { get; init; } = [];

    /// <summary>Whether there is no scenario.</summary>
    [MemberNotNullWhen(false, nameof(Scenario))]
    public bool IsRefused => Scenario is null;
}
