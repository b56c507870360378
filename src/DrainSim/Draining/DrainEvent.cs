namespace DrainSim.Draining;

/// <summary>A moment of a run that is worth knowing.</summary>
/// <param name="Time">since the start, s</param>
/// <param name="Code">what happened</param>
/// <param name="Level">level in the tank, m</param>
/// <param name="Volume">volume in the tank, m³</param>
/// <param name="Number">the number that belongs to the code, 0 where it has none</param>
/// <param name="Line">index of the line that it happened to; 0 for what concerns the tank</param>
public readonly record struct DrainEvent(
    double Time, EventCode Code, double Level, double Volume, double Number, int Line = 0);
