namespace DrainSim.Gas;

/// <summary>The air that a headspace breathes.</summary>
/// <param name="Pressure">atmospheric pressure, Pa absolute; greater than 0</param>
/// <param name="Temperature">temperature of the air and of the gas in the headspace, K; greater than 0</param>
public readonly record struct Surroundings(double Pressure, double Temperature);
