using DrainSim.Draining;

namespace DrainSim.Scenarios.Studies;

/// <summary>One case of a study: a job, or why there is none.</summary>
/// <param name="Job">the job; null when the values make it impossible</param>
/// <param name="Cause">why it is impossible, one line for people; empty when it is not</param>
public readonly record struct CaseReading(Job? Job, string Cause);
