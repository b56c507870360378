using DrainSim.Integration;

namespace DrainSim.Tests.Integration;

/// <summary>The tableau against the order conditions of Hairer, Nørsett, Wanner I, section II.2, in exact fractions.</summary>
public sealed class DormandPrince54Tests
{
    private static readonly RungeKuttaTableau Tableau = DormandPrince54.Tableau;
    private static readonly Rational[] One = [1, 1, 1, 1, 1, 1, 1];
    private static readonly Rational[] C = Array.ConvertAll(Tableau.Nodes, f => (Rational)f);
    private static readonly Rational[] B = Array.ConvertAll(Tableau.Weights, f => (Rational)f);
    private static readonly Rational[] Embedded = Array.ConvertAll(Tableau.EmbeddedWeights, f => (Rational)f);
    private static readonly Rational[] Dense = Array.ConvertAll(Tableau.DenseWeights, f => (Rational)f);

    /// <summary>The rooted trees up to order 5: the stage vector Φ that b is multiplied with, and 1/γ.</summary>
    private static readonly (int Order, Rational[] Stages, Rational Inverse)[] Trees =
    [
        (1, One, 1),
        (2, C, Part(2)),
        (3, Times(C, C), Part(3)),
        (3, A(C), Part(6)),
        (4, Times(C, Times(C, C)), Part(4)),
        (4, Times(C, A(C)), Part(8)),
        (4, A(Times(C, C)), Part(12)),
        (4, A(A(C)), Part(24)),
        (5, Times(Times(C, C), Times(C, C)), Part(5)),
        (5, Times(Times(C, C), A(C)), Part(10)),
        (5, Times(C, A(Times(C, C))), Part(15)),
        (5, Times(C, A(A(C))), Part(30)),
        (5, Times(A(C), A(C)), Part(20)),
        (5, A(Times(C, Times(C, C))), Part(20)),
        (5, A(Times(C, A(C))), Part(40)),
        (5, A(A(Times(C, C))), Part(60)),
        (5, A(A(A(C))), Part(120)),
    ];

    [Fact]
    public void Each_row_sums_to_its_node() => Assert.Equal(C, A(One));

    [Fact]
    public void The_last_stage_is_the_first_of_the_next_step()
    {
        Assert.Equal(Tableau.Weights[..^1], Tableau.Stages[^1]);
        Assert.Equal(0, B[^1]);
        Assert.Equal(1, C[^1]);
    }

    [Fact]
    public void The_solution_meets_all_seventeen_conditions_of_order_5() =>
        Assert.All(Trees, tree => Assert.Equal(tree.Inverse, Dot(B, tree.Stages)));

    [Fact]
    public void The_embedded_solution_meets_all_conditions_of_order_4() =>
        Assert.All(Trees.Where(tree => tree.Order <= 4), tree => Assert.Equal(tree.Inverse, Dot(Embedded, tree.Stages)));

    [Fact]
    public void The_embedded_solution_is_not_of_order_5() =>
        Assert.Contains(Trees, tree => tree.Order == 5 && tree.Inverse != Dot(Embedded, tree.Stages));

    /// <summary>b(θ) = θ·(first) + θ²·(3b − 2·first − last + d) + θ³·(first + last − 2b − 2d) + θ⁴·d must give θ^n/γ for
    /// every tree of order n: the coefficient of θ^n is 1/γ and all others are 0.</summary>
    [Fact]
    public void The_dense_output_meets_all_conditions_of_order_4_at_every_point_of_the_step()
    {
        foreach ((int order, Rational[] stages, Rational inverse) in Trees.Where(tree => tree.Order <= 4))
        {
            (Rational rise, Rational first, Rational last, Rational d) =
                (Dot(B, stages), stages[0], stages[^1], Dot(Dense, stages));
            Rational[] powers =
                [first, 3 * rise - 2 * first - last + d, first + last - 2 * rise - 2 * d, d];
            for (int power = 1; power <= 4; power++)
                Assert.Equal(power == order ? inverse : 0, powers[power - 1]);
        }
    }

    [Fact]
    public void The_error_weights_are_those_of_the_published_program() =>
        Assert.Equal(
            [71.0 / 57600, 0, -71.0 / 16695, 71.0 / 1920, -17253.0 / 339200, 22.0 / 525, -1.0 / 40],
            Tableau.ErrorWeights());

    private static Rational Part(int gamma) => new(1, gamma);

    private static Rational[] Times(Rational[] u, Rational[] v) => [.. u.Zip(v, (a, b) => a * b)];

    private static Rational[] A(Rational[] v) =>
        [.. Tableau.Stages.Select(row => Dot(Array.ConvertAll(row, f => (Rational)f), v))];

    private static Rational Dot(Rational[] weights, Rational[] v) =>
        weights.Zip(v, (a, b) => a * b).Aggregate((Rational)0, (sum, term) => sum + term);
}
