namespace DrainSim.Draining;

/// <summary>A warning of a run.</summary>
/// <param name="Code">what it is about</param>
/// <param name="Number">the number that belongs to it</param>
public readonly record struct RunWarning(WarningCode Code, double Number);
