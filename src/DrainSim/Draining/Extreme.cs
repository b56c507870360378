namespace DrainSim.Draining;

/// <summary>The worst value of a quantity over a run, and when.</summary>
/// <param name="Value">the value, in the quantity's unit</param>
/// <param name="Time">when, s since the start</param>
public readonly record struct Extreme(double Value, double Time);
