namespace DrainSim.Gas;

/// <summary>A valve that lets gas out when the headspace stands above the atmosphere.</summary>
public sealed record ReliefValve : PressureValve
{
    /// <inheritdoc/>
    public override double MassFlow(double pressure, in Surroundings outside, out double slope) =>
        ValveFlow(pressure, outside, pressure - outside.Pressure, 1, out slope);
}
