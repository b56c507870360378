namespace DrainSim.Lines;

/// <summary>A bend, elbow, tee or other fitting from the table.</summary>
public sealed record Fitting : PathItem
{
    /// <summary>What it is.</summary>
    public required FittingKind Kind { get; init; }

    /// <summary>How many of them stand in a row; at least 1.</summary>
    public int Count
    {
        get;
        init => field = value >= 1
            ? value
            : throw new ArgumentOutOfRangeException(null, $"fitting count must be at least 1, got {value}");
    } = 1;
}
