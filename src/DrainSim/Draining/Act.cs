namespace DrainSim.Draining;

/// <summary>Something done during the job: from then on the plant is another one.</summary>
/// <remarks>
/// The contents stay where they are: of <see cref="After"/> only the plant is taken (lines, valves, inflow,
/// headspace openings, receiving surfaces), not the levels.
/// </remarks>
public sealed record Act
{
    /// <summary>When, s since the start; null where a level calls for it.</summary>
    public double? Time { get; init => field = value is { } time ? Require.NotNegative(time, "act time", "s") : null; }

    /// <summary>Level in the tank that calls for it, m; null where a time does.</summary>
    public double? Level { get; init => field = value is { } level ? Require.NotNegative(level, "act level", "m") : null; }

    /// <summary>The job as it is from then on; it has as many lines as before and no timeline of its own.</summary>
    public required Job After { get; init; }

    /// <summary>What is done, for people.</summary>
    public required string Text { get; init; }
}
