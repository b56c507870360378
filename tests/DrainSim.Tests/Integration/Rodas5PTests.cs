using DrainSim.Integration;
using MathNet.Numerics.LinearAlgebra;
using Complex = System.Numerics.Complex;

namespace DrainSim.Tests.Integration;

/// <summary>
/// The tableau against the conditions of Hairer, Wanner II, section IV.7, theorem 7.4: those of a Runge–Kutta method, with
/// β_ij = α_ij + γ_ij where a vertex of the tree has one branch, α_ij where it has several; α, γ and b by the transformation (7.25) back.
/// </summary>
public sealed class Rodas5PTests
{
    /// <summary>The coefficients are printed with 16 digits, the largest are some hundreds.</summary>
    private const double LastDigits = 2e-12;

    private static readonly RosenbrockTableau Tableau = Rodas5P.Tableau;
    private static readonly int Stages = Tableau.Nodes.Length;
    private static readonly Matrix<double> Gamma =
        (Matrix<double>.Build.DenseDiagonal(Stages, 1 / Tableau.Diagonal) - Square(Tableau.Coupling)).Inverse();

    private static readonly Matrix<double> Alpha = Square(Tableau.Stages) * Gamma;
    private static readonly Matrix<double> Beta = Alpha + Gamma;
    private static readonly Vector<double> One = Vector<double>.Build.Dense(Stages, 1);
    private static readonly Vector<double> C = Alpha * One;

    private static readonly Vector<double> B = Weights([.. Tableau.Stages[^1], 1]);
    private static readonly Vector<double> Embedded = Weights([.. Tableau.Stages[^1], 0]);

    /// <summary>The rooted trees up to order 5: the stage vector that b is multiplied with, and γ of the tree.</summary>
    private static readonly (int Order, Vector<double> Stages, double Gamma)[] Trees =
    [
        (1, One, 1),
        (2, Beta * One, 2),
        (3, Times(C, C), 3),
        (3, Beta * (Beta * One), 6),
        (4, Times(C, Times(C, C)), 4),
        (4, Times(C, Alpha * (Beta * One)), 8),
        (4, Beta * Times(C, C), 12),
        (4, Beta * (Beta * (Beta * One)), 24),
        (5, Times(Times(C, C), Times(C, C)), 5),
        (5, Times(Times(C, C), Alpha * (Beta * One)), 10),
        (5, Times(C, Alpha * Times(C, C)), 15),
        (5, Times(C, Alpha * (Beta * (Beta * One))), 30),
        (5, Times(Alpha * (Beta * One), Alpha * (Beta * One)), 20),
        (5, Beta * Times(C, Times(C, C)), 20),
        (5, Beta * Times(C, Alpha * (Beta * One)), 40),
        (5, Beta * (Beta * Times(C, C)), 60),
        (5, Beta * (Beta * (Beta * (Beta * One))), 120),
    ];

    [Fact]
    public void The_rows_sum_to_the_nodes_and_to_the_weights_of_the_derivative_by_time()
    {
        for (int i = 0; i < Stages; i++)
        {
            Assert.Equal(Tableau.Nodes[i], C[i], LastDigits);
            Assert.Equal(Tableau.TimeWeights[i], (Gamma * One)[i], LastDigits);
        }
    }

    [Fact]
    public void The_solution_meets_all_seventeen_conditions_of_order_5() =>
        Assert.All(Trees, tree => Assert.Equal(1 / tree.Gamma, B * tree.Stages, LastDigits));

    [Fact]
    public void The_embedded_solution_meets_all_conditions_of_order_4_and_not_those_of_order_5()
    {
        Assert.All(Trees.Where(tree => tree.Order <= 4), tree => Assert.Equal(1 / tree.Gamma, Embedded * tree.Stages, LastDigits));
        Assert.Contains(Trees, tree => tree.Order == 5 && Math.Abs(1 / tree.Gamma - Embedded * tree.Stages) > 1e-4);
    }

    /// <summary>b(θ) = θ·b + θ·(1 − θ)·(K1 + θ·K2 + θ²·K3) must give θ^n/γ for every tree of order n.</summary>
    [Fact]
    public void The_dense_output_meets_all_conditions_of_order_4_at_every_point_of_the_step()
    {
        Vector<double>[] k = [.. Tableau.Dense.Select(row => Weights(row))];
        foreach ((int order, Vector<double> stages, double gamma) in Trees.Where(tree => tree.Order <= 4))
        {
            (double rise, double k1, double k2, double k3) = (B * stages, k[0] * stages, k[1] * stages, k[2] * stages);
            double[] powers = [rise + k1, k2 - k1, k3 - k2, -k3];
            for (int power = 1; power <= 4; power++)
                Assert.Equal(power == order ? 1 / gamma : 0, powers[power - 1], 10 * LastDigits);
        }
    }

    /// <summary>R(z) = 1 + z·bᵀ·(I − z·β)⁻¹·1: nowhere on the imaginary axis above 1, and 0 at infinity.</summary>
    [Fact]
    public void The_method_is_L_stable()
    {
        for (double power = -2; power <= 4; power += 0.01)
            Assert.InRange(Growth(new Complex(0, Math.Pow(10, power))).Magnitude, 0, 1 + 1e-12);
        Assert.InRange(Growth(-1e8).Magnitude, 0, 1e-6);
        Assert.Equal(1, B * (Beta.Inverse() * One), 1e-11);
    }

    private static Complex Growth(Complex z)
    {
        Matrix<Complex> matrix = Matrix<Complex>.Build.DenseIdentity(Stages) - Beta.ToComplex() * z;
        return 1 + z * (B.ToComplex() * matrix.Solve(One.ToComplex()));
    }

    private static Vector<double> Weights(double[] transformed) => Gamma.Transpose() * Vector<double>.Build.Dense(transformed);

    private static Vector<double> Times(Vector<double> u, Vector<double> v) => u.PointwiseMultiply(v);

    private static Matrix<double> Square(double[][] rows) =>
        Matrix<double>.Build.Dense(Stages, Stages, (i, j) => j < rows[i].Length ? rows[i][j] : 0);
}
