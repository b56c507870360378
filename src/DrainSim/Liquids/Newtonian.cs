namespace DrainSim.Liquids;

/// <summary>Stress in proportion to the shear rate: τ = μ·γ̇, with the liquid's own viscosity.</summary>
public sealed record Newtonian : Rheology
{
    /// <inheritdoc/>
    public override FlowCurve Curve(double viscosity) => new(0, viscosity, 1);
}
