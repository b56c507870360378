namespace DrainSim.Studies.Forecasting;

/// <summary>A number of a job that the readings are to tell.</summary>
/// <param name="Path">its dotted path, or any name that tells it apart</param>
/// <param name="Unit">SI unit of its values; empty for a pure number</param>
/// <param name="Start">where the search begins, in that unit: what the scenario says</param>
public sealed record FittedParameter(string Path, string Unit, double Start);
