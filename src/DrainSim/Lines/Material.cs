namespace DrainSim.Lines;

/// <summary>A row of the table of materials.</summary>
public sealed record Material
{
    /// <summary>Name in a scenario.</summary>
    public required string Id { get; init; }

    /// <summary>What it is, for people.</summary>
    public required string Description { get; init; }

    /// <summary>Equivalent sand-grain roughness to reckon with, m; at least 0.</summary>
    public required double Roughness { get; init => field = Require.NotNegative(value, "roughness", "m"); }

    /// <summary>Least roughness in the source, m; null where it gives no range.</summary>
    public double? LeastRoughness { get; init; }

    /// <summary>Greatest roughness in the source, m; null where it gives no range.</summary>
    public double? MostRoughness { get; init; }

    /// <summary>Where the roughness is from.</summary>
    public required string Source { get; init; }
}
