using DrainSim.Draining;
using DrainSim.Reports.Measures;

namespace DrainSim.Reports.Studies;

/// <summary>A sweep and how it is told: all that its picture needs.</summary>
public sealed record SweepReport
{
    /// <summary>Title of the job.</summary>
    public required string Title { get; init; }

    /// <summary>Number of cases.</summary>
    public required long Count { get; init; }

    /// <summary>The parameters.</summary>
    public required IReadOnlyList<SweepAxis> Axes { get; init; }

    /// <summary>The cases, or an even choice of them, in their order.</summary>
    public required IReadOnlyList<SweepPoint> Points { get; init; }

    /// <summary>The courses of the runs by name, where they are few; empty otherwise.</summary>
    public IReadOnlyList<(string Name, DrainResult Result)> Courses { get; init; } = [];

    /// <summary>Value of the drain time that is asked for, s; null where none is.</summary>
    public double? TargetTime { get; init; }

    /// <summary>Value of the margin that is asked for, Pa; null where none is.</summary>
    public double? TargetMargin { get; init; }

    /// <summary>Values of the one parameter that are worth naming, in the axis's unit; those found stand out.</summary>
    public IReadOnlyList<(double Value, string Name, bool IsFound)> Marks { get; init; } = [];

    /// <summary>Units for people.</summary>
    public UnitSystem Units { get; init; } = UnitSystem.Metric;

    /// <summary>What the sweep found, in a line or two.</summary>
    public required string Subtitle { get; init; }
}
