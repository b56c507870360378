namespace DrainSim.Draining;

/// <summary>Whether a run kept a bound.</summary>
/// <param name="Kind">which bound</param>
/// <param name="Bound">the bound, in its SI unit</param>
/// <param name="Worst">the worst value of the run and when</param>
/// <param name="IsKept">whether the bound was kept; a drain time counts only when the job was done</param>
public sealed record LimitCheck(LimitKind Kind, double Bound, Extreme Worst, bool IsKept);
