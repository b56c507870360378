using DrainSim.Studies.Forecasting;

namespace DrainSim.Scenarios.Studies;

/// <summary>The readings of a file.</summary>
/// <param name="Readings">in time order</param>
/// <param name="Clock">the clock at the start of the job; null where it is not known</param>
internal sealed record ReadingsSheet(IReadOnlyList<LevelReading> Readings, StartClock? Clock);
