using MathNet.Numerics.Distributions;
using MathNet.Numerics.LinearAlgebra;

namespace DrainSim.Studies.Sampling;

/// <summary>Bends independent points of the unit cube so that their coordinates go together.</summary>
/// <remarks>
/// A Gaussian copula: z = Φ⁻¹(u), z' = L·z with L·Lᵀ the correlation of the normals, u' = Φ(z'). The normals that have
/// Spearman's ρs have Pearson's ρ = 2·sin(π·ρs/6) (K. Pearson, 1907). Every single coordinate stays uniform; the
/// strips of a Latin hypercube are kept exactly for the first parameter of a group alone.
/// </remarks>
public sealed class GaussianCopula
{
    /// <summary>Farthest that a coordinate comes to 0 or 1.</summary>
    private const double Edge = 1e-15;

    private readonly double[,] factor;

    /// <summary>Draws a copula up.</summary>
    /// <param name="dimensions">number of parameters</param>
    /// <param name="correlations">the pairs that go together; all others are independent</param>
    /// <exception cref="ArgumentOutOfRangeException">a pair or a coefficient is impossible, or the pairs contradict each other</exception>
    public GaussianCopula(int dimensions, IReadOnlyList<RankCorrelation> correlations)
    {
        ArgumentNullException.ThrowIfNull(correlations);
        Matrix<double> matrix = Matrix<double>.Build.DenseIdentity(dimensions);
        foreach ((int i, int j, double coefficient) in correlations)
        {
            if (i == j || Math.Min(i, j) < 0 || Math.Max(i, j) >= dimensions)
                throw new ArgumentOutOfRangeException(nameof(correlations), "a correlation stands between two different parameters of the study");
            if (!(Math.Abs(coefficient) < 1))
                throw new ArgumentOutOfRangeException(nameof(correlations), "a rank correlation must lie strictly between -1 and 1");
            matrix[i, j] = matrix[j, i] = 2 * Math.Sin(Math.PI * coefficient / 6);
        }

        factor = FactorOf(matrix);
    }

    /// <summary>Bends a point in place.</summary>
    public void Bend(Span<double> point)
    {
        Span<double> z = stackalloc double[point.Length];
        for (int i = 0; i < point.Length; i++)
            z[i] = Normal.InvCDF(0, 1, point[i]);
        for (int i = 0; i < point.Length; i++)
        {
            double sum = 0;
            for (int j = 0; j <= i; j++)
                sum += factor[i, j] * z[j];
            point[i] = Math.Clamp(Normal.CDF(0, 1, sum), Edge, 1 - Edge);
        }
    }

    private static double[,] FactorOf(Matrix<double> matrix)
    {
        try
        {
            return matrix.Cholesky().Factor.ToArray();
        }
        catch (ArgumentException)
        {
            throw new ArgumentOutOfRangeException(nameof(matrix),
                "the correlations contradict each other: no set of parameters can have all of them (their matrix is not positive definite)");
        }
    }
}
