using DrainSim.Integration;
using DrainSim.Tests.Integration.Problems;

namespace DrainSim.Tests.Integration;

public sealed class TrajectoryTests
{
    [Fact]
    public void The_value_at_a_jump_is_the_last_before_unless_the_one_after_is_asked_for()
    {
        Clock clock = new Clock().When((t, _, _) => t - 1, EventAction.Restart);
        clock.Answer = (_, _, y) => (y[0] = 10) > 0 && (clock.Speed = 4) > 0;
        (IntegrationResult result, Trajectory trajectory) = clock.Solve(2);
        double jump = result.Events[0].Time;
        double[] y = new double[1];
        trajectory.Evaluate(jump, y);
        Assert.Equal(1, y[0], 1e-14);
        trajectory.Evaluate(jump, y, Side.After);
        Assert.Equal(10, y[0]);
        trajectory.EvaluateDerivative(jump, y);
        Assert.Equal(1, y[0], 1e-13);
        trajectory.EvaluateDerivative(jump, y, Side.After);
        Assert.Equal(4, y[0], 1e-13);
        Assert.Equal([0, jump], Enumerable.Range(0, trajectory.PieceCount).Select(trajectory.PieceStart));
    }

    [Fact]
    public void Steps_follow_each_other_without_a_gap_and_agree_where_they_meet()
    {
        (_, Trajectory trajectory) = new HarmonicOscillator().Solve(20, 1e-6);
        double[] before = new double[2];
        double[] after = new double[2];
        for (int i = 1; i < trajectory.StepCount; i++)
        {
            double t = trajectory.Step(i).Start;
            Assert.Equal(trajectory.Step(i - 1).End, t);
            trajectory.Evaluate(t, before);
            trajectory.Evaluate(t, after, Side.After);
            Assert.Equal(before[0], after[0], 1e-14);
            trajectory.EvaluateDerivative(t, before);
            trajectory.EvaluateDerivative(t, after, Side.After);
            Assert.Equal(before[0], after[0], 1e-13);
        }
    }

    [Fact]
    public void A_run_of_no_length_has_its_first_state_and_no_step()
    {
        (IntegrationResult result, Trajectory trajectory) = new Logistic().Solve(3, start: 3);
        double[] y = new double[1];
        trajectory.Evaluate(3, y);
        Assert.Equal(0.1, y[0]);
        Assert.Equal((EndingReason.ReachedEnd, 0, 0), (result.Reason, trajectory.StepCount, trajectory.PieceCount));
        Assert.Throws<InvalidOperationException>(() => trajectory.EvaluateDerivative(3, y));
    }

    [Fact]
    public void Times_outside_are_refused()
    {
        (_, Trajectory trajectory) = new Logistic().Solve(3);
        double[] y = new double[1];
        Assert.All([-0.1, 3.1, double.NaN],
            t => Assert.Throws<ArgumentOutOfRangeException>(() => trajectory.Evaluate(t, y)));
    }

    [Fact]
    public void A_trajectory_used_again_forgets_the_run_before()
    {
        Trajectory trajectory = new(1, capacity: 1);
        foreach (double end in (double[])[9, 2])
        {
            new Integrator<Logistic>(new Logistic()).Run(0, [0.1], end, new IntegrationOptions(), trajectory,
                TestContext.Current.CancellationToken);
            Assert.Equal((0.0, end), (trajectory.Start, trajectory.End));
        }
    }
}
