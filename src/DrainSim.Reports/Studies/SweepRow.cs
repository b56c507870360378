namespace DrainSim.Reports.Studies;

/// <summary>What people are told of one case of a sweep.</summary>
public sealed record SweepRow
{
    /// <summary>Number of the case, from 1.</summary>
    public required long Case { get; init; }

    /// <summary>The values of the parameters as they stand in the table.</summary>
    public required IReadOnlyList<string> Parameters { get; init; }

    /// <summary>Code of the outcome; <see cref="SweepTable.Impossible"/> where the values make the case impossible.</summary>
    public required string Outcome { get; init; }

    /// <summary>Why it never started, or why it is impossible; empty otherwise.</summary>
    public required string Reason { get; init; }

    /// <summary>The time that the job took, s; null when it was not done.</summary>
    public double? DrainTime { get; init; }

    /// <summary>Volume left, m³; null for an impossible case.</summary>
    public double? LeftVolume { get; init; }

    /// <summary>Least margin at the low point, Pa; null where there was no run.</summary>
    public double? LeastMargin { get; init; }

    /// <summary>The limits that it broke, as codes with blanks between; empty where it kept all.</summary>
    public string LimitsBroken { get; init; } = "";
}
