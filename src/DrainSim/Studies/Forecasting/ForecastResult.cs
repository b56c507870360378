using DrainSim.Draining;
using DrainSim.Studies.Uncertainty;

namespace DrainSim.Studies.Forecasting;

/// <summary>What the readings say, and what follows from them.</summary>
public sealed record ForecastResult
{
    /// <summary>The study.</summary>
    public required ForecastStudy Study { get; init; }

    /// <summary>Whether the search came to rest; if not, the values are the best that it met.</summary>
    public required bool IsConverged { get; init; }

    /// <summary>The fitted parameters, in their order.</summary>
    public required IReadOnlyList<Estimate> Estimates { get; init; }

    /// <summary>Correlation of the estimates, row by row, 1.</summary>
    public required IReadOnlyList<IReadOnlyList<double>> Correlation { get; init; }

    /// <summary>Whether the readings tell the parameters apart.</summary>
    public required Separation Separation { get; init; }

    /// <summary>The condition index behind <see cref="Separation"/>, 1; infinite where a parameter has no effect.</summary>
    public required double ConditionIndex { get; init; }

    /// <summary>The readings beside the curve, in time order.</summary>
    public required IReadOnlyList<ReadingResidual> Residuals { get; init; }

    /// <summary>Readings less parameters.</summary>
    public required int DegreesOfFreedom { get; init; }

    /// <summary>
    /// Scatter of the readings about the curve in standard uncertainties of the instrument, 1. Above 1 the errors of the
    /// estimates are widened by it; below 1 they stay those of the instrument.
    /// </summary>
    public required double Scatter { get; init; }

    /// <summary>Root mean square of the residuals, m.</summary>
    public double RootMeanSquare => Math.Sqrt(Residuals.Average(one => one.Residual * one.Residual));

    /// <summary>The run with the values that fit best.</summary>
    public required DrainResult Run { get; init; }

    /// <summary>The run as the scenario stood.</summary>
    public required DrainResult Before { get; init; }

    /// <summary>When the job will be over.</summary>
    public required FinishBand Finish { get; init; }

    /// <summary>The 95 % band of the level over time, at the shares 0.025, 0.5 and 0.975; null where the readings do not bound it.</summary>
    public LevelFan? Band { get; init; }

    /// <summary>Values drawn for the band that made no job and were left out.</summary>
    public required int RefusedDraws { get; init; }

    /// <summary>Other explanations; empty where there are too few readings to judge one.</summary>
    public required IReadOnlyList<Alternative> Alternatives { get; init; }
}
