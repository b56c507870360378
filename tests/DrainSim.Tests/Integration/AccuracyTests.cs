using DrainSim.Integration;
using DrainSim.Tests.Integration.Problems;

namespace DrainSim.Tests.Integration;

/// <summary>Solutions against closed forms, everywhere along the run.</summary>
public sealed class AccuracyTests
{
    public static TheoryData<string, double> Cases() => new()
    {
        { nameof(ExponentialDecay), 10 },
        { nameof(HarmonicOscillator), 20 },
        { nameof(Logistic), 12 },
        { nameof(TwoTanks), 8 },
        { nameof(FollowedCosine), 2 },
    };

    [Theory, MemberData(nameof(Cases))]
    public void The_error_stays_within_ten_times_the_tolerance(string name, double end) =>
        Assert.InRange(LargestError(Named(name), end, 1e-8), 0, 1e-7);

    [Theory, MemberData(nameof(Cases))]
    public void A_tolerance_a_thousand_times_tighter_gives_an_error_hundreds_of_times_smaller(string name, double end)
    {
        double ratio = LargestError(Named(name), end, 1e-6) / LargestError(Named(name), end, 1e-9);
        Assert.InRange(ratio, 200, 20_000);
    }

    [Fact]
    public void Every_tenth_of_a_cone_is_timed_to_a_ten_millionth_of_the_run()
    {
        // V' = −k·V^(1/6): the last tenth of a cone takes a seventh of the time, the last hundredth a fiftieth.
        PowerDrain cone = new(1.0 / 6, 2e-4, 3.5);
        for (int tenth = 9; tenth >= 1; tenth--)
        {
            double volume = 3.5 * tenth / 10;
            cone.When((_, y, _) => y[0] - volume, EventAction.Record);
        }
        cone.When((_, y, _) => y[0] - 0.0035, EventAction.Stop);
        IntegrationResult result = cone.Solve(1e6).Result;
        Assert.Equal(10, result.Events.Length);
        for (int i = 0; i < 9; i++)
            Assert.Equal(cone.TimeAt(3.5 * (9 - i) / 10), result.Events[i].Time, 1e-7 * cone.EmptyTime);
    }

    [Fact]
    public void The_volume_of_two_joined_tanks_is_kept_to_rounding()
    {
        (IntegrationResult result, _) = new TwoTanks(0.3, 2).Solve(20, 1e-5);
        Assert.Equal(7, 2 * result.EndState[0] + result.EndState[1], 1e-13);
    }

    [Fact]
    public void Splitting_a_run_changes_nothing_beyond_the_tolerance()
    {
        TwoTanks problem = new(0.3, 2);
        IntegrationResult whole = problem.Solve(8).Result;
        IntegrationResult first = problem.Solve(3.3).Result;
        IntegrationResult second = new Integrator<TwoTanks>(problem).Run(
            3.3, first.EndState.AsSpan(), 8, new IntegrationOptions(), new Trajectory(2), TestContext.Current.CancellationToken);
        Assert.Equal(whole.EndState[0], second.EndState[0], 1e-7);
    }

    [Fact]
    public void A_unit_of_time_a_billion_times_smaller_changes_neither_steps_nor_accuracy()
    {
        IntegrationResult slow = new ExponentialDecay(1e-6).Solve(3e6).Result;
        IntegrationResult fast = new ExponentialDecay(1e3).Solve(3e-3).Result;
        Assert.Equal(slow.Counters, fast.Counters);
        Assert.Equal(slow.EndState[0], fast.EndState[0], 1e-12);
    }

    private static Problem Named(string name) => name switch
    {
        nameof(ExponentialDecay) => new ExponentialDecay(),
        nameof(HarmonicOscillator) => new HarmonicOscillator(),
        nameof(Logistic) => new Logistic(),
        nameof(TwoTanks) => new TwoTanks(0.3, 2),
        nameof(FollowedCosine) => new FollowedCosine(200),
        _ => throw new ArgumentOutOfRangeException(nameof(name), name, "no such problem"),
    };

    private static double LargestError(Problem problem, double end, double tolerance)
    {
        (_, Trajectory trajectory) = problem.Solve(end, tolerance);
        double largest = 0;
        double[] y = new double[problem.Dimension];
        for (int i = 0; i <= 1000; i++)
        {
            double t = end * i / 1000;
            trajectory.Evaluate(t, y);
            double[] exact = problem.Exact(t);
            for (int c = 0; c < y.Length; c++)
                largest = Math.Max(largest, Math.Abs(y[c] - exact[c]));
        }
        return largest;
    }
}
