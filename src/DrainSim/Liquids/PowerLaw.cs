namespace DrainSim.Liquids;

/// <summary>A liquid without a yield stress that thins or thickens under shear: τ = K·γ̇^n.</summary>
public sealed record PowerLaw : Rheology
{
    /// <summary>K, Pa·s^n; greater than 0.</summary>
    public required double Consistency { get; init => field = Require.Positive(value, "consistency", "Pa.s^n"); }

    /// <summary>n, 1; from <see cref="Rheology.LeastFlowIndex"/> to <see cref="Rheology.LargestFlowIndex"/>.</summary>
    public required double FlowIndex { get; init => field = FlowIndexOf(value); }

    /// <inheritdoc/>
    public override FlowCurve Curve(double viscosity) => new(0, Consistency, FlowIndex);
}
