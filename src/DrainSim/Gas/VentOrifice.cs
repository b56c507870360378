namespace DrainSim.Gas;

/// <summary>An open hole or short nozzle, with gas going either way.</summary>
public sealed record VentOrifice : Opening
{
    /// <summary>Discharge coefficient of a sharp edge where none is given, 1; common practice.</summary>
    public const double SharpEdge = 0.61;

    /// <summary>Discharge coefficient Cd, 1; greater than 0, at most 1.</summary>
    public double DischargeCoefficient
    {
        get;
        init => field = Require.Within(Require.Positive(value, "discharge coefficient", ""), 0, 1, "discharge coefficient", "");
    } = SharpEdge;

    /// <inheritdoc/>
    public override double MassFlow(double pressure, in Surroundings outside, out double slope) =>
        OrificeFlow(pressure, outside, DischargeCoefficient, out slope);
}
