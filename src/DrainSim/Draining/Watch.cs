namespace DrainSim.Draining;

/// <summary>One event function of the balance.</summary>
/// <param name="Kind">what it watches</param>
/// <param name="Line">index of the line that it belongs to; 0 for those of the tank</param>
/// <param name="Ordinal">which of several of its kind, 0 where there is one</param>
/// <param name="Value">the volume, m³, or time, s, that it watches for; 0 where it needs none</param>
internal readonly record struct Watch(WatchKind Kind, int Line = 0, int Ordinal = 0, double Value = 0);
