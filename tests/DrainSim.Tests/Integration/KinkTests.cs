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
