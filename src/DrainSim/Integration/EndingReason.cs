namespace DrainSim.Integration;

/// <summary>Why an integration ended.</summary>
public enum EndingReason
{
    /// <summary>The end of the interval was reached.</summary>
    ReachedEnd,

    /// <summary>An event ended the run: its action was to stop, or its restart was declined.</summary>
    Stopped,

    /// <summary>The tolerance or the system asked for a step that no longer moves the time.</summary>
    StepTooSmall,

    /// <summary>The limit of tried steps was reached.</summary>
    TooManySteps,

    /// <summary>The derivative at the first instant or at a restart was not finite.</summary>
    OutsideDomain,

    /// <summary>The caller cancelled.</summary>
    Cancelled,
}
