using DrainSim.Studies.Sampling;

namespace DrainSim.Tests.Studies.Sampling;

/// <summary>The distributions against their closed forms.</summary>
public sealed class SpreadTests
{
    /// <summary>Φ(1.6448536269514722) = 0.95, as tables of the normal distribution print it.</summary>
    private const double Z95 = 1.6448536269514722;

    [Fact]
    public void The_95th_percentiles_are_those_of_the_closed_forms()
    {
        Assert.Equal(2.6 + Z95 * 0.01, new NormalSpread { Mean = 2.6, Deviation = 0.01 }.At(0.95), 1e-12);
        Assert.Equal(0.038 * Math.Exp(Z95 * 0.1), new LogNormalSpread { Median = 0.038, LogDeviation = 0.1 }.At(0.95), 1e-12);
        Assert.Equal(1 + 0.95 * 2, new UniformSpread(1, 3).At(0.95), 1e-12);
        Assert.Equal(3 - Math.Sqrt(0.05 * 2 * 1.5), new TriangularSpread(1, 1.5, 3).At(0.95), 1e-12);
    }

    [Fact]
    public void Impossible_spreads_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new NormalSpread { Mean = 1, Deviation = 0 });
        Assert.Throws<ArgumentOutOfRangeException>(() => new LogNormalSpread { Median = -1, LogDeviation = 0.1 });
        Assert.Throws<ArgumentOutOfRangeException>(() => new UniformSpread(3, 3));
        Assert.Throws<ArgumentOutOfRangeException>(() => new TriangularSpread(1, 4, 3));
        Assert.Throws<ArgumentOutOfRangeException>(() => new UniformSpread(double.NaN, 3));
    }
}
