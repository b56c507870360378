using DrainSim.Studies.Forecasting;

namespace DrainSim.Scenarios.Studies;

/// <summary>A forecast of a scenario, ready to run.</summary>
/// <param name="Scenario">the scenario and its fitted parameters</param>
/// <param name="Study">the study</param>
/// <param name="Clock">the clock at the start of the job; null where neither the scenario nor the readings know it</param>
/// <param name="ReadingsFile">full path of the readings</param>
public sealed record ForecastCase(VariedScenario Scenario, ForecastStudy Study, StartClock? Clock, string ReadingsFile);
