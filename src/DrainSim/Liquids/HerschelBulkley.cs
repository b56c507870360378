namespace DrainSim.Liquids;

/// <summary>A liquid with a yield stress that thins or thickens under shear above it: τ = τ_y + K·γ̇^n.</summary>
public sealed record HerschelBulkley : Rheology
{
    /// <summary>τ_y, Pa; at least 0.</summary>
    public required double YieldStress { get; init => field = Require.NotNegative(value, "yield stress", "Pa"); }

    /// <summary>K, Pa·s^n; greater than 0.</summary>
    public required double Consistency { get; init => field = Require.Positive(value, "consistency", "Pa.s^n"); }

    /// <summary>n, 1; from <see cref="Rheology.LeastFlowIndex"/> to <see cref="Rheology.LargestFlowIndex"/>.</summary>
    public required double FlowIndex { get; init => field = FlowIndexOf(value); }

    /// <inheritdoc/>
    public override FlowCurve Curve(double viscosity) => new(YieldStress, Consistency, FlowIndex);
}
