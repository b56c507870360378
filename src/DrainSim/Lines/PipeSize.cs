namespace DrainSim.Lines;

/// <summary>A row of the table of nominal sizes.</summary>
public sealed record PipeSize
{
    /// <summary>Name of the row.</summary>
    public required string Id { get; init; }

    /// <summary>What kind of line it is, for people.</summary>
    public required string Kind { get; init; }

    /// <summary>Standard that gives the size.</summary>
    public required string Standard { get; init; }

    /// <summary>Nominal size as printed, such as DN50.</summary>
    public required string Nominal { get; init; }

    /// <summary>Nominal size in inches as printed, such as 2 in; null where it has none.</summary>
    public string? NominalInches { get; init; }

    /// <summary>Wall schedule; null for a hose.</summary>
    public string? Schedule { get; init; }

    /// <summary>Outside diameter, m; null for a hose.</summary>
    public double? OutsideDiameter { get; init; }

    /// <summary>Wall thickness, m; null for a hose.</summary>
    public double? Wall { get; init; }

    /// <summary>Inside diameter, m; greater than 0.</summary>
    public required double Bore { get; init => field = Require.Positive(value, "bore", "m"); }

    /// <summary>Where the size is from.</summary>
    public required string Source { get; init; }
}
