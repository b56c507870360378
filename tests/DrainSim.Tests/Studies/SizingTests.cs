using CsCheck;
using DrainSim.Draining;
using DrainSim.Studies;

namespace DrainSim.Tests.Studies;

/// <summary>Sizing against closed forms, and what it says where there is no value, or more than one.</summary>
public sealed class SizingTests
{
    private static CancellationToken Stop => TestContext.Current.CancellationToken;

    /// <summary>a = A·√(2(1 + K)/g)·(√h₀ − √h₁)/t.</summary>
    [Fact]
    public void The_bore_for_a_drain_time_is_that_of_the_closed_form() =>
        Gen.Select(Gen.Double[300, 30_000], Gen.Double[0.1, 8]).Sample(
            (time, loss) =>
            {
                double bore = Math.Sqrt(StudyJobs.Time(1, loss) / time);
                SizedValue found = Single(ResultQuantity.DrainTime, time, 0.003, 0.5, value => StudyJobs.Drain(value, loss));
                AssertNear(bore, found.Value, 1e-6);
                Assert.InRange(bore, found.Least * (1 - 1e-6), found.Most * (1 + 1e-6));
                Assert.InRange(Math.Abs(found.Residual), 0, 1e-6 * time);
            },
            iter: 25);

    /// <summary>√h₀ = √h₁ + t·a/A·√(g/(2(1 + K))).</summary>
    [Fact]
    public void The_level_for_a_drain_time_is_that_of_the_closed_form()
    {
        const double bore = 0.04, loss = 1.3, level = 1.234;
        double time = StudyJobs.Time(bore, loss, level);
        AssertNear(level, Single(ResultQuantity.DrainTime, time, 0.3, 2.9, value => StudyJobs.Drain(bore, loss, value)).Value, 1e-6);
    }

    /// <summary>1 + K = g/2·(t·a/(A·(√h₀ − √h₁)))².</summary>
    [Fact]
    public void The_loss_for_a_drain_time_is_that_of_the_closed_form()
    {
        const double bore = 0.05, loss = 4.2;
        double time = StudyJobs.Time(bore, loss);
        AssertNear(loss, Single(ResultQuantity.DrainTime, time, 0, 30, value => StudyJobs.Drain(bore, value)).Value, 1e-6);
    }

    /// <summary>A prism holds A·h: the stop level for a heel.</summary>
    [Fact]
    public void The_stop_level_for_a_heel_is_the_heel_over_the_area() =>
        AssertNear(0.35 / StudyJobs.Area,
            Single(ResultQuantity.LeftVolume, 0.35, 0.01, 1.4, value => StudyJobs.Drain(0.05, 1, stop: value)).Value, 1e-9);

    [Fact]
    public void A_range_around_the_given_value_is_widened_until_the_target_lies_in_it()
    {
        double time = StudyJobs.Time(0.03, 1);
        SizingResult result = Sizing.FindAround(SizingTarget.Of(ResultQuantity.DrainTime, time), 0.5,
            bore => CaseResult.Of(StudyJobs.Drain(bore, 1), Stop), Stop);
        AssertNear(0.03, Assert.Single(result.Values).Value, 1e-6);
        Assert.True(result.From < 0.03);
    }

    [Fact]
    public void Without_a_value_the_nearest_results_are_told()
    {
        SizingResult result = Find(ResultQuantity.DrainTime, 1, 0.02, 0.1, bore => StudyJobs.Drain(bore, 1));
        Assert.Empty(result.Values);
        (double least, double most) = result.Reached!.Value;
        AssertNear(StudyJobs.Time(0.1, 1), least, 1e-6);
        AssertNear(StudyJobs.Time(0.02, 1), most, 1e-6);
    }

    /// <summary>The heel of a valley: level − stop is a parabola of the parameter, so the target is met twice.</summary>
    [Fact]
    public void Several_values_are_all_found()
    {
        SizingResult result = Find(ResultQuantity.FinalLevel, 0.5, -1, 1, value => StudyJobs.Drain(0.05, 1, stop: 0.25 + value * value));
        Assert.Equal(2, result.Values.Count);
        AssertNear(-0.5, result.Values[0].Value, 1e-8);
        AssertNear(0.5, result.Values[1].Value, 1e-8);
    }

    [Fact]
    public void A_jump_over_the_target_is_no_value()
    {
        SizingResult result = Find(ResultQuantity.FinalLevel, 0.5, 0, 1, value => StudyJobs.Drain(0.05, 1, stop: value < 0.3217 ? 0.2 : 0.9));
        SizedValue jump = Assert.Single(result.Values);
        Assert.True(jump.IsJump);
        Assert.InRange(0.3217, jump.Least, jump.Most);
        Assert.InRange(jump.Most - jump.Least, 0, 1e-8);
    }

    [Fact]
    public void A_value_beside_an_impossible_stretch_is_found()
    {
        double time = StudyJobs.Time(0.0501, 1);
        SizingResult result = new Sizing { Target = SizingTarget.Of(ResultQuantity.DrainTime, time), From = 0.01, To = 0.1, Steps = 5 }
            .Find(bore => bore < 0.05 ? CaseResult.Impossible("too narrow") : CaseResult.Of(StudyJobs.Drain(bore, 1), Stop), Stop);
        AssertNear(0.0501, Assert.Single(result.Values).Value, 1e-6);
    }

    [Fact]
    public void Where_the_limits_begin_to_be_kept_is_the_bore_of_the_longest_time_allowed()
    {
        double time = StudyJobs.Time(0.04, 1);
        SizingResult result = new Sizing { Target = SizingTarget.LimitsKept, From = 0.02, To = 0.09 }.Find(bore => CaseResult.Of(
            StudyJobs.Drain(bore, 1) with { Limits = new JobLimits { DrainTimeAtMost = time } }, Stop), Stop);
        SizedValue edge = Assert.Single(result.Values);
        AssertNear(0.04, edge.Value, 1e-6);
        Assert.Empty(edge.Run.BrokenLimits);
    }

    [Fact]
    public void An_impossible_range_has_no_value_and_no_result()
    {
        SizingResult result = new Sizing { Target = SizingTarget.LimitsKept, From = 0, To = 1 }
            .Find(_ => CaseResult.Impossible("nothing fits"), Stop);
        Assert.Empty(result.Values);
        Assert.Null(result.Reached);
    }

    private static SizedValue Single(ResultQuantity quantity, double target, double from, double to, Func<double, Job> job) =>
        Assert.Single(Find(quantity, target, from, to, job).Values);

    private static SizingResult Find(ResultQuantity quantity, double target, double from, double to, Func<double, Job> job) =>
        new Sizing { Target = SizingTarget.Of(quantity, target), From = from, To = to }.Find(value => CaseResult.Of(job(value), Stop), Stop);

    private static void AssertNear(double expected, double actual, double tolerance) =>
        Assert.InRange(actual, expected - tolerance * Math.Abs(expected), expected + tolerance * Math.Abs(expected));
}
