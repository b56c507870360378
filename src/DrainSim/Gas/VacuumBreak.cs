namespace DrainSim.Gas;

/// <summary>A valve that lets air in when the headspace stands below the atmosphere.</summary>
public sealed record VacuumBreak : PressureValve
{
    /// <inheritdoc/>
    public override double MassFlow(double pressure, in Surroundings outside, out double slope) =>
        ValveFlow(pressure, outside, outside.Pressure - pressure, -1, out slope);
}
