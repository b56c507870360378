using DrainSim.Lines;

namespace DrainSim.Draining;

/// <summary>A line at work: the line, what it discharges into, and how it starts.</summary>
public sealed record DrawOff
{
    /// <summary>The hose or pipe.</summary>
    public required Line Line { get; init; }

    /// <summary>What it discharges into; null for the open air.</summary>
    public Receiver? Receiver { get; init; }

    /// <summary>
    /// Elevation of the liquid's front in the outer leg at the start, m; null for a line that is primed to its outlet. Between
    /// the crest and the outlet: one above the crest stands for the crest, one that the leg never falls to for the outlet.
    /// </summary>
    public double? Front { get; init => field = value is { } front ? Require.Finite(front, "front elevation", "m") : null; }
}
