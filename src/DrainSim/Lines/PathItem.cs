namespace DrainSim.Lines;

/// <summary>One thing on the way from the inlet to the outlet.</summary>
/// <remarks>A closed set: the cases live beside this file.</remarks>
public abstract record PathItem
{
    private protected PathItem()
    {
    }

    /// <summary>Name by which a parameter path finds the item; null when it has none.</summary>
    public string? Name { get; init; }

    /// <summary>Bore from here on, m; null when it stays as it was.</summary>
    public double? Bore { get; init => field = value is { } bore ? Require.Positive(bore, "bore", "m") : null; }
}
