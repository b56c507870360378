namespace DrainSim.Gas;

/// <summary>A flow of gas between two pressures and how it answers to each of them.</summary>
/// <param name="MassFlow">mass flow from the first side to the second, kg/s; negative the other way</param>
/// <param name="FirstSlope">∂W/∂p1, kg/(s·Pa)</param>
/// <param name="SecondSlope">∂W/∂p2, kg/(s·Pa)</param>
public readonly record struct GasFlow(double MassFlow, double FirstSlope, double SecondSlope);
