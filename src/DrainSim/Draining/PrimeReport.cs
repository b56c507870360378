namespace DrainSim.Draining;

/// <summary>What a siphon needs before it runs.</summary>
/// <param name="LineVolume">volume of liquid that fills the line, m³</param>
/// <param name="InnerLegVolume">of it, between the inlet and the crest, m³</param>
/// <param name="OuterLegVolume">of it, between the crest and the outlet, m³</param>
/// <param name="FrontElevation">elevation below which the front in the outer leg must stand for the line to run by itself, m</param>
/// <param name="StaticLift">crest above the level, m; negative where the crest is flooded</param>
/// <param name="LiftLimit">highest column that the atmosphere holds over the vapour or least pressure, m</param>
/// <param name="Suction">vacuum at the outlet end that lifts the liquid over the crest, Pa below atmosphere</param>
/// <param name="Front">elevation of the front at the start, m; null for a line that is primed to its outlet</param>
/// <param name="DipFills">
/// how often a hose is filled by hand until it runs by itself: each time it is pushed under down to the inlet, capped and drawn
/// out over the rim, and so gains a length equal to the depth of liquid over the inlet; common practice, no source. Null for a
/// bore above 50 mm or an inlet that is not covered
/// </param>
public sealed record PrimeReport(
    double LineVolume,
    double InnerLegVolume,
    double OuterLegVolume,
    double FrontElevation,
    double StaticLift,
    double LiftLimit,
    double Suction,
    double? Front = null,
    int? DipFills = null);
