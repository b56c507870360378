namespace DrainSim.Integration;

/// <summary>The coefficients of an explicit embedded Runge–Kutta pair whose last stage is the first of the next
/// step, with a dense output of degree 4.</summary>
/// <remarks><code>
/// k_i = f(t + c_i·h, y + h·Σ_j a_ij·k_j)
/// y1  = y + h·Σ b_i·k_i
/// err = h·Σ (b_i − b̂_i)·k_i
/// y(t + θ·h) = cubic Hermite polynomial through both ends + θ²·(1 − θ)²·h·Σ d_i·k_i
/// </code></remarks>
internal sealed class RungeKuttaTableau
{
    /// <summary>Order of the solution that is carried on.</summary>
    public required int Order { get; init; }

    /// <summary>Nodes c_i.</summary>
    public required Fraction[] Nodes { get; init; }

    /// <summary>Stage weights a_ij, one row per stage; the last row is b.</summary>
    public required Fraction[][] Stages { get; init; }

    /// <summary>Weights b_i of the solution.</summary>
    public required Fraction[] Weights { get; init; }

    /// <summary>Weights b̂_i of the solution that the error is measured against.</summary>
    public required Fraction[] EmbeddedWeights { get; init; }

    /// <summary>Weights d_i of the quartic term of the dense output.</summary>
    public required Fraction[] DenseWeights { get; init; }

    /// <summary>The values of a row of fractions.</summary>
    public static double[] Values(Fraction[] row) => Array.ConvertAll(row, fraction => fraction.Value);

    /// <summary>b_i − b̂_i, rounded once.</summary>
    public double[] ErrorWeights()
    {
        double[] difference = new double[Weights.Length];
        for (int i = 0; i < difference.Length; i++)
            difference[i] = (Weights[i] - EmbeddedWeights[i]).Value;
        return difference;
    }
}
