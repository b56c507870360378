using DrainSim.Lines;

namespace DrainSim.Scenarios.Reading;

/// <summary>A path with what is known of its elevations.</summary>
/// <param name="Items">the items in order</param>
/// <param name="NeedsRoughness">whether a straight run has no roughness of its own</param>
/// <param name="Crest">highest elevation on the path, m</param>
internal sealed record LinePath(IReadOnlyList<PathItem> Items, bool NeedsRoughness, double Crest);
