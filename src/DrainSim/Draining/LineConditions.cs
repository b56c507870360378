namespace DrainSim.Draining;

/// <summary>What a line's flow depends on at one instant.</summary>
/// <param name="Surface">level in the tank, m</param>
/// <param name="Gas">pressure of the gas over it, Pa absolute</param>
/// <param name="Delivered">volume that the line has delivered, m³</param>
/// <param name="IsLimited">whether the flow is held at the threshold of the low point</param>
internal readonly record struct LineConditions(double Surface, double Gas, double Delivered, bool IsLimited);
