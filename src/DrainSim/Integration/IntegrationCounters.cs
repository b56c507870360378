namespace DrainSim.Integration;

/// <summary>What a run cost.</summary>
/// <param name="Steps">accepted steps</param>
/// <param name="RejectedSteps">steps tried and thrown away, for their error, for leaving the domain or for a kink in them</param>
/// <param name="Restarts">instants at which the run was restarted</param>
/// <param name="DerivativeEvaluations">calls of <see cref="IOdeSystem.Derivative"/></param>
/// <param name="Jacobians">calls of <see cref="IOdeSystem.Jacobian"/>, one for each implicit step</param>
/// <param name="EventEvaluations">calls of <see cref="IEventSet.EventValues"/></param>
public readonly record struct IntegrationCounters(
    int Steps, int RejectedSteps, int Restarts, int DerivativeEvaluations, int Jacobians, int EventEvaluations);
