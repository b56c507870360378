namespace DrainSim.Integration;

/// <summary>A few linear equations, solved for many right-hand sides by Gauss's elimination with row exchange.</summary>
/// <remarks>In place, in its own buffers: MathNet's factors are made anew for every matrix.</remarks>
internal sealed class LinearEquations(int count)
{
    private readonly double[] factors = new double[count * count];
    private readonly int[] pivots = new int[count];

    /// <summary>Takes over a matrix, row by row, in factors; false when it is singular or not finite.</summary>
    public bool Factor(ReadOnlySpan<double> matrix)
    {
        matrix.CopyTo(factors);
        for (int k = 0; k < count; k++)
        {
            int pivot = k;
            for (int i = k + 1; i < count; i++)
            {
                if (Math.Abs(factors[i * count + k]) > Math.Abs(factors[pivot * count + k]))
                    pivot = i;
            }
            pivots[k] = pivot;
            double divisor = factors[pivot * count + k];
            if (divisor == 0 || !double.IsFinite(divisor))
                return false;
            for (int j = 0; j < count && pivot != k; j++)
                (factors[k * count + j], factors[pivot * count + j]) = (factors[pivot * count + j], factors[k * count + j]);
            for (int i = k + 1; i < count; i++)
            {
                double share = factors[i * count + k] /= divisor;
                for (int j = k + 1; j < count; j++)
                    factors[i * count + j] -= share * factors[k * count + j];
            }
        }
        return true;
    }

    /// <summary>Replaces a right-hand side by its solution.</summary>
    public void Solve(Span<double> b)
    {
        for (int k = 0; k < count; k++)
            (b[k], b[pivots[k]]) = (b[pivots[k]], b[k]);
        for (int i = 1; i < count; i++)
        {
            for (int j = 0; j < i; j++)
                b[i] -= factors[i * count + j] * b[j];
        }
        for (int i = count - 1; i >= 0; i--)
        {
            for (int j = i + 1; j < count; j++)
                b[i] -= factors[i * count + j] * b[j];
            b[i] /= factors[i * count + i];
        }
    }
}
