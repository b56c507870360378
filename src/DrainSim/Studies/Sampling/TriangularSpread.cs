using MathNet.Numerics.Distributions;

namespace DrainSim.Studies.Sampling;

/// <summary>A triangular distribution: limits and a likeliest value by judgement.</summary>
public sealed record TriangularSpread : Spread
{
    /// <param name="least">least value, in the unit of the quantity</param>
    /// <param name="likeliest">likeliest value, from the least to the largest</param>
    /// <param name="most">largest value</param>
    /// <exception cref="ArgumentOutOfRangeException">a value is not finite, or the values do not rise</exception>
    public TriangularSpread(double least, double likeliest, double most)
    {
        Least = Require.Finite(least, "least value", "");
        Likeliest = Require.Finite(likeliest, "likeliest value", "");
        Most = Require.Finite(most, "largest value", "");
        if (!(least <= likeliest && likeliest <= most && least < most))
            throw new ArgumentOutOfRangeException(nameof(most), "the least, the likeliest and the largest value of a triangular spread must rise");
    }

    /// <summary>Least value, in the unit of the quantity.</summary>
    public double Least { get; }

    /// <summary>Likeliest value, in the unit of the quantity.</summary>
    public double Likeliest { get; }

    /// <summary>Largest value, in the unit of the quantity.</summary>
    public double Most { get; }

    /// <inheritdoc/>
    public override double At(double share) => Triangular.InvCDF(Least, Most, Likeliest, share);

    /// <inheritdoc/>
    public override string Text(string unit) =>
        $"triangular({Measure(Least, unit)}, {Measure(Likeliest, unit)}, {Measure(Most, unit)})";
}
