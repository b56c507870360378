using DrainSim.Integration;
using DrainSim.Tests.Integration.Problems;

namespace DrainSim.Tests.Integration;

/// <summary>Implicit steps: what they cost where explicit ones would have to be short, and that driver, events and dense
/// output are the same for both.</summary>
public sealed class StiffTests
{
    /// <summary>Explicit steps, 3.3/λ long for stability alone, would number from 3000 to 3e9.</summary>
    [Theory]
    [InlineData(1e3)]
    [InlineData(1e6)]
    [InlineData(1e9)]
    public void A_quick_part_that_follows_a_slow_one_costs_few_steps(double pull)
    {
        FollowedCosine problem = new(pull) { IsStiff = true };
        (IntegrationResult result, Trajectory trajectory) = problem.Solve(10);
        Assert.Equal(EndingReason.ReachedEnd, result.Reason);
        Assert.InRange(result.Counters.Steps, 1, 250);
        Assert.InRange(result.Counters.Jacobians, result.Counters.Steps, result.Counters.Steps + 5);
        Span<double> y = [0];
        for (int i = 0; i < trajectory.StepCount; i++)
        {
            trajectory.Step(i).Evaluate(trajectory.Step(i).End, y);
            Assert.Equal(Math.Cos(trajectory.Step(i).End), y[0], 1e-7);
        }
    }

    [Fact]
    public void Between_the_steps_the_dense_output_is_within_some_tens_of_the_tolerance()
    {
        Trajectory trajectory = new FollowedCosine(1e3) { IsStiff = true }.Solve(10).Trajectory;
        Span<double> y = [0];
        for (double t = 0; t <= 10; t += 0.01)
        {
            trajectory.Evaluate(t, y);
            Assert.Equal(Math.Cos(t), y[0], 1e-6);
        }
    }

    [Fact]
    public void Robertsons_reactions_end_where_the_test_set_says()
    {
        IntegrationResult result = new Robertson { IsStiff = true }.Solve(Robertson.End).Result;
        double[] end = new Robertson().Exact(Robertson.End);
        Assert.InRange(result.Counters.Steps, 1, 1000);
        for (int i = 0; i < 3; i++)
            Assert.Equal(1, result.EndState[i] / end[i], 1e-5);
    }

    /// <summary>
    /// The equation of Prothero and Robinson, on which a method falls to its stage order, here 1: this one keeps more, and as its last
    /// stage is the solution, the error goes down with 1/λ.
    /// </summary>
    [Theory]
    [InlineData(1, 4.8, 1e-9)]
    [InlineData(10, 4.8, 1e-8)]
    [InlineData(1e2, 2.9, 2e-8)]
    [InlineData(1e4, 2.9, 1e-9)]
    [InlineData(1e6, 2.9, 1e-11)]
    public void However_stiff_the_order_holds_or_the_error_is_small(double pull, double leastOrder, double largestError)
    {
        double error = ErrorOf(pull, 20);
        Assert.InRange(error, 0, largestError);
        Assert.InRange(Math.Log2(error / ErrorOf(pull, 40)), leastOrder, 5.5);
    }

    [Fact]
    public void Halving_the_step_cuts_the_error_of_the_solution_and_of_its_dense_output_by_two_to_the_fifth()
    {
        (double atEnds, double between) = LogisticErrors(40);
        (double atEndsHalved, double betweenHalved) = LogisticErrors(80);
        Assert.InRange(Math.Log2(atEnds / atEndsHalved), 4.7, 5.5);
        Assert.InRange(Math.Log2(between / betweenHalved), 4.5, 5.5);
    }

    [Fact]
    public void Events_are_found_on_the_dense_output_of_implicit_steps()
    {
        FollowedCosine problem = new FollowedCosine(1e3) { IsStiff = true }
            .When((_, y, _) => y[0] - 0.5, EventAction.Record, EventDirection.Falling)
            .When((_, y, _) => y[0], EventAction.Restart, EventDirection.Falling)
            .When((_, y, _) => y[0] + 0.5, EventAction.Stop, EventDirection.Rising);
        IntegrationResult result = problem.Solve(10).Result;
        double[] times = [Math.PI / 3, Math.PI / 2, 4 * Math.PI / 3];
        Assert.Equal(times.Length, result.Events.Length);
        Assert.All(result.Events.Zip(times), pair => Assert.Equal(pair.Second, pair.First.Time, 1e-6));
        Assert.Equal((EndingReason.Stopped, 1), (result.Reason, result.Counters.Restarts));
    }

    [Fact]
    public void A_restart_may_change_from_explicit_to_implicit_steps_and_back()
    {
        FollowedCosine problem = new FollowedCosine(100)
            .When((t, _, _) => t - 2, EventAction.Restart)
            .When((t, _, _) => t - 4, EventAction.Restart);
        problem.Answer = (_, _, _) => (problem.IsStiff = !problem.IsStiff) || true;
        (IntegrationResult result, Trajectory trajectory) = problem.Solve(6);
        Assert.Equal(Math.Cos(6), result.EndState[0], 1e-7);
        Assert.InRange(result.Counters.Jacobians, 1, result.Counters.Steps / 2);
        Assert.Equal(3, trajectory.PieceCount);
    }

    [Fact]
    public void A_run_of_many_implicit_steps_allocates_no_more_bytes_than_one_of_few()
    {
        Robertson problem = new() { IsStiff = true };
        Integrator<Robertson> integrator = new(problem);
        Trajectory trajectory = new(3, capacity: 20_000);
        long few = Least(1e-6, out int fewSteps), many = Least(Robertson.End, out int manySteps);
        Assert.True(manySteps > 10 * fewSteps);
        Assert.Equal(few, many);

        // The least of some runs: what the thread had left unused counts as allocated when another test sets off a collection.
        long Least(double end, out int steps)
        {
            long least = long.MaxValue;
            steps = 0;
            for (int i = 0; i < 5; i++)
            {
                long before = GC.GetAllocatedBytesForCurrentThread();
                steps = integrator.Run(0, [1, 0, 0], end, new(), trajectory, TestContext.Current.CancellationToken).Counters.Steps;
                least = Math.Min(least, GC.GetAllocatedBytesForCurrentThread() - before);
            }
            return least;
        }
    }

    private static double ErrorOf(double pull, int steps)
    {
        const double end = 2;
        FollowedCosine problem = new(pull);
        Rosenbrock<FollowedCosine> stepper = new(problem, Rodas5P.Tableau);
        stepper.Begin(0, problem.InitialState);
        double largest = 0;
        for (int i = 1; i <= steps; i++)
        {
            stepper.Try(end / steps, 1e-8);
            stepper.Accept(end * i / steps);
            largest = Math.Max(largest, Math.Abs(stepper.State[0] - Math.Cos(stepper.Time)));
        }
        return largest;
    }

    private static (double AtEnds, double Between) LogisticErrors(int steps)
    {
        const double end = 4;
        Logistic problem = new();
        Rosenbrock<Logistic> stepper = new(problem, Rodas5P.Tableau);
        double[] coefficients = new double[DenseStep.Terms];
        Span<double> y = [0];
        double atEnds = 0, between = 0, h = end / steps;
        stepper.Begin(0, problem.InitialState);
        for (int i = 0; i < steps; i++)
        {
            stepper.Try(h, 1e-8);
            stepper.WriteDense(coefficients);
            DenseStep dense = new(stepper.Time, stepper.Time + h, h, coefficients);
            for (int part = 1; part < 16; part++)
            {
                dense.Evaluate(dense.Start + h * part / 16, y);
                between = Math.Max(between, Math.Abs(y[0] - problem.Exact(dense.Start + h * part / 16)[0]));
            }
            stepper.Accept(end * (i + 1) / steps);
            atEnds = Math.Max(atEnds, Math.Abs(stepper.State[0] - problem.Exact(stepper.Time)[0]));
        }
        return (atEnds, between);
    }
}
