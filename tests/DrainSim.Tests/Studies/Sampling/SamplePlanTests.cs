using DrainSim.Studies.Sampling;
using MathNet.Numerics.Statistics;

namespace DrainSim.Tests.Studies.Sampling;

/// <summary>The points of a study, their repetitions and their correlations.</summary>
public sealed class SamplePlanTests
{
    [Theory]
    [InlineData(SamplingMethod.Sobol)]
    [InlineData(SamplingMethod.LatinHypercube)]
    public void Each_repetition_has_one_point_in_each_strip_of_each_parameter(SamplingMethod method)
    {
        var plan = new SamplePlan(method, 4, 16 * 64, 3);
        double[][] points = Points(plan);
        for (int repetition = 0; repetition < SamplePlan.Repetitions; repetition++)
        {
            for (int j = 0; j < 4; j++)
            {
                IEnumerable<int> strips = points.Where((_, i) => plan.RepetitionOf(i) == repetition).Select(point => (int)(64 * point[j]));
                Assert.Equal(Enumerable.Range(0, 64), strips.Order());
            }
        }
    }

    [Theory]
    [InlineData(SamplingMethod.Sobol)]
    [InlineData(SamplingMethod.LatinHypercube)]
    public void Repetitions_parameters_and_seeds_differ_and_the_same_seed_repeats(SamplingMethod method)
    {
        double[][] first = Points(new SamplePlan(method, 2, 16 * 32, 3));
        Assert.NotEqual(first[..32], first[32..64]);
        Assert.NotEqual(first.Select(point => point[0]), first.Select(point => point[1]));
        Assert.NotEqual(first, Points(new SamplePlan(method, 2, 16 * 32, 4)));
        Assert.Equal(first, Points(new SamplePlan(method, 2, 16 * 32, 3)));
    }

    [Theory]
    [InlineData(SamplingMethod.Sobol)]
    [InlineData(SamplingMethod.LatinHypercube)]
    public void The_mean_of_a_smooth_function_is_far_nearer_than_that_of_independent_draws(SamplingMethod method)
    {
        double[][] points = Points(new SamplePlan(method, 3, 16 * 128, 1));
        double mean = points.Average(point => point[0] + Math.Exp(point[1]) + point[2] * point[2]);
        double exact = 0.5 + Math.E - 1 + 1 / 3.0;
        double independent = Math.Sqrt((1 / 12.0 + 0.242 + 0.0889) / points.Length); // root of the variances over the number
        Assert.InRange(Math.Abs(mean - exact), 0, independent / 10);
    }

    [Theory]
    [InlineData(0.8)]
    [InlineData(-0.5)]
    public void A_rank_correlation_asked_for_is_kept_and_leaves_the_others_alone(double asked)
    {
        var copula = new GaussianCopula(3, [new RankCorrelation(0, 2, asked)]);
        double[][] points = Points(new SamplePlan(SamplingMethod.Sobol, 3, 4096, 5));
        foreach (double[] point in points)
            copula.Bend(point);
        double Of(int i, int j) => Correlation.Spearman(points.Select(p => p[i]), points.Select(p => p[j]));
        Assert.Equal(asked, Of(0, 2), 0.01);
        Assert.Equal(0, Of(0, 1), 0.01);
        Assert.Equal(0, Of(1, 2), 0.01);
        foreach (int j in (int[])[0, 1, 2]) // every single one stays uniform: Kolmogorov's distance at 1 % is 1.63/√n
        {
            double[] sorted = [.. points.Select(p => p[j]).Order()];
            Assert.InRange(sorted.Select((x, i) => Math.Abs(x - (i + 0.5) / sorted.Length)).Max(), 0, 1.63 / Math.Sqrt(sorted.Length));
        }
    }

    [Fact]
    public void Correlations_that_contradict_each_other_are_refused()
    {
        RankCorrelation[] pairs = [new(0, 1, 0.9), new(1, 2, 0.9), new(0, 2, -0.9)];
        ArgumentException refused = Assert.Throws<ArgumentOutOfRangeException>(() => new GaussianCopula(3, pairs));
        Assert.Contains("contradict each other", refused.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(0, 1000)]
    [InlineData(13, 1000)]
    [InlineData(2, 31)]
    public void A_plan_that_cannot_be_laid_out_is_refused(int dimensions, int samples) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => new SamplePlan(SamplingMethod.Sobol, dimensions, samples, 1));

    private static double[][] Points(SamplePlan plan) => [.. Enumerable.Range(0, plan.Count).Select(i =>
    {
        double[] point = new double[plan.Dimensions];
        plan.Point(i, point);
        return point;
    })];
}
