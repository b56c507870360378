using DrainSim.Draining;

namespace DrainSim.Studies.Forecasting;

/// <summary>The readings as a model sees them: levels over their uncertainties, as a function of scaled parameters.</summary>
/// <param name="make">makes the job of a set of values in SI</param>
/// <param name="scales">one of each scaled parameter in SI</param>
/// <param name="readings">the readings, in time order</param>
/// <param name="cancellation">ends a run</param>
internal sealed class LevelModel(
    Func<IReadOnlyList<double>, CaseJob> make, double[] scales, IReadOnlyList<LevelReading> readings, CancellationToken cancellation)
{
    /// <summary>
    /// Step of the central differences, of a scaled parameter: the noise of a run, 1e-8, over it and its square are of
    /// one size in the derivative, 1e-5 of it.
    /// </summary>
    private const double Step = 1e-3;

    /// <summary>Number of parameters.</summary>
    public int Count => scales.Length;

    /// <summary>The readings over their uncertainties.</summary>
    public double[] Observed { get; } = [.. readings.Select(reading => reading.Level / reading.Uncertainty)];

    /// <summary>The values in SI of scaled ones.</summary>
    public double[] Values(ReadOnlySpan<double> scaled)
    {
        double[] values = new double[scaled.Length];
        for (int j = 0; j < values.Length; j++)
            values[j] = scaled[j] * scales[j];
        return values;
    }

    /// <summary>The run of scaled parameters; null when they make no job.</summary>
    public DrainResult? Run(ReadOnlySpan<double> scaled) =>
        make(Values(scaled)).Run(out _, cancellation);

    /// <summary>What the model says of each reading; null when the parameters make no job.</summary>
    public double[]? Predict(ReadOnlySpan<double> scaled) =>
        Run(scaled) is { } run ? [.. readings.Select(reading => LevelAt(run, reading.Time) / reading.Uncertainty)] : null;

    /// <summary>Sum of the squared standardised residuals.</summary>
    /// <param name="predicted">what the model says of each reading</param>
    public double Misfit(double[] predicted)
    {
        double sum = 0;
        for (int i = 0; i < predicted.Length; i++)
            sum += (Observed[i] - predicted[i]) * (Observed[i] - predicted[i]);
        return sum;
    }

    /// <summary>
    /// Derivatives of the predictions, reading by parameter: central differences, one-sided beside values that make no
    /// job, 0 where neither side makes one.
    /// </summary>
    public double[,] Jacobian(ReadOnlySpan<double> scaled)
    {
        double[,] jacobian = new double[Observed.Length, Count];
        double[] moved = scaled.ToArray();
        for (int j = 0; j < Count; j++)
        {
            double h = Step * Math.Max(Math.Abs(scaled[j]), 0.1);
            moved[j] = scaled[j] + h;
            double[]? above = Predict(moved);
            moved[j] = scaled[j] - h;
            double[]? below = Predict(moved);
            moved[j] = scaled[j];
            double[]? here = above is null || below is null ? Predict(scaled) : null;
            double width = above is null || below is null ? h : 2 * h;
            if ((above ?? here) is not { } high || (below ?? here) is not { } low)
                continue;
            for (int i = 0; i < high.Length; i++)
                jacobian[i, j] = (high[i] - low[i]) / width;
        }

        return jacobian;
    }

    /// <summary>The level of a run at a time, m; the last one after its end.</summary>
    public static double LevelAt(DrainResult run, double time) =>
        time < run.Trace.End ? run.Job.Vessel.Level(run.Trace.VolumeAt(time)) : run.FinalLevel;
}
