using DrainSim.Integration;
using DrainSim.Tests.Integration.Problems;

namespace DrainSim.Tests.Integration;

/// <summary>A derivative whose slope jumps, with and without its place declared as a restart.</summary>
public sealed class KinkTests
{
    [Fact]
    public void A_declared_kink_costs_no_accuracy()
    {
        Kinked problem = Kinked.Declared();
        IntegrationResult result = problem.Solve(3).Result;
        Assert.Equal(Kinked.KinkTime, Assert.Single(result.Events).Time, 1e-14);
        Assert.Equal(problem.Exact(3)[0], result.EndState[0], 1e-9);
    }

    [Fact]
    public void A_declared_kink_costs_fewer_derivatives_than_an_undeclared_one() =>
        Assert.True(Kinked.Declared().Solve(3).Result.Counters.DerivativeEvaluations
            < new Kinked().Solve(3).Result.Counters.DerivativeEvaluations);

    /// <summary>The derivative is that of the far side beyond the place, whatever the restart does: the step is repeated up to it.</summary>
    [Theory]
    [InlineData(EventAction.Restart)]
    [InlineData(EventAction.Stop)]
    public void An_event_with_a_kink_is_placed_a_hundred_times_better(EventAction action)
    {
        Kinked plain = new Kinked().When((_, y, _) => y[0] - 1, action, EventDirection.Falling);
        Kinked repeated = new();
        repeated.Add((_, y, _) => y[0] - 1, new EventRule(EventDirection.Falling, action, IsKink: true));
        double off = Math.Abs(plain.Solve(3, tolerance: 1e-4, firstStep: 2).Result.Events[0].Time - Kinked.KinkTime);
        IntegrationResult result = repeated.Solve(3, tolerance: 1e-4, firstStep: 2).Result;
        Assert.InRange(Math.Abs(Assert.Single(result.Events).Time - Kinked.KinkTime), 0, 0.01 * off);
    }

    [Fact]
    public void A_step_repeated_for_a_kink_lists_each_event_once()
    {
        Kinked problem = new Kinked().When((_, y, _) => y[0] - 1.5, EventAction.Record);
        problem.Add((_, y, _) => y[0] - 1, new EventRule(EventDirection.Either, EventAction.Restart, IsKink: true));
        IntegrationResult result = problem.Solve(3, firstStep: 2).Result;
        Assert.Equal([0, 1], result.Events.Select(e => e.Index));
        Assert.Equal(problem.Exact(3)[0], result.EndState[0], 1e-7);
        Assert.InRange(result.Counters.RejectedSteps, 1, 20);
    }

    [Fact]
    public void An_undeclared_kink_is_coped_with_by_error_control()
    {
        (IntegrationResult result, Trajectory trajectory) = new Kinked().Solve(3);
        Assert.Equal(EndingReason.ReachedEnd, result.Reason);
        double[] y = new double[1];
        for (int i = 0; i <= 300; i++)
        {
            trajectory.Evaluate(i / 100.0, y);
            Assert.Equal(new Kinked().Exact(i / 100.0)[0], y[0], 1e-6);
        }
    }

    [Fact]
    public void After_a_restart_the_first_step_is_not_a_tiny_one()
    {
        Kinked problem = Kinked.Declared();
        (IntegrationResult result, Trajectory trajectory) = problem.Solve(3);
        DenseStep first = default;
        for (int i = 0; i < trajectory.StepCount; i++)
        {
            if (trajectory.Step(i).Start == result.Events[0].Time)
                first = trajectory.Step(i);
        }
        Assert.InRange(first.End - first.Start, 0.05, 0.5);
    }
}
