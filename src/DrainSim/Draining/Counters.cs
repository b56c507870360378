namespace DrainSim.Draining;

/// <summary>What a run cost; the samples of a report are not in it.</summary>
/// <param name="Steps">accepted steps</param>
/// <param name="Rejected">steps tried and thrown away</param>
/// <param name="Derivatives">evaluations of the balance</param>
/// <param name="FlowSolutions">solutions of the line for its flow</param>
/// <param name="EventEvaluations">evaluations of the event functions</param>
public readonly record struct Counters(
    long Steps, long Rejected, long Derivatives, long FlowSolutions, long EventEvaluations);
