namespace DrainSim.Liquids;

/// <summary>A liquid at one temperature: the numbers that a run needs.</summary>
public sealed record Liquid
{
    /// <summary>Name for people.</summary>
    public required string Name { get; init; }

    /// <summary>Temperature, K; 293.15 where the liquid is given by numbers alone.</summary>
    public double Temperature { get; init => field = Require.Positive(value, "liquid temperature", "K"); } = 293.15;

    /// <summary>Density, kg/m³; greater than 0.</summary>
    public required double Density { get; init => field = Require.Positive(value, "density", "kg/m3"); }

    /// <summary>
    /// Dynamic viscosity, Pa·s; greater than 0. Of a liquid that is not Newtonian it is the apparent one at some shear rate,
    /// for people: the friction follows <see cref="FlowCurve"/>.
    /// </summary>
    public required double Viscosity { get; init => field = Require.Positive(value, "viscosity", "Pa.s"); }

    /// <summary>How it answers to shear.</summary>
    public Rheology Rheology { get; init; } = new Newtonian();

    /// <summary>Shear stress over shear rate.</summary>
    public FlowCurve FlowCurve => Rheology.Curve(Viscosity);

    /// <summary>Vapour pressure, Pa absolute; 0 for a liquid that does not evaporate.</summary>
    public required double VapourPressure { get; init => field = Require.NotNegative(value, "vapour pressure", "Pa"); }

    /// <summary>What the liquid can do to people and places.</summary>
    public LiquidHazards Hazards { get; init; } = LiquidHazards.None;
}
