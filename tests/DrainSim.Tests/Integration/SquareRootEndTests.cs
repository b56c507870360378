using DrainSim.Integration;
using DrainSim.Tests.Integration.Problems;

namespace DrainSim.Tests.Integration;

/// <summary>Vessels that come to rest at zero at a finite time: y' = −k·y^p with p below 1.</summary>
public sealed class SquareRootEndTests
{
    [Theory]
    [InlineData(1.0 / 2)]
    [InlineData(4.0 / 7)]
    [InlineData(1.0 / 6)]
    [InlineData(-1.0 / 6)]
    public void The_time_to_run_empty_is_within_a_millionth(double exponent)
    {
        PowerDrain drain = new PowerDrain(exponent, 1e-3, 4.1).When((_, y, _) => y[0], EventAction.Stop);
        IntegrationResult result = drain.Solve(1e6).Result;
        Assert.Equal(EndingReason.Stopped, result.Reason);
        Assert.Equal(1, result.EndTime / drain.EmptyTime, 1e-6);
        Assert.InRange(result.EndState[0], -1e-14, 0);   // the last bit of the time times the speed
        Assert.InRange(result.Counters.Steps + result.Counters.RejectedSteps, 1, 100);
    }

    [Theory]
    [InlineData(1e-3)]
    [InlineData(1e-6)]
    [InlineData(1e-9)]
    public void The_time_to_a_small_rest_is_within_the_tolerance_of_the_run(double rest)
    {
        PowerDrain drain = new PowerDrain(0.5, 1e-3, 4.1).When((_, y, _) => y[0] - rest, EventAction.Stop);
        IntegrationResult result = drain.Solve(1e6).Result;
        Assert.Equal(drain.TimeAt(rest), result.EndTime, 2e-8 * drain.EmptyTime);
    }

    [Fact]
    public void A_drain_without_a_derivative_below_zero_stays_above_when_its_steps_are_bounded()
    {
        double rest = 4.1e-13;  // the last 3e-7 of the time
        ForbiddenDrain drain = new ForbiddenDrain(1e-3, 4.1, largestShare: 1)
            .When((_, y, _) => y[0] - rest, EventAction.Stop);
        (IntegrationResult result, Trajectory trajectory) = drain.Solve(1e6);
        Assert.Equal(EndingReason.Stopped, result.Reason);
        Assert.Equal(1, result.EndTime / drain.EmptyTime, 1e-6);
        AssertWithin(trajectory, 0, 4.1);
    }

    [Fact]
    public void A_drain_without_a_derivative_below_zero_ends_with_too_small_a_step_and_never_with_NaN()
    {
        ForbiddenDrain drain = new(1e-3, 4.1, largestShare: double.PositiveInfinity);
        (IntegrationResult result, Trajectory trajectory) = drain.Solve(1e6);
        Assert.Equal(EndingReason.StepTooSmall, result.Reason);
        Assert.Equal(1, result.EndTime / drain.EmptyTime, 1e-6);
        AssertWithin(trajectory, 0, 4.1);
    }

    [Fact]
    public void An_empty_vessel_stays_empty_to_the_end_of_the_run()
    {
        PowerDrain drain = new(0.5, 1e-3, 4.1);
        (IntegrationResult result, Trajectory trajectory) = drain.Solve(1e5);
        Assert.Equal(EndingReason.ReachedEnd, result.Reason);
        AssertWithin(trajectory, -1e-9, 4.1);
        Assert.InRange(result.Counters.Steps, 1, 200);
    }

    private static void AssertWithin(Trajectory trajectory, double least, double most)
    {
        double[] y = new double[1];
        for (int i = 0; i <= 2000; i++)
        {
            double t = Math.Min(trajectory.End * i / 2000, trajectory.End);
            trajectory.Evaluate(t, y);
            Assert.InRange(y[0], least, most);
        }
    }
}
