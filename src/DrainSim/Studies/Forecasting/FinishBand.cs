namespace DrainSim.Studies.Forecasting;

/// <summary>When the job will be over.</summary>
/// <param name="Best">with the values that fit best, s since the start</param>
/// <param name="Low">lower end of the 95 % interval, s; null where the readings do not bound it</param>
/// <param name="High">upper end, s; null where the readings do not bound it, or where it may never end so</param>
public sealed record FinishBand(double Best, double? Low, double? High);
