using MathNet.Numerics.Distributions;

namespace DrainSim.Studies.Uncertainty;

/// <summary>How often something happened among the runs, and how sure that is.</summary>
/// <remarks>
/// The interval is that of C. J. Clopper, E. S. Pearson, Biometrika 26 (1934) 404–413, for independent draws. The
/// points of a study lie more evenly than independent ones, so that the interval errs on the wide side.
/// </remarks>
/// <param name="Count">number of runs in which it happened</param>
/// <param name="Of">number of runs; greater than 0</param>
public readonly record struct Chance(int Count, int Of)
{
    /// <summary>Share of the runs, 1.</summary>
    public double Share => (double)Count / Of;

    /// <summary>Lower end of the 95 % interval, 1.</summary>
    public double Low => Count == 0 ? 0 : Beta.InvCDF(Count, Of - Count + 1, 0.025);

    /// <summary>Upper end of the 95 % interval, 1.</summary>
    public double High => Count == Of ? 1 : Beta.InvCDF(Count + 1, Of - Count, 0.975);
}
