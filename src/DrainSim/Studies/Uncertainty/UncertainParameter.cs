using DrainSim.Studies.Sampling;

namespace DrainSim.Studies.Uncertainty;

/// <summary>A number of a job that is not known to the last digit.</summary>
/// <param name="Path">its dotted path, or any name that tells it apart</param>
/// <param name="Unit">SI unit of its values; empty for a pure number</param>
/// <param name="Spread">how it may lie, in that unit</param>
public sealed record UncertainParameter(string Path, string Unit, Spread Spread)
{
    /// <summary>Where the spread comes from: a source, common practice, or null where it was given.</summary>
    public string? Source { get; init; }
}
