using DrainSim.Integration;
using DrainSim.Tests.Integration.Problems;

namespace DrainSim.Tests.Integration;

/// <summary>The numbered rules of events at <see cref="Integrator{TSystem}"/>, one test or more for each, in their order.</summary>
public sealed class EventRuleTests
{
    private const double Bits = 1e-15;

    [Theory]
    [InlineData(EventDirection.Either, new[] { 1.0, 2.0, 3.0 })]
    [InlineData(EventDirection.Falling, new[] { 1.0, 3.0 })]
    [InlineData(EventDirection.Rising, new[] { 2.0 })]
    public void Rule_1_a_function_fires_when_it_passes_zero_in_its_direction(EventDirection direction, double[] times)
    {
        HarmonicOscillator problem = new HarmonicOscillator(Math.PI)
            .When((_, y, _) => y[0], EventAction.Record, direction);
        IntegrationResult result = problem.Solve(3.5).Result;
        Assert.Equal(times.Length, result.Events.Length);
        Assert.All(times.Zip(result.Events), pair => Assert.Equal(pair.First, pair.Second.Time, 1e-7));
        Assert.All(result.Events, e => Assert.Equal(
            Math.Round(e.Time) == 2 ? EventDirection.Rising : EventDirection.Falling, e.Direction));
    }

    [Theory]
    [InlineData(4, 0.8, 1.2, 2)]    // the point at 1 lies between
    [InlineData(4, 1.1, 1.2, 0)]    // none of 1/2, 1, 3/2, 2 does
    [InlineData(40, 1.08, 1.12, 2)]
    public void Rule_2_two_crossings_in_a_step_are_found_when_a_sample_lies_between(
        int samples, double first, double second, int count)
    {
        Clock clock = new Clock().When((_, y, _) => (y[0] - first) * (y[0] - second), EventAction.Record);
        IntegrationResult result = clock.Solve(2, firstStep: 2, samples: samples).Result;
        Assert.Equal(1, result.Counters.Steps);
        Assert.Equal(count, result.Events.Length);
        if (count == 2)
            Assert.Equal([first, second], result.Events.Select(e => Math.Round(e.Time, 14)));
    }

    [Theory]
    [InlineData(0.7)]
    [InlineData(1.0)]   // exactly at a sample
    public void Rule_3_a_function_that_touches_zero_and_turns_back_does_not_fire(double at)
    {
        Clock clock = new Clock().When((_, y, _) => (y[0] - at) * (y[0] - at), EventAction.Record);
        Assert.Empty(clock.Solve(2, firstStep: 2).Result.Events);
    }

    [Fact]
    public void Rule_3_a_function_without_a_value_keeps_its_side()
    {
        Clock clock = new Clock().When((t, _, _) => t is > 0.4 and < 1.1 ? double.NaN : t - 0.9, EventAction.Record);
        LocatedEvent crossing = Assert.Single(clock.Solve(2, firstStep: 2).Result.Events);
        Assert.Equal(1.1, crossing.Time, Bits);   // the first time at which it is known to have crossed
    }

    [Fact]
    public void Rule_3_a_double_root_of_the_solution_does_not_fire_and_a_pair_of_roots_does()
    {
        Parabola touching = new Parabola(1, 1e-6).When((_, y, _) => y[0], EventAction.Record);
        Assert.Empty(touching.Solve(2).Result.Events);
        Parabola crossing = new Parabola(1, -0.09).When((_, y, _) => y[0], EventAction.Record);
        Assert.Equal([0.7, 1.3], crossing.Solve(2).Result.Events.Select(e => Math.Round(e.Time, 8)));
    }

    [Fact]
    public void Rule_4_zero_exactly_at_the_end_of_a_step_fires_once()
    {
        Clock clock = new Clock().When((t, _, _) => 1 - Math.Min(t, 1), EventAction.Record);
        IntegrationResult result = clock.Solve(2, firstStep: 1).Result;
        Assert.Equal(1.0, Assert.Single(result.Events).Time);
    }

    [Fact]
    public void Rule_4_zero_exactly_at_the_end_of_a_step_and_crossed_fires_once()
    {
        Clock clock = new Clock().When((t, _, _) => t - 1, EventAction.Record);
        IntegrationResult result = clock.Solve(2, firstStep: 1).Result;
        Assert.Equal(2, result.Counters.Steps);
        Assert.Equal(1.0, Assert.Single(result.Events).Time);
    }

    [Fact]
    public void Rule_4_after_arriving_at_zero_it_fires_again_only_once_it_has_left()
    {
        Clock clock = new Clock().When((t, _, _) => t < 1.5 ? Math.Max(1 - t, 0) : t - 1.75, EventAction.Record);
        IntegrationResult result = clock.Solve(2, firstStep: 1, samples: 8).Result;
        Assert.Equal([1.0, 1.75], result.Events.Select(e => Math.Round(e.Time, 14)));
    }

    [Fact]
    public void Rule_5_zero_at_the_first_instant_does_not_fire_but_the_next_crossing_does()
    {
        Clock clock = new Clock().When((_, y, _) => y[0] * (y[0] - 1.3), EventAction.Record);
        IntegrationResult result = clock.Solve(2, firstStep: 2).Result;
        LocatedEvent crossing = Assert.Single(result.Events);
        Assert.Equal(1.3, crossing.Time, Bits);
        Assert.Equal(EventDirection.Rising, crossing.Direction);
    }

    [Fact]
    public void Rule_6_an_event_lies_at_the_first_of_two_neighbouring_times_on_the_far_side()
    {
        Clock clock = new Clock().When((_, y, _) => y[0] - 1.0 / 3, EventAction.Record);
        (IntegrationResult result, Trajectory trajectory) = clock.Solve(2, firstStep: 2);
        double time = Assert.Single(result.Events).Time;
        Assert.True(StateAt(trajectory, time) >= 1.0 / 3);
        Assert.True(StateAt(trajectory, Math.BitDecrement(time)) < 1.0 / 3);
        Assert.Equal(StateAt(trajectory, time), result.Events[0].State[0]);
    }

    [Fact]
    public void Rule_7_several_events_in_one_step_come_in_the_order_of_their_times()
    {
        double[] levels = [1.7, 0.2, 1.1, 0.9, 1.05, 0.3];
        Clock clock = new();
        foreach (double level in levels)
            clock.When((_, y, _) => y[0] - level, EventAction.Record);
        IntegrationResult result = clock.Solve(2, firstStep: 2).Result;
        Assert.Equal(1, result.Counters.Steps);
        Assert.Equal([1, 5, 3, 4, 2, 0], result.Events.Select(e => e.Index));
    }

    [Fact]
    public void Rule_7_a_stop_between_two_recorded_events_hides_the_second()
    {
        Clock clock = new Clock()
            .When((_, y, _) => y[0] - 1.2, EventAction.Record)
            .When((_, y, _) => y[0] - 1.1, EventAction.Stop)
            .When((_, y, _) => y[0] - 1.05, EventAction.Record);
        IntegrationResult result = clock.Solve(2, firstStep: 2).Result;
        Assert.Equal([2, 1], result.Events.Select(e => e.Index));
        Assert.Equal(1.1, result.EndTime, Bits);
    }

    [Fact]
    public void Rule_8_at_one_instant_records_come_first_then_restarts_then_stops_each_by_index()
    {
        Clock clock = new Clock()
            .When((_, y, _) => y[0] - 1.1, EventAction.Stop)
            .When((_, y, _) => 2 * (y[0] - 1.1), EventAction.Restart)
            .When((_, y, _) => Math.Exp(y[0]) - Math.Exp(1.1), EventAction.Record)
            .When((_, y, _) => 1.1 - y[0], EventAction.Restart)
            .When((_, y, _) => y[0] * y[0] - 1.1 * 1.1, EventAction.Record);
        IntegrationResult result = clock.Solve(2, firstStep: 2).Result;
        Assert.Equal([2, 4, 1, 3, 0], result.Events.Select(e => e.Index));
        Assert.Single(result.Events.Select(e => e.Time).Distinct());
        Assert.Equal(0, result.StoppedBy);
    }

    [Theory]
    [InlineData(1e-13, new[] { 1, 0 })]
    [InlineData(1e-11, new[] { 0 })]
    public void Rule_8_crossings_within_a_trillionth_of_a_step_are_one_instant(double apart, int[] indices)
    {
        Clock clock = new Clock()
            .When((t, _, _) => t - 1.1, EventAction.Stop)
            .When((t, _, _) => t - 1.1 - apart, EventAction.Record);
        IntegrationResult result = clock.Solve(2, firstStep: 2).Result;
        Assert.Equal(indices, result.Events.Select(e => e.Index));
        Assert.All(result.Events, e => Assert.Equal(result.EndTime, e.Time));
    }

    [Fact]
    public void Rule_9_recorded_events_change_no_bit_of_the_solution()
    {
        IntegrationResult plain = new Logistic().Solve(9).Result;
        Logistic watched = new Logistic().When((_, y, _) => y[0] - 0.5, EventAction.Record)
            .When((_, y, _) => y[0] - 0.9, EventAction.Record);
        IntegrationResult result = watched.Solve(9).Result;
        Assert.Equal(2, result.Events.Length);
        Assert.Equal(plain.EndState[0], result.EndState[0]);
        Assert.Equal(plain.Counters.DerivativeEvaluations, result.Counters.DerivativeEvaluations);
    }

    [Fact]
    public void Rule_10_a_restart_may_change_the_state_and_the_system()
    {
        Clock clock = new Clock().When((t, _, _) => t - 1.1, EventAction.Restart);
        clock.Answer = (_, _, y) =>
        {
            clock.Speed = -3;
            y[0] = 10;
            return true;
        };
        (IntegrationResult result, Trajectory trajectory) = clock.Solve(2, firstStep: 2);
        Assert.Equal(10 - 3 * 0.9, result.EndState[0], 1e-14);
        Assert.Equal(1.1, result.Events[0].State[0], Bits);
        Assert.Equal(1, result.Counters.Restarts);
        Assert.Equal(2, trajectory.PieceCount);
    }

    [Fact]
    public void Rule_10_events_in_the_rest_of_the_old_step_are_forgotten()
    {
        Clock clock = new Clock()
            .When((t, _, _) => t - 1.1, EventAction.Restart)
            .When((_, y, _) => y[0] - 1.2, EventAction.Record);
        clock.Answer = (_, _, _) => (clock.Speed = -1) < 0;
        Assert.Equal([0], clock.Solve(2, firstStep: 2).Result.Events.Select(e => e.Index));
    }

    [Fact]
    public void Rule_10_an_event_recorded_shortly_before_a_restart_is_not_listed_again_after_it()
    {
        Clock clock = new Clock()
            .When((_, y, _) => y[0] - 1.05, EventAction.Record)
            .When((_, y, _) => y[0] - 1.1, EventAction.Restart);
        Assert.Equal([0, 1], clock.Solve(2, firstStep: 2).Result.Events.Select(e => e.Index));
    }

    [Fact]
    public void Rule_10_a_declined_restart_ends_the_run_by_that_event()
    {
        Clock clock = new Clock().When((t, _, _) => t - 1.1, EventAction.Restart);
        clock.Answer = (_, _, _) => false;
        IntegrationResult result = clock.Solve(2, firstStep: 2).Result;
        Assert.Equal((EndingReason.Stopped, 0), (result.Reason, result.StoppedBy));
        Assert.Equal(1.1, result.EndTime, Bits);
    }

    [Fact]
    public void Rule_11_one_root_is_not_found_again_after_its_restart()
    {
        HarmonicOscillator problem = new HarmonicOscillator(Math.PI).When((_, y, _) => y[0], EventAction.Restart);
        IntegrationResult result = problem.Solve(10.5).Result;
        Assert.Equal(Enumerable.Range(1, 10), result.Events.Select(e => (int)Math.Round(e.Time)));
    }

    [Fact]
    public void Rule_11_a_function_that_fired_fires_again_at_its_next_root()
    {
        Clock clock = new Clock().When((_, y, _) => y[0] - 0.5, EventAction.Restart);
        clock.Answer = (_, _, y) => (y[0] = 0) == 0;    // back to the start, as a filled bucket is emptied
        IntegrationResult result = clock.Solve(2.2).Result;
        Assert.Equal([0.5, 1.0, 1.5, 2.0], result.Events.Select(e => Math.Round(e.Time, 13)));
    }

    [Fact]
    public void Rule_12_a_function_that_a_restart_carries_across_zero_fires_at_that_instant()
    {
        Clock clock = new Clock()
            .When((t, _, _) => t - 1.1, EventAction.Restart)
            .When((_, _, dydt) => dydt[0] - 2, EventAction.Stop, EventDirection.Rising)
            .When((_, _, dydt) => dydt[0] - 2, EventAction.Stop, EventDirection.Falling);
        clock.Answer = (_, _, _) => (clock.Speed = 5) > 0;
        IntegrationResult result = clock.Solve(2, firstStep: 2).Result;
        Assert.Equal([0, 1], result.Events.Select(e => e.Index));
        Assert.Equal(1, result.StoppedBy);
        Assert.Equal(result.Events[0].Time, result.EndTime);
    }

    [Fact]
    public void Rule_12_restarts_that_carry_each_other_across_zero_fire_once_each()
    {
        Clock clock = new Clock()
            .When((t, _, _) => t - 1.1, EventAction.Restart)
            .When((_, _, dydt) => dydt[0] - 2, EventAction.Restart)
            .When((_, y, _) => y[0] - 50, EventAction.Restart);
        clock.Answer = (index, _, y) =>
        {
            clock.Speed = index == 2 ? 1 : 5;   // the third undoes the first
            y[0] = index == 1 ? 100 : y[0];
            return true;
        };
        IntegrationResult result = clock.Solve(2, firstStep: 2).Result;
        Assert.Equal([0, 1, 2], result.Events.Select(e => e.Index));
        Assert.Equal(EndingReason.ReachedEnd, result.Reason);
    }

    [Fact]
    public void Rule_13_restarts_at_the_instant_of_a_stop_are_listed_and_not_asked()
    {
        Clock clock = new Clock()
            .When((_, y, _) => y[0] - 1.1, EventAction.Restart)
            .When((_, y, _) => y[0] - 1.1, EventAction.Stop)
            .When((_, y, _) => y[0] - 1.1, EventAction.Stop);
        clock.Answer = (_, _, _) => throw new InvalidOperationException("asked");
        IntegrationResult result = clock.Solve(2, firstStep: 2).Result;
        Assert.Equal([0, 1, 2], result.Events.Select(e => e.Index));
        Assert.Equal((EndingReason.Stopped, 1), (result.Reason, result.StoppedBy));
    }

    [Theory]
    [InlineData(EventAction.Record, EndingReason.ReachedEnd)]
    [InlineData(EventAction.Restart, EndingReason.ReachedEnd)]
    [InlineData(EventAction.Stop, EndingReason.Stopped)]
    public void Rule_14_an_event_at_the_end_of_the_run_counts(EventAction action, EndingReason reason)
    {
        Clock clock = new Clock().When((t, _, _) => t - 2, action);
        clock.Answer = (_, _, y) => (y[0] = 7) > 0;
        IntegrationResult result = clock.Solve(2).Result;
        Assert.Equal(2.0, Assert.Single(result.Events).Time);
        Assert.Equal(reason, result.Reason);
        Assert.Equal(action == EventAction.Restart ? 7 : 2, result.EndState[0], Bits);
    }

    [Fact]
    public void An_ignored_function_is_not_listed()
    {
        Clock clock = new Clock().When((t, _, _) => t - 1, EventAction.Ignore);
        Assert.Empty(clock.Solve(2).Result.Events);
    }

    private static double StateAt(Trajectory trajectory, double t)
    {
        double[] y = new double[1];
        trajectory.Evaluate(t, y);
        return y[0];
    }
}
