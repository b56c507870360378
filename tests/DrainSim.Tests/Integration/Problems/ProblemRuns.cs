using DrainSim.Integration;

namespace DrainSim.Tests.Integration.Problems;

/// <summary>What tests do with a problem: add an event, solve.</summary>
public static class ProblemRuns
{
    public static T When<T>(this T problem, EventFunction value, EventAction action,
        EventDirection direction = EventDirection.Either) where T : Problem
    {
        problem.Add(value, new EventRule(direction, action));
        return problem;
    }

    public static (IntegrationResult Result, Trajectory Trajectory) Solve<T>(this T problem, double end,
        double tolerance = 1e-8, double? firstStep = null, int samples = 4, int maximumSteps = 100_000,
        double start = 0) where T : Problem
    {
        IntegrationOptions options = new()
        {
            RelativeTolerance = tolerance,
            FirstStep = firstStep,
            EventSamplesPerStep = samples,
            MaximumSteps = maximumSteps,
        };
        Trajectory trajectory = new(problem.Dimension);
        IntegrationResult result = new Integrator<T>(problem).Run(start, problem.InitialState, end, options, trajectory,
            TestContext.Current.CancellationToken);
        return (result, trajectory);
    }
}
