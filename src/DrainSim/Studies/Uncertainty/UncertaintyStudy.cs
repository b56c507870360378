using DrainSim.Draining;
using DrainSim.Studies.Sampling;

namespace DrainSim.Studies.Uncertainty;

/// <summary>How sure a result is when the numbers that go in are not.</summary>
/// <example><code>
/// var study = new UncertaintyStudy
/// {
///     Parameters = [new UncertainParameter("bore", "m", new NormalSpread { Mean = 0.038, Deviation = 0.0005 })],
///     Make = values => CaseJob.Of(() => job with { DrawOffs = [new DrawOff { Line = line with { Bore = values[0] } }] }),
/// };
/// UncertaintyResult result = study.Run();
/// </code></example>
public sealed record UncertaintyStudy
{
    /// <summary>Runs unless more are asked for: 16 repetitions of 128.</summary>
    public const int UsualSamples = 2048;

    /// <summary>The uncertain numbers, at most <see cref="SamplePlan.MostDimensions"/>.</summary>
    public required IReadOnlyList<UncertainParameter> Parameters { get; init; }

    /// <summary>Makes the job of a set of values, in SI and in the order of <see cref="Parameters"/>; called by several threads.</summary>
    public required Func<IReadOnlyList<double>, CaseJob> Make { get; init; }

    /// <summary>Which parameters go together.</summary>
    public IReadOnlyList<RankCorrelation> Correlations { get; init; } = [];

    /// <summary>Least number of runs; the next multiple of <see cref="SamplePlan.Repetitions"/> is made.</summary>
    public int Samples { get; init; } = UsualSamples;

    /// <summary>The same seed gives the same study.</summary>
    public int Seed { get; init; } = 1;

    /// <summary>How the points lie.</summary>
    public SamplingMethod Method { get; init; } = SamplingMethod.Sobol;

    /// <summary>The threads; their number changes nothing but the time it takes.</summary>
    public OrderedRuns Runs { get; init; } = new();

    /// <summary>Runs the study.</summary>
    /// <param name="take">takes each run as soon as it is there, in order; null for the result alone</param>
    /// <param name="cancellation">ends it early</param>
    /// <exception cref="ArgumentOutOfRangeException">the numbers of the study are impossible, or no sample makes a job</exception>
    /// <exception cref="OperationCanceledException">the study was cancelled</exception>
    public UncertaintyResult Run(Action<SampleRun>? take = null, CancellationToken cancellation = default)
    {
        var plan = new SamplePlan(Method, Parameters.Count, Samples, Seed);
        var copula = Correlations.Count > 0 ? new GaussianCopula(Parameters.Count, Correlations) : null;
        var tally = new UncertaintyTally(this);
        Runs.Run(0, plan.Count, number => Sample(plan, copula, (int)number, cancellation), (_, sample) =>
        {
            tally.Add(sample.Run, sample.Track, sample.Checks);
            take?.Invoke(sample.Run);
        }, cancellation);
        return tally.Result();
    }

    private (SampleRun Run, LevelTrack? Track, IReadOnlyList<LimitCheck> Checks) Sample(
        SamplePlan plan, GaussianCopula? copula, int number, CancellationToken cancellation)
    {
        double[] values = new double[Parameters.Count];
        plan.Point(number, values);
        copula?.Bend(values);
        for (int j = 0; j < values.Length; j++)
            values[j] = Parameters[j].Spread.At(values[j]);
        return Make(values).Run(out string fault, cancellation) is { } result
            ? (new SampleRun(number, plan.RepetitionOf(number), values, RunSummary.Of(result), null), new LevelTrack(result), result.LimitChecks)
            : (new SampleRun(number, plan.RepetitionOf(number), values, null, fault), null, []);
    }
}
