namespace DrainSim.Studies.Uncertainty;

/// <summary>The value that a share of the runs does not pass.</summary>
/// <param name="Share">the share, 1</param>
/// <param name="Value">the value in SI; positive infinity where so many runs never come to an end</param>
/// <param name="Error">half the width of the 95 % interval of <paramref name="Value"/> over other seeds; null where it cannot be told</param>
public readonly record struct Percentile(double Share, double Value, double? Error);
