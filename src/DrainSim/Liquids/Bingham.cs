namespace DrainSim.Liquids;

/// <summary>A liquid that stands still below its yield stress and flows in proportion above it: τ = τ_y + μ_p·γ̇.</summary>
public sealed record Bingham : Rheology
{
    /// <summary>τ_y, Pa; at least 0.</summary>
    public required double YieldStress { get; init => field = Require.NotNegative(value, "yield stress", "Pa"); }

    /// <summary>μ_p, Pa·s; greater than 0.</summary>
    public required double PlasticViscosity { get; init => field = Require.Positive(value, "plastic viscosity", "Pa.s"); }

    /// <inheritdoc/>
    public override FlowCurve Curve(double viscosity) => new(YieldStress, PlasticViscosity, 1);
}
