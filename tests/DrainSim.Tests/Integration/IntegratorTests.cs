using DrainSim.Integration;
using DrainSim.Tests.Integration.Problems;

namespace DrainSim.Tests.Integration;

/// <summary>Endings, refusals, allocation and repeatability of the driver.</summary>
public sealed class IntegratorTests
{
    [Fact]
    public void Too_many_steps_is_a_result_with_the_solution_so_far()
    {
        (IntegrationResult result, Trajectory trajectory) = new HarmonicOscillator().Solve(1e4, maximumSteps: 50);
        Assert.Equal(EndingReason.TooManySteps, result.Reason);
        Assert.Equal(50, result.Counters.Steps + result.Counters.RejectedSteps);
        Assert.Equal(trajectory.End, result.EndTime);
        Assert.Equal(new HarmonicOscillator().Exact(result.EndTime)[0], result.EndState[0], 1e-7);
    }

    [Fact]
    public void Chattering_between_two_branches_ends_at_the_limit_of_steps()
    {
        Clock clock = new Clock()
            .When((_, y, _) => y[0] - 0.5, EventAction.Restart, EventDirection.Rising)
            .When((_, y, _) => y[0] - 0.499_999_999, EventAction.Restart, EventDirection.Falling);
        clock.Answer = (_, _, _) => (clock.Speed = -clock.Speed) != 0;
        IntegrationResult result = clock.Solve(1e6, maximumSteps: 200).Result;
        Assert.Equal(EndingReason.TooManySteps, result.Reason);
        Assert.InRange(result.Events.Length, 100, 200);
    }

    [Fact]
    public void Cancelling_ends_the_run_before_the_next_step()
    {
        using CancellationTokenSource source = new();
        Clock clock = new Clock().When((t, _, _) => t - 1, EventAction.Restart);
        clock.Answer = (_, _, _) =>
        {
            source.Cancel();
            return true;
        };
        IntegrationResult result = new Integrator<Clock>(clock).Run(
            0, [0], 5, new IntegrationOptions(), new Trajectory(1), source.Token);
        Assert.Equal((EndingReason.Cancelled, 1.0), (result.Reason, Math.Round(result.EndTime, 13)));
    }

    [Fact]
    public void A_start_outside_the_domain_is_a_result()
    {
        Clock clock = new() { Speed = double.NaN };
        Assert.Equal(EndingReason.OutsideDomain, clock.Solve(1).Result.Reason);
    }

    [Fact]
    public void A_restart_out_of_the_domain_is_a_result_with_a_finite_state()
    {
        Clock clock = new Clock().When((t, _, _) => t - 1, EventAction.Restart);
        clock.Answer = (_, _, _) => double.IsNaN(clock.Speed = double.NaN);
        IntegrationResult result = clock.Solve(2).Result;
        Assert.Equal(EndingReason.OutsideDomain, result.Reason);
        Assert.Equal(1, result.EndState[0], 1e-14);
        Assert.Single(result.Events);
    }

    [Fact]
    public void What_no_caller_may_pass_is_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new Logistic().Solve(-1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new Logistic().Solve(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => new Logistic().Solve(1, tolerance: 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => new Logistic().Solve(1, firstStep: -1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new Logistic().Solve(1, maximumSteps: 0));
        CancellationToken token = TestContext.Current.CancellationToken;
        Integrator<Logistic> integrator = new(new Logistic());
        Assert.Throws<ArgumentOutOfRangeException>(() => integrator.Run(0, [double.NaN], 1, new(), new(1), token));
        Assert.Throws<ArgumentException>(() => integrator.Run(0, [1, 2], 1, new(), new(2), token));
    }

    [Fact]
    public void A_run_of_many_steps_allocates_no_more_bytes_than_one_of_few()
    {
        HarmonicOscillator problem = new HarmonicOscillator().When((_, y, _) => y[0] - 2, EventAction.Record);
        Integrator<HarmonicOscillator> integrator = new(problem);
        Trajectory trajectory = new(2, capacity: 20_000);
        IntegrationOptions options = new();
        long Allocated(double end, out int steps)
        {
            long before = GC.GetAllocatedBytesForCurrentThread();
            IntegrationResult result = integrator.Run(0, [0, 1], end, options, trajectory, TestContext.Current.CancellationToken);
            long bytes = GC.GetAllocatedBytesForCurrentThread() - before;
            steps = result.Counters.Steps;
            return bytes;
        }
        Allocated(1000, out _);     // the first run compiles
        long few = Allocated(1, out int fewSteps);
        long many = Allocated(1000, out int manySteps);
        Assert.True(manySteps > 500 * fewSteps);
        Assert.Equal(few, many);
    }

    [Fact]
    public void A_run_repeated_on_the_same_integrator_gives_the_same_bits()
    {
        Logistic problem = new Logistic().When((_, y, _) => y[0] - 0.5, EventAction.Restart);
        Integrator<Logistic> integrator = new(problem);
        IntegrationResult Run() => integrator.Run(0, [0.1], 9, new(), new(1), TestContext.Current.CancellationToken);
        IntegrationResult first = Run();
        IntegrationResult second = Run();
        Assert.Equal(first.EndState[0], second.EndState[0]);
        Assert.Equal(first.Events.Select(e => e.Time), second.Events.Select(e => e.Time));
        Assert.Equal(first.Counters, second.Counters);
    }
}
