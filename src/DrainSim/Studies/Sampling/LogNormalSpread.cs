using MathNet.Numerics.Distributions;

namespace DrainSim.Studies.Sampling;

/// <summary>A lognormal distribution: quantities that are known to a factor and cannot be negative.</summary>
public sealed record LogNormalSpread : Spread
{
    /// <summary>Median, in the unit of the quantity; greater than 0.</summary>
    public required double Median { get; init => field = Require.Positive(value, "median", ""); }

    /// <summary>Standard deviation of the natural logarithm, 1; greater than 0. For a small one it is the relative standard deviation.</summary>
    public required double LogDeviation { get; init => field = Require.Positive(value, "standard deviation of the logarithm", ""); }

    /// <inheritdoc/>
    public override double At(double share) => LogNormal.InvCDF(Math.Log(Median), LogDeviation, share);

    /// <inheritdoc/>
    public override string Text(string unit) => $"lognormal({Measure(Median, unit)}, {Measure(LogDeviation, "")})";
}
