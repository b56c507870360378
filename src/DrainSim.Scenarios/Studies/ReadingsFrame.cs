namespace DrainSim.Scenarios.Studies;

/// <summary>What readings are measured from.</summary>
/// <param name="Height">inside height of the tank, m</param>
/// <param name="GaugePoint">elevation of the point that ullages are measured from, m</param>
/// <param name="Resolution">smallest step of the instrument where the file does not say it, m</param>
/// <param name="Begins">the clock at the start of the job; null where it is not known</param>
internal sealed record ReadingsFrame(double Height, double GaugePoint, double Resolution, DateTimeOffset? Begins);
