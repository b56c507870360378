namespace DrainSim.Draining;

/// <summary>What would let a stopped job go on, solved for and proved by running the changed job.</summary>
/// <param name="Kind">what is changed</param>
/// <param name="Change">
/// by how much: m lower or higher, the loss coefficient K to add at the outlet, 1, the bore of the vent to add, m, or the share
/// of the inflow to take away, 1
/// </param>
/// <param name="Value">
/// what it is then: elevation, m, the added loss coefficient, 1, the bore, m, the largest inflow, m³/s, or the depth at the
/// brim, m
/// </param>
/// <param name="ProvedOutcome">how the changed job ended when it was run</param>
/// <param name="ProvedTime">when it ended, s</param>
/// <param name="ProvedLevel">level it left, m</param>
public sealed record Remedy(
    RemedyKind Kind, double Change, double Value, Outcome ProvedOutcome, double ProvedTime, double ProvedLevel);
