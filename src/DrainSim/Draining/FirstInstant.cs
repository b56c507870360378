namespace DrainSim.Draining;

/// <summary>A job at its first instant.</summary>
/// <param name="Instant">the state; no flow where the line does not start</param>
/// <param name="NoStart">why the line does not start; null when it does</param>
/// <param name="Prime">what a siphon needs before it runs; null for a line that never rises above its inlet</param>
public sealed record FirstInstant(Instant Instant, NoStart? NoStart, PrimeReport? Prime);
