namespace DrainSim.Scenarios;

/// <summary>One value of a scenario as it was understood.</summary>
/// <param name="Path">dotted path of the parameter</param>
/// <param name="Value">value in SI; null for a word or a text</param>
/// <param name="Unit">SI unit of the value, <c>1</c> for a ratio or a count; null for a word or a text</param>
/// <param name="Written">as it stands in the file, or the default as it would be written</param>
/// <param name="IsDefault">whether the file does not say it</param>
public sealed record UnderstoodValue(string Path, double? Value, string? Unit, string Written, bool IsDefault);
