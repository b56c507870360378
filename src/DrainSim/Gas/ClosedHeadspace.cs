namespace DrainSim.Gas;

/// <summary>A headspace that no gas enters or leaves.</summary>
public sealed record ClosedHeadspace : ConfinedHeadspace;
