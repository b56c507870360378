using DrainSim.Vessels;

namespace DrainSim.Scenarios.Reading;

/// <summary>A tank with the level at the start.</summary>
/// <param name="Vessel">the inside of the tank</param>
/// <param name="Level">level at the start, m</param>
internal sealed record FilledTank(Vessel Vessel, double Level);
