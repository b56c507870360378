namespace DrainSim.Integration;

/// <summary>Which change of sign of an event function fires, and what follows.</summary>
/// <param name="Direction">the change of sign that counts</param>
/// <param name="Action">what the integrator does at the event</param>
/// <param name="IsKink">whether the derivative has a jump, a kink or a clamp at the event, so that a step that looked beyond it is
/// repeated up to it; of no meaning where the event is but recorded</param>
public readonly record struct EventRule(EventDirection Direction, EventAction Action, bool IsKink = false)
{
    /// <summary>Whether a crossing in the given direction fires.</summary>
    internal bool Fires(EventDirection crossing) =>
        Action != EventAction.Ignore && (Direction == EventDirection.Either || Direction == crossing);
}
