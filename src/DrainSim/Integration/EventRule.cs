namespace DrainSim.Integration;

/// <summary>Which change of sign of an event function fires, and what follows.</summary>
/// <param name="Direction">the change of sign that counts</param>
/// <param name="Action">what the integrator does at the event</param>
public readonly record struct EventRule(EventDirection Direction, EventAction Action)
{
    /// <summary>Whether a crossing in the given direction fires.</summary>
    internal bool Fires(EventDirection crossing) =>
        Action != EventAction.Ignore && (Direction == EventDirection.Either || Direction == crossing);
}
