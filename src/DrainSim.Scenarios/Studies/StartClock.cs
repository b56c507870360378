namespace DrainSim.Scenarios.Studies;

/// <summary>The clock at the start of a job.</summary>
/// <param name="Time">the time; its date means nothing where none is known</param>
/// <param name="HasDate">whether the date is known</param>
public sealed record StartClock(DateTimeOffset Time, bool HasDate);
