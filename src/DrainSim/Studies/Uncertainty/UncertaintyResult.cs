namespace DrainSim.Studies.Uncertainty;

/// <summary>What an uncertainty study found.</summary>
public sealed record UncertaintyResult
{
    /// <summary>The study.</summary>
    public required UncertaintyStudy Study { get; init; }

    /// <summary>Number of runs, those without a job included.</summary>
    public required int Count { get; init; }

    /// <summary>Samples whose values make no job, such as a hose too short for its climb; they count in nothing else.</summary>
    public required int Refused { get; init; }

    /// <summary>Why the first of them makes none; null where all do.</summary>
    public string? FirstFault { get; init; }

    /// <summary>How the runs ended, the most frequent first.</summary>
    public required IReadOnlyList<OutcomeChance> Outcomes { get; init; }

    /// <summary>How often each bound of the job was kept; empty where it has none.</summary>
    public required IReadOnlyList<LimitChance> Limits { get; init; }

    /// <summary>How often all bounds were kept at once; null where the job has none.</summary>
    public Chance? AllLimits { get; init; }

    /// <summary>Percentiles of the drain time over all runs, s: a job that is not done takes for ever.</summary>
    public required IReadOnlyList<Percentile> DrainTime { get; init; }

    /// <summary>Percentiles of the volume left in the tank, m³.</summary>
    public required IReadOnlyList<Percentile> LeftVolume { get; init; }

    /// <summary>What explains the spread of the drain time; null where it does not vary.</summary>
    public SpreadShares? DrainTimeShares { get; init; }

    /// <summary>What explains the spread of the volume left; null where it does not vary.</summary>
    public SpreadShares? LeftVolumeShares { get; init; }

    /// <summary>The level over time, at the shares of <see cref="Percentiles.Shares"/>.</summary>
    public required LevelFan Fan { get; init; }
}
