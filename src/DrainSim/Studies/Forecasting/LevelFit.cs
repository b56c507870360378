using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.LinearAlgebra.Factorization;
using MathNet.Numerics.Optimization;

namespace DrainSim.Studies.Forecasting;

/// <summary>The scaled parameters that fit the readings best, and how sharply.</summary>
internal sealed class LevelFit
{
    /// <summary>Ratio of singular values beneath which a direction counts as not seen by the readings.</summary>
    private const double Unseen = 1e-10;

    private const int MostSteps = 100;

    /// <summary>Singular values and directions of the sensitivities at the optimum.</summary>
    private readonly Svd<double> svd;

    private LevelFit(LevelModel model, double[] scaled, double misfit, bool isConverged)
    {
        (Scaled, Misfit, IsConverged) = (scaled, misfit, isConverged);
        Matrix<double> jacobian = Matrix<double>.Build.DenseOfArray(model.Jacobian(scaled));
        svd = jacobian.Svd();
        ConditionIndex = jacobian.ColumnNorms(2).Any(norm => norm == 0)
            ? double.PositiveInfinity
            : jacobian.NormalizeColumns(2).Svd(computeVectors: false).ConditionNumber;
        IsBounded = double.IsFinite(ConditionIndex) && svd.S[^1] > Unseen * svd.S[0];
    }

    /// <summary>The best scaled parameters.</summary>
    public double[] Scaled { get; }

    /// <summary>Sum of the squared standardised residuals.</summary>
    public double Misfit { get; }

    /// <summary>Whether the search came to rest.</summary>
    public bool IsConverged { get; }

    /// <summary>Condition index of the sensitivities, each column scaled to length 1.</summary>
    public double ConditionIndex { get; }

    /// <summary>Whether the readings bound every combination of the parameters.</summary>
    public bool IsBounded { get; }

    /// <summary>Searches from a start; null when the start makes no job.</summary>
    /// <remarks>
    /// Levenberg–Marquardt on standardised residuals. Values that make no job are given a misfit far beyond any other, so that the
    /// search turns back from them.
    /// </remarks>
    public static LevelFit? Find(LevelModel model, double[] start)
    {
        if (model.Predict(start) is not { } first)
            return null;
        double far = 1e3 * (first.Concat(model.Observed).Max(Math.Abs) + 1);
        (double[] best, double least) = (start, model.Misfit(first));
        IObjectiveModel objective = ObjectiveFunction.NonlinearModel(
            (Vector<double> p, Vector<double> x) => Predict(p.ToArray()),
            (Vector<double> p, Vector<double> x) => Matrix<double>.Build.DenseOfArray(model.Jacobian(p.ToArray())),
            Vector<double>.Build.Dense(first.Length, i => i), Vector<double>.Build.Dense(model.Observed));
        var minimizer = new LevenbergMarquardtMinimizer(
            gradientTolerance: 1e-12, stepTolerance: 1e-9, functionTolerance: 1e-12, maximumIterations: MostSteps);
        NonlinearMinimizationResult result = minimizer.FindMinimum(objective, Vector<double>.Build.Dense((double[])start.Clone()));
        return new LevelFit(model, best, least,
            result.ReasonForExit is not (ExitCondition.InvalidValues or ExitCondition.ExceedIterations));

        // The minimizer ends at the point that it looked at last, which is not always the best.
        Vector<double> Predict(double[] scaled)
        {
            if (model.Predict(scaled) is not { } predicted)
                return Vector<double>.Build.Dense(first.Length, far);
            double misfit = model.Misfit(predicted);
            if (misfit < least)
                (best, least) = (scaled, misfit);
            return Vector<double>.Build.Dense(predicted);
        }
    }

    /// <summary>Covariance of the scaled parameters where the readings have standard uncertainty 1.</summary>
    public Matrix<double> Covariance()
    {
        Matrix<double> directions = svd.VT.Transpose() * Matrix<double>.Build.DenseOfDiagonalArray([.. svd.S.Select(s => 1 / s)]);
        return directions * directions.Transpose();
    }

    /// <summary>Parameters away from the best ones by independent standard deviates along the singular directions.</summary>
    public double[] Away(ReadOnlySpan<double> deviates)
    {
        double[] scaled = (double[])Scaled.Clone();
        for (int k = 0; k < scaled.Length; k++)
        {
            for (int j = 0; j < scaled.Length; j++)
                scaled[j] += svd.VT[k, j] * deviates[k] / svd.S[k];
        }

        return scaled;
    }
}
