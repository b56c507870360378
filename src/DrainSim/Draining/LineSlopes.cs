namespace DrainSim.Draining;

/// <summary>How a line's flow answers to what it depends on.</summary>
/// <param name="BySurface">∂Q/∂(level in the tank), m²/s</param>
/// <param name="ByGas">∂Q/∂(pressure of the gas over it), m³/(s·Pa)</param>
/// <param name="ByDelivered">∂Q/∂(volume that the line has delivered), 1/s</param>
internal readonly record struct LineSlopes(double BySurface, double ByGas, double ByDelivered);
