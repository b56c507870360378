using DrainSim.Draining;

namespace DrainSim.Studies.Uncertainty;

/// <summary>How often the job ended in a certain way.</summary>
/// <param name="Outcome">how it ended</param>
/// <param name="Chance">how often</param>
public sealed record OutcomeChance(Outcome Outcome, Chance Chance);
