namespace DrainSim.Integration;

/// <summary>The coefficients of a stiffly accurate Rosenbrock method, with a dense output of degree 4.</summary>
/// <remarks><code>
/// (1/(h·γ)·I − J)·u_i = f(t + c_i·h, y + Σ_j a_ij·u_j) + Σ_j (C_ij/h)·u_j + h·d_i·∂f/∂t,   j &lt; i
/// y1  = y + Σ_j a_sj·u_j + u_s
/// err = u_s
/// y(t + θ·h) = (1 − θ)·y + θ·y1 + θ·(1 − θ)·(K1 + θ·K2 + θ²·K3),   K_r = Σ_j H_rj·u_j
///
/// J  the Jacobian ∂f/∂y at the start of the step;  s  number of stages
/// </code>
/// The u_i are h·k_i of the textbooks, transformed so that J is not multiplied with a vector: E. Hairer, G. Wanner,
/// Solving Ordinary Differential Equations II, 2nd ed., Springer 1996, section IV.7, "Implementation".
/// </remarks>
internal sealed class RosenbrockTableau
{
    /// <summary>Order of the solution that is carried on.</summary>
    public required int Order { get; init; }

    /// <summary>The γ of every stage.</summary>
    public required double Diagonal { get; init; }

    /// <summary>Nodes c_i.</summary>
    public required double[] Nodes { get; init; }

    /// <summary>Weights d_i of the derivative by time.</summary>
    public required double[] TimeWeights { get; init; }

    /// <summary>Weights a_ij of the stages' states, one row of j &lt; i per stage.</summary>
    public required double[][] Stages { get; init; }

    /// <summary>Weights C_ij of the stages before, likewise.</summary>
    public required double[][] Coupling { get; init; }

    /// <summary>Weights H_rj of the dense output, three rows.</summary>
    public required double[][] Dense { get; init; }
}
