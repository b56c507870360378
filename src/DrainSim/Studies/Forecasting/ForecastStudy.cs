using DrainSim.Draining;
using DrainSim.Studies.Sampling;
using DrainSim.Studies.Uncertainty;
using MathNet.Numerics.Distributions;
using MathNet.Numerics.LinearAlgebra;

namespace DrainSim.Studies.Forecasting;

/// <summary>Fits parameters to the first readings of a job and tells when it will be over.</summary>
/// <remarks>
/// Weighted least squares: every reading counts by the uncertainty that its resolution leaves. Where the readings scatter
/// more than that, the errors are widened by the scatter (R. T. Birge, Phys. Rev. 40 (1932) 207). Intervals are Student's with the
/// degrees of freedom left, from the sensitivities at the optimum; the band is drawn from the multivariate t distribution
/// that belongs to them, each draw run to its end.
/// </remarks>
public sealed record ForecastStudy
{
    private static readonly double[] BandShares = [0.025, 0.5, 0.975];

    /// <summary>The readings in time order, more than there are parameters.</summary>
    public required IReadOnlyList<LevelReading> Readings { get; init; }

    /// <summary>What is fitted, fewer than <see cref="SamplePlan.MostDimensions"/>.</summary>
    public required IReadOnlyList<FittedParameter> Parameters { get; init; }

    /// <summary>Makes the job of a set of values, in SI and in the order of <see cref="Parameters"/>; called by several threads.</summary>
    public required Func<IReadOnlyList<double>, CaseJob> Make { get; init; }

    /// <summary>Least number of draws of the band.</summary>
    public int Draws { get; init; } = 512;

    /// <summary>The same seed gives the same band.</summary>
    public int Seed { get; init; } = 1;

    /// <summary>The threads; their number changes nothing but the time it takes.</summary>
    public OrderedRuns Runs { get; init; } = new();

    /// <summary>Fits and forecasts.</summary>
    /// <param name="cancellation">ends it early</param>
    /// <exception cref="ArgumentOutOfRangeException">there are too few readings or no parameters, or the start makes no job</exception>
    /// <exception cref="OperationCanceledException">the study was cancelled</exception>
    public ForecastResult Run(CancellationToken cancellation = default)
    {
        Require.Within(Parameters.Count, 1, SamplePlan.MostDimensions - 1, "number of fitted parameters", "");
        if (Readings.Count <= Parameters.Count)
            throw new ArgumentOutOfRangeException(null, $"{Readings.Count} readings cannot tell {Parameters.Count} parameters and their errors; one more than parameters is needed");
        double[] scales = [.. Parameters.Select(parameter => parameter.Start == 0 ? 1 : Math.Abs(parameter.Start))];
        double[] start = [.. Parameters.Select((parameter, j) => parameter.Start / scales[j])];
        var model = new LevelModel(Make, scales, Readings, cancellation);
        if (Make(model.Values(start)).Run(out string fault, cancellation) is not { } before || LevelFit.Find(model, start) is not { } fit)
            throw new ArgumentOutOfRangeException(null, $"the values at the start make no job: {fault}");
        DrainResult run = model.Run(fit.Scaled)!;
        int left = Readings.Count - Parameters.Count;
        double scatter = Math.Sqrt(fit.Misfit / left);
        Matrix<double>? covariance = fit.IsBounded ? fit.Covariance() * Math.Max(1, scatter * scatter) : null;
        (FinishBand finish, LevelFan? band, int refused) = Band(model, fit, run, Math.Max(1, scatter), cancellation);
        return new ForecastResult
        {
            Study = this,
            IsConverged = fit.IsConverged,
            Estimates = [.. Parameters.Select((parameter, j) => EstimateOf(parameter, fit.Scaled[j] * scales[j],
                covariance is null ? double.PositiveInfinity : Math.Sqrt(covariance[j, j]) * scales[j], left))],
            Correlation = CorrelationOf(covariance),
            ConditionIndex = fit.ConditionIndex,
            Separation = SeparationOf(fit),
            Residuals = [.. Readings.Select(reading => new ReadingResidual(reading, LevelModel.LevelAt(run, reading.Time)))],
            DegreesOfFreedom = left,
            Scatter = scatter,
            Run = run,
            Before = before,
            Finish = finish,
            Band = band,
            RefusedDraws = refused,
            Alternatives = AlternativeSearch.Find(this, fit, scales, run, cancellation),
        };
    }

    private static Separation SeparationOf(LevelFit fit) =>
        !fit.IsBounded || fit.ConditionIndex > 100 ? Separation.NotApart
        : fit.ConditionIndex > 30 ? Separation.Hardly
        : Separation.Apart;

    private static Estimate EstimateOf(FittedParameter parameter, double value, double error, int left)
    {
        double reach = StudentT.InvCDF(0, 1, left, 0.975) * error;
        return new Estimate(parameter, value, error, value - reach, value + reach);
    }

    private double[][] CorrelationOf(Matrix<double>? covariance) => [.. Enumerable.Range(0, Parameters.Count)
        .Select(i => Enumerable.Range(0, Parameters.Count)
            .Select(j => i == j ? 1 : covariance is null ? double.NaN : covariance[i, j] / Math.Sqrt(covariance[i, i] * covariance[j, j]))
            .ToArray())];

    /// <summary>Runs draws from the multivariate t distribution of the estimates.</summary>
    private (FinishBand Finish, LevelFan? Band, int Refused) Band(
        LevelModel model, LevelFit fit, DrainResult best, double widening, CancellationToken cancellation)
    {
        if (SeparationOf(fit) == Separation.NotApart)
            return (new FinishBand(best.StoppedAt, null, null), null, 0);
        var plan = new SamplePlan(SamplingMethod.Sobol, Parameters.Count + 1, Draws, Seed);
        List<LevelTrack> tracks = [];
        List<double> ends = [];
        Runs.Run(0, plan.Count, number => Draw((int)number), (_, drawn) =>
        {
            if (drawn is not { } one)
                return;
            tracks.Add(one.Track);
            ends.Add(one.End);
        }, cancellation);
        if (tracks.Count == 0)
            return (new FinishBand(best.StoppedAt, null, null), null, plan.Count);
        double[] sorted = [.. ends.Order()];
        double low = Percentiles.At(sorted, BandShares[0]), high = Percentiles.At(sorted, BandShares[^1]);
        double latest = Math.Max(best.StoppedAt, Readings[^1].Time);
        double end = Math.Clamp(double.IsFinite(high) ? high : latest, latest, 2 * latest);
        return (new FinishBand(best.StoppedAt, double.IsFinite(low) ? low : null, double.IsFinite(high) ? high : null),
            LevelFan.Of(tracks, 1.02 * end, BandShares), plan.Count - tracks.Count);

        (LevelTrack Track, double End)? Draw(int number)
        {
            Span<double> z = stackalloc double[Parameters.Count + 1];
            plan.Point(number, z);
            int left = Readings.Count - Parameters.Count;
            double tail = widening * Math.Sqrt(left / ChiSquared.InvCDF(left, z[^1]));
            for (int j = 0; j < z.Length - 1; j++)
                z[j] = tail * Normal.InvCDF(0, 1, z[j]);
            if (model.Run(fit.Away(z[..^1])) is not { } run)
                return null;
            bool endsSo = run.Outcome == best.Outcome || run.Outcome is Outcome.Emptied or Outcome.InletUncovered or Outcome.TargetReached;
            return (new LevelTrack(run), endsSo ? run.StoppedAt : double.PositiveInfinity);
        }
    }
}
