namespace DrainSim.Draining;

/// <summary>When a run ends and how finely it is solved.</summary>
public sealed record RunSettings
{
    /// <summary>Longest time to follow the job, s; greater than 0.</summary>
    public double Until { get; init => field = Require.Positive(value, "run time", "s"); } = 30 * 86400.0;

    /// <summary>Level at which the job is done, m; null when there is none.</summary>
    public double? StopAtLevel { get; init; }

    /// <summary>Volume left at which the job is done, m³; null when there is none.</summary>
    public double? StopAtVolume { get; init; }

    /// <summary>Driving head below which the liquid counts as level, m; at least 0.</summary>
    public double SettledWithin { get; init => field = Require.NotNegative(value, "settled_within", "m"); } = 1e-3;

    /// <summary>Interval of the time series, s; null when the report chooses it.</summary>
    public double? ReportEvery
    {
        get;
        init => field = value is { } interval ? Require.Positive(interval, "report interval", "s") : null;
    }

    /// <summary>Relative tolerance of the time integration, 1.</summary>
    public double Tolerance { get; init => field = Require.Within(value, 1e-13, 1e-2, "tolerance", ""); } = 1e-8;
}
