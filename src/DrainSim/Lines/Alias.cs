namespace DrainSim.Lines;

/// <summary>A trade word that stands for a row of a table.</summary>
/// <param name="Name">the word in a scenario</param>
/// <param name="Target">the row that it stands for</param>
/// <param name="Reason">why that row</param>
public sealed record Alias(string Name, string Target, string Reason);
