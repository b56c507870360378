namespace DrainSim.Scenarios;

/// <summary>What a problem does to the run.</summary>
public enum Severity
{
    /// <summary>The scenario is refused.</summary>
    Refusal,

    /// <summary>The scenario runs, and the warning is told with the result.</summary>
    Warning,
}
