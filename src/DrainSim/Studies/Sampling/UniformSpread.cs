using MathNet.Numerics.Distributions;

namespace DrainSim.Studies.Sampling;

/// <summary>A uniform distribution: limits alone are known, such as a tolerance.</summary>
public sealed record UniformSpread : Spread
{
    /// <param name="least">least value, in the unit of the quantity</param>
    /// <param name="most">largest value</param>
    /// <exception cref="ArgumentOutOfRangeException">a value is not finite, or the largest is not above the least</exception>
    public UniformSpread(double least, double most)
    {
        Least = Require.Finite(least, "least value", "");
        Most = Require.Finite(most, "largest value", "");
        if (!(least < most))
            throw new ArgumentOutOfRangeException(nameof(most), "the least value of a uniform spread must lie below the largest");
    }

    /// <summary>Least value, in the unit of the quantity.</summary>
    public double Least { get; }

    /// <summary>Largest value, in the unit of the quantity.</summary>
    public double Most { get; }

    /// <inheritdoc/>
    public override double At(double share) => ContinuousUniform.InvCDF(Least, Most, share);

    /// <inheritdoc/>
    public override string Text(string unit) => $"uniform({Measure(Least, unit)}, {Measure(Most, unit)})";
}
