using DrainSim.Draining;
using DrainSim.Studies;
using DrainSim.Studies.Sampling;
using DrainSim.Studies.Uncertainty;
using DrainSim.Tests.Draining;
using MathNet.Numerics.Distributions;

namespace DrainSim.Tests.Studies.Uncertainty;

/// <summary>
/// An orifice in the floor empties a prism in t = 2·(A/(Cd·a))·√(h0/2g)·(1 − √(hs/h0)): its logarithm is linear in those
/// of bore and coefficient, so that lognormal inputs give a lognormal drain time whose percentiles are known.
/// </summary>
public sealed class UncertaintyStudyTests
{
    private const double Stop = 0.3;

    private static readonly Job Tank = Jobs.OrificeDrain() with { Run = new RunSettings { StopAtLevel = Stop, Until = 1e6 } };

    private static readonly UncertainParameter Bore = new("bore", "m", new LogNormalSpread { Median = 0.05, LogDeviation = 0.03 });
    private static readonly UncertainParameter Coefficient = new("Cd", "", new LogNormalSpread { Median = 0.6, LogDeviation = 0.05 });

    [Theory]
    [InlineData(SamplingMethod.Sobol)]
    [InlineData(SamplingMethod.LatinHypercube)]
    public void Percentiles_are_the_analytic_ones_within_their_stated_error(SamplingMethod method)
    {
        UncertaintyResult result = Run(Study(method));
        double median = Time(0.05, 0.6), deviation = Math.Sqrt(Math.Pow(2 * 0.03, 2) + 0.05 * 0.05);
        foreach (Percentile found in result.DrainTime)
        {
            double exact = LogNormal.InvCDF(Math.Log(median), deviation, found.Share);
            Assert.Equal(exact, found.Value, 2 * found.Error!.Value); // 95 % interval; twice it is passed once in 15 000 cases
            Assert.InRange(found.Error!.Value / exact, 1e-5, 0.01);
        }
    }

    /// <summary>The stated interval holds the true value in 95 of 100 seeds, within the binomial bounds at 1 in 1000.</summary>
    [Theory]
    [InlineData(SamplingMethod.Sobol)]
    [InlineData(SamplingMethod.LatinHypercube)]
    public void The_sampling_error_covers_the_truth_as_often_as_it_says(SamplingMethod method)
    {
        const int seeds = 40;
        double median = Time(0.05, 0.6), deviation = Math.Sqrt(Math.Pow(2 * 0.03, 2) + 0.05 * 0.05);
        double exact = LogNormal.InvCDF(Math.Log(median), deviation, 0.9);
        int held = Enumerable.Range(0, seeds).Count(seed =>
        {
            Percentile p90 = Run(Study(method) with { Seed = seed, Samples = 256 }).DrainTime[3];
            return Math.Abs(p90.Value - exact) <= p90.Error;
        });
        Assert.InRange(held, 32, seeds); // Binomial(40, 0.95) is below 32 less than once in 2000 times
    }

    [Fact]
    public void The_answer_is_the_same_for_any_number_of_threads_and_another_one_for_another_seed()
    {
        UncertaintyStudy study = Study(SamplingMethod.Sobol) with { Samples = 512 };
        List<SampleRun> one = [], four = [];
        UncertaintyResult first = Run(study with { Runs = new OrderedRuns { Threads = 1 } }, one.Add);
        UncertaintyResult second = Run(study with { Runs = new OrderedRuns { Threads = 4 } }, four.Add);
        Assert.Equal(first.DrainTime, second.DrainTime);
        Assert.Equal(first.DrainTimeShares!.Shares, second.DrainTimeShares!.Shares);
        Assert.Equal(first.Fan.Levels.SelectMany(x => x), second.Fan.Levels.SelectMany(x => x));
        Assert.Equal(one.Select(run => (run.Number, run.Values[0], run.Run!.StoppedAt)), four.Select(run => (run.Number, run.Values[0], run.Run!.StoppedAt)));
        Assert.NotEqual(first.DrainTime, Run(study with { Seed = 2 }).DrainTime);
    }

    /// <remarks>ln t = … − 2·ln d − ln Cd: the bore explains (2·0.03)² of (2·0.03)² + 0.05², 59 %.</remarks>
    [Fact]
    public void The_spread_is_shared_out_as_the_variances_of_the_linear_case()
    {
        SpreadShares shares = Run(Study(SamplingMethod.Sobol)).DrainTimeShares!;
        Assert.Equal(0.0036 / (0.0036 + 0.0025), shares.Shares[0], 0.01);
        Assert.Equal(shares.Explained, shares.Shares.Sum(), 1e-12);
        Assert.InRange(shares.Explained, 0.995, 1);
    }

    [Fact]
    public void Parameters_that_go_together_widen_the_band_and_still_share_all_of_it()
    {
        UncertaintyStudy study = Study(SamplingMethod.Sobol);
        UncertaintyResult apart = Run(study), together = Run(study with { Correlations = [new RankCorrelation(0, 1, 0.7)] });
        double Width(UncertaintyResult result) => result.DrainTime[4].Value - result.DrainTime[0].Value;
        double pearson = 2 * Math.Sin(Math.PI * 0.7 / 6);
        double expected = Math.Sqrt((0.0036 + 0.0025 + 2 * pearson * 0.06 * 0.05) / (0.0036 + 0.0025));
        Assert.Equal(expected, Width(together) / Width(apart), 0.02);
        Assert.Equal(together.DrainTimeShares!.Explained, together.DrainTimeShares.Shares.Sum(), 1e-12);
        Assert.All(together.DrainTimeShares.Shares, share => Assert.InRange(share, 0.3, 0.7));
    }

    [Fact]
    public void Jobs_that_are_not_done_take_for_ever_and_count_among_the_chances()
    {
        double limit = Time(0.05, 0.6); // half of the runs take longer
        UncertaintyStudy study = Study(SamplingMethod.Sobol);
        UncertaintyResult result = Run(study with
        {
            Make = values => CaseJob.Of(() => JobOf(values) with
            {
                Run = new RunSettings { StopAtLevel = Stop, Until = limit },
                Limits = new JobLimits { DrainTimeAtMost = 0.95 * limit },
            }),
        });
        Assert.Equal(double.PositiveInfinity, result.DrainTime[3].Value);
        Assert.Null(result.DrainTime[3].Error);
        Assert.True(double.IsFinite(result.DrainTime[0].Value));
        Chance late = result.Outcomes.Single(one => one.Outcome == Outcome.TimeLimit).Chance;
        Assert.InRange(0.5, late.Low, late.High);
        LimitChance kept = Assert.Single(result.Limits);
        double exact = Normal.CDF(0, Math.Sqrt(0.0061), Math.Log(0.95));
        Assert.InRange(exact, kept.Kept.Low, kept.Kept.High);
        Assert.Equal(kept.Kept, result.AllLimits);
    }

    [Fact]
    public void Samples_that_make_no_job_are_counted_with_their_cause_and_nowhere_else()
    {
        UncertaintyStudy study = Study(SamplingMethod.Sobol) with { Samples = 512 };
        UncertaintyResult result = Run(study with
        {
            Make = values => values[0] > 0.05 ? CaseJob.Refused("too wide") : CaseJob.Of(() => JobOf(values)),
        });
        Assert.Equal((512, 256, "too wide"), (result.Count, result.Refused, result.FirstFault));
        Assert.Equal(256, result.Outcomes.Sum(one => one.Chance.Count));
        Assert.Throws<ArgumentOutOfRangeException>(() => Run(study with { Make = _ => CaseJob.Refused("never") }));
    }

    [Fact]
    public void The_fan_begins_at_the_level_of_the_start_falls_and_lies_around_the_closed_form()
    {
        UncertaintyResult result = Run(Study(SamplingMethod.Sobol));
        LevelFan fan = result.Fan;
        Assert.All(fan.Levels, band => Assert.Equal(Tank.Level, band[0], 1e-6));
        Assert.All(fan.Levels, band => Assert.True(band.Zip(band.Skip(1)).All(pair => pair.Second <= pair.First + 1e-6)));
        int half = fan.Times.Count / 2;
        double k = Jobs.OrificeFactor(0.05, 0.6) / 2 / 2; // K/2A of the closed form with A = 2 m²
        double median = Math.Pow(Math.Sqrt(Tank.Level) - k * fan.Times[half], 2);
        Assert.Equal(median, fan.Levels[2][half], 0.01);
        Assert.True(fan.Levels[0][half] < fan.Levels[2][half] && fan.Levels[2][half] < fan.Levels[4][half]);
    }

    /// <remarks>Two of 20 draws: the exact binomial interval of Clopper and Pearson is 1.235 % to 31.70 % (tables of the binomial distribution).</remarks>
    [Fact]
    public void A_chance_has_the_exact_binomial_interval()
    {
        var chance = new Chance(2, 20);
        Assert.Equal(0.01235, chance.Low, 1e-4);
        Assert.Equal(0.31698, chance.High, 1e-4);
        Assert.Equal(0, new Chance(0, 20).Low);
        Assert.Equal(1 - Math.Pow(0.025, 1 / 20.0), new Chance(0, 20).High, 1e-9);
        Assert.Equal(1, new Chance(20, 20).High);
    }

    private static UncertaintyStudy Study(SamplingMethod method) => new()
    {
        Parameters = [Bore, Coefficient],
        Make = values => CaseJob.Of(() => JobOf(values)),
        Method = method,
        Samples = 1024,
    };

    private static Job JobOf(IReadOnlyList<double> values) =>
        Tank with { DrawOffs = Jobs.Only(Jobs.Orifice(values[0], values[1])) };

    private static double Time(double bore, double coefficient) =>
        2 * 2 / Jobs.OrificeFactor(bore, coefficient) * (Math.Sqrt(Tank.Level) - Math.Sqrt(Stop));

    private static UncertaintyResult Run(UncertaintyStudy study, Action<SampleRun>? take = null) =>
        study.Run(take, TestContext.Current.CancellationToken);
}
