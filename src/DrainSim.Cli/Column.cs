namespace DrainSim.Cli;

/// <summary>A column of a <see cref="ColumnTable"/>.</summary>
/// <param name="Title">heading for people</param>
/// <param name="Key">heading in CSV, with the unit in its name</param>
/// <param name="IsNumber">set to the right</param>
/// <param name="IsNarrow">never wrapped</param>
internal sealed record Column(string Title, string Key, bool IsNumber = false, bool IsNarrow = true);
