using DrainSim.Draining;

namespace DrainSim.Studies.Uncertainty;

/// <summary>How often a bound of the job was kept.</summary>
/// <param name="Kind">which bound</param>
/// <param name="Bound">the bound, in its SI unit</param>
/// <param name="Kept">how often it was kept</param>
public sealed record LimitChance(LimitKind Kind, double Bound, Chance Kept);
