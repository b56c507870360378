using MathNet.Numerics;
using MathNet.Numerics.Distributions;
using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.Statistics;

namespace DrainSim.Studies.Uncertainty;

/// <summary>How much of the spread of a result each parameter explains.</summary>
/// <remarks>
/// Values are replaced by their normal scores Φ⁻¹((rank − ½)/n), as of B. L. van der Waerden (1952), and the result's are regressed on the
/// parameters'. The explained part R² is shared out by averaging, over all orders in which the parameters can enter, what
/// each adds (R. H. Lindeman, P. F. Merenda, R. Z. Gold 1980; U. Grömping, J. Stat. Softw. 17 (2006) 1): the shares add up to
/// R² also for parameters that go together. For independent ones they are the squared standardised regression coefficients (A.
/// Saltelli et al., Sensitivity Analysis, 2000). They tell of rising and falling effects alone; what a bend or an
/// interplay does is in the rest, 1 − R².
/// </remarks>
public sealed record SpreadShares
{
    /// <summary>Spread beneath which a result counts as constant, relative to its size: the accuracy of a run.</summary>
    private const double Constant = 1e-7;

    /// <summary>Share of the spread of the scores for each parameter, in their order, 1.</summary>
    public required IReadOnlyList<double> Shares { get; init; }

    /// <summary>What all of them explain together: R² of the regression, 1.</summary>
    public required double Explained { get; init; }

    /// <summary>Shares the spread of a result out; null where it does not vary.</summary>
    /// <param name="parameters">the values of each parameter, run by run</param>
    /// <param name="result">the result, run by run; positive infinity ranks last</param>
    internal static SpreadShares? Of(IReadOnlyList<double[]> parameters, double[] result)
    {
        double[] ranked = [.. result.Select(value => Math.Min(value, double.MaxValue))];
        double size = ranked.Max(Math.Abs);
        if (ranked.Max() - ranked.Min() <= Constant * size)
            return null;
        Matrix<double> r = Correlation.PearsonMatrix(parameters.Append(ranked).Select(Scores));
        int count = parameters.Count;
        double[] explained = [.. Enumerable.Range(0, 1 << count).Select(set => Explains(r, set, count))];
        return new SpreadShares
        {
            Explained = explained[^1],
            Shares = [.. Enumerable.Range(0, count).Select(j => Share(explained, j, count))],
        };
    }

    private static double[] Scores(double[] values)
    {
        double[] ranks = ArrayStatistics.RanksInplace((double[])values.Clone(), RankDefinition.Average);
        return [.. ranks.Select(rank => Normal.InvCDF(0, 1, (rank - 0.5) / ranks.Length))];
    }

    /// <summary>R² of the regression on a set of parameters, given as bits.</summary>
    private static double Explains(Matrix<double> r, int set, int count)
    {
        int[] chosen = [.. Enumerable.Range(0, count).Where(j => (set >> j & 1) != 0)];
        if (chosen.Length == 0)
            return 0;
        Matrix<double> among = Matrix<double>.Build.Dense(chosen.Length, chosen.Length, (i, j) => r[chosen[i], chosen[j]]);
        Vector<double> with = Vector<double>.Build.Dense(chosen.Length, i => r[chosen[i], count]);
        return Math.Clamp(with.DotProduct(among.Cholesky().Solve(with)), 0, 1);
    }

    /// <summary>What a parameter adds, averaged over all orders of entry.</summary>
    private static double Share(double[] explained, int parameter, int count)
    {
        double share = 0;
        for (int set = 0; set < explained.Length; set++)
        {
            if ((set >> parameter & 1) != 0)
                continue;
            int size = System.Numerics.BitOperations.PopCount((uint)set);
            double orders = SpecialFunctions.Factorial(size)
                * SpecialFunctions.Factorial(count - size - 1) / SpecialFunctions.Factorial(count);
            share += orders * (explained[set | 1 << parameter] - explained[set]);
        }

        return share;
    }
}
