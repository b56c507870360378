namespace DrainSim.Integration;

/// <summary>What the integrator does at an event; at one instant in the order of these members.</summary>
public enum EventAction
{
    /// <summary>Nothing: the function is switched off and its event not listed.</summary>
    Ignore,

    /// <summary>Lists the event; the steps stay as they would be without it.</summary>
    Record,

    /// <summary>Ends the step at the event, asks <see cref="IEventSet.OnRestart"/> and starts afresh from there.</summary>
    Restart,

    /// <summary>Ends the run at the event.</summary>
    Stop,
}
