using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Studies.Uncertainty;

namespace DrainSim.Reports.Studies;

/// <summary>An uncertainty study and how it is told: all that its files need.</summary>
public sealed record UncertaintyReport
{
    /// <summary>Name of the files, without folder and ending.</summary>
    public required string Name { get; init; }

    /// <summary>Title for people.</summary>
    public required string Title { get; init; }

    /// <summary>What the study found.</summary>
    public required UncertaintyResult Result { get; init; }

    /// <summary>The job as the scenario stands.</summary>
    public required Job Job { get; init; }

    /// <summary>Units for people.</summary>
    public UnitSystem Units { get; init; } = UnitSystem.Metric;

    /// <summary>The clock of the job; null where it has none.</summary>
    public Clock? Clock { get; init; }

    internal MeasureFormat Format => new(Units);
}
