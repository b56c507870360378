using MathNet.Numerics.Distributions;

namespace DrainSim.Studies.Sampling;

/// <summary>A normal distribution: errors of measurement.</summary>
public sealed record NormalSpread : Spread
{
    /// <summary>Mean, in the unit of the quantity.</summary>
    public required double Mean { get; init => field = Require.Finite(value, "mean", ""); }

    /// <summary>Standard deviation, in the unit of the quantity; greater than 0.</summary>
    public required double Deviation { get; init => field = Require.Positive(value, "standard deviation", ""); }

    /// <inheritdoc/>
    public override double At(double share) => Normal.InvCDF(Mean, Deviation, share);

    /// <inheritdoc/>
    public override string Text(string unit) => $"normal({Measure(Mean, unit)}, {Measure(Deviation, unit)})";
}
