using DrainSim.Studies.Uncertainty;

namespace DrainSim.Scenarios.Studies;

/// <summary>An uncertainty study of a scenario, ready to run.</summary>
/// <param name="Scenario">the scenario and its parameters</param>
/// <param name="Study">the study</param>
public sealed record UncertaintyCase(VariedScenario Scenario, UncertaintyStudy Study);
