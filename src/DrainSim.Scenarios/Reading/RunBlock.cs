using DrainSim.Draining;

namespace DrainSim.Scenarios.Reading;

/// <summary>What the block <c>run</c> says.</summary>
/// <param name="Settings">when the run ends</param>
/// <param name="Units">units for people; null where the file does not say</param>
/// <param name="Begins">the clock at the start; null where the file does not say</param>
internal sealed record RunBlock(RunSettings Settings, ResultUnits? Units, DateTimeOffset? Begins);
