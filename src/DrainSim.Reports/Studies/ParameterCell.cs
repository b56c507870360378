namespace DrainSim.Reports.Studies;

/// <summary>The value of a varied parameter in a table.</summary>
/// <param name="Number">value in SI; NaN for a word</param>
/// <param name="Word">the word, such as a material; null for a number</param>
public readonly record struct ParameterCell(double Number, string? Word);
