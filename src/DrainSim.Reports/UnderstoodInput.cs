namespace DrainSim.Reports;

/// <summary>One value of a scenario as it was understood; a number or a text.</summary>
public sealed record UnderstoodInput
{
    /// <summary>Dotted path of the key, for example <c>line.path.outer_leg.length</c>.</summary>
    public required string Path { get; init; }

    /// <summary>The value in <see cref="Unit"/>; null where it is a text.</summary>
    public double? Number { get; init; }

    /// <summary>SI unit of <see cref="Number"/>, "1" for a pure number; null where the value is a text.</summary>
    public string? Unit { get; init; }

    /// <summary>The value where it is no number; null otherwise.</summary>
    public string? Text { get; init; }

    /// <summary>The value as the scenario writes it; null where the scenario is silent.</summary>
    public string? AsWritten { get; init; }

    /// <summary>Whether the scenario is silent and a default stands.</summary>
    public bool IsDefault { get; init; }
}
