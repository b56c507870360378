using DrainSim.Draining;
using DrainSim.Reports.Measures;

namespace DrainSim.Reports;

/// <summary>A run and how it is told: all that its files need.</summary>
public sealed record RunReport
{
    /// <summary>Name of the files, without folder and ending.</summary>
    public required string Name { get; init; }

    /// <summary>What the run found.</summary>
    public required DrainResult Result { get; init; }

    /// <summary>Units for people.</summary>
    public UnitSystem Units { get; init; } = UnitSystem.Metric;

    /// <summary>The clock of the job; null where nobody said when it begins.</summary>
    public Clock? Clock { get; init; }

    /// <summary>The inputs as they were understood, in the scenario's order.</summary>
    public IReadOnlyList<UnderstoodInput> Inputs { get; init; } = [];

    /// <summary>The title of the job, or the name of the files where it has none.</summary>
    public string Title => Result.Job.Title.Length > 0 ? Result.Job.Title : Name;

    internal MeasureFormat Format => new(Units);
}
