namespace DrainSim.Draining;

/// <summary>How a line works between two restarts.</summary>
/// <param name="IsLimited">whether its flow is held at the threshold of the low point</param>
/// <param name="Ending">how it ended; null while it works</param>
/// <param name="EndedAt">when it ended, s</param>
/// <param name="Segment">segment of its outer leg that the liquid's front is in; −1 once the line runs full</param>
/// <param name="IsResting">whether its head is gone, so that nothing flows until something is done</param>
internal readonly record struct LineMode(bool IsLimited, Outcome? Ending = null, double EndedAt = 0, int Segment = -1, bool IsResting = false)
{
    /// <summary>Whether the liquid's front has yet to reach the outlet.</summary>
    public bool IsFilling => Segment >= 0;

    /// <summary>Whether the line still works.</summary>
    public bool IsAtWork => Ending is null;

    /// <summary>Whether the flow has to be solved for.</summary>
    public bool Flows => IsAtWork && !IsResting;
}
