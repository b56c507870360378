namespace DrainSim.Integration;

/// <summary>The pair of orders 5 and 4 of Dormand and Prince, with its dense output of order 4.</summary>
/// <remarks>
/// Six derivatives a step, none for the dense output. The tests hold the order conditions exactly.
/// Source of the pair: J. R. Dormand, P. J. Prince, J. Comput. Appl. Math. 6 (1980) 19–26,
/// doi:10.1016/0771-050X(80)90013-3; as in E. Hairer, S. P. Nørsett, G. Wanner, Solving Ordinary Differential
/// Equations I, 2nd ed., Springer 1993, table II.5.2. Of the dense output: section II.6 there, in the form
/// of the coefficients d_i that its program DOPRI5 prints.
/// </remarks>
internal static class DormandPrince54
{
    public static RungeKuttaTableau Tableau { get; } = new()
    {
        Order = 5,
        Nodes = [0, new(1, 5), new(3, 10), new(4, 5), new(8, 9), 1, 1],
        Stages =
        [
            [],
            [new(1, 5)],
            [new(3, 40), new(9, 40)],
            [new(44, 45), new(-56, 15), new(32, 9)],
            [new(19372, 6561), new(-25360, 2187), new(64448, 6561), new(-212, 729)],
            [new(9017, 3168), new(-355, 33), new(46732, 5247), new(49, 176), new(-5103, 18656)],
            [new(35, 384), 0, new(500, 1113), new(125, 192), new(-2187, 6784), new(11, 84)],
        ],
        Weights = [new(35, 384), 0, new(500, 1113), new(125, 192), new(-2187, 6784), new(11, 84), 0],
        EmbeddedWeights =
        [
            new(5179, 57600), 0, new(7571, 16695), new(393, 640), new(-92097, 339200), new(187, 2100), new(1, 40),
        ],
        DenseWeights =
        [
            new(-12715105075, 11282082432), 0, new(87487479700, 32700410799), new(-10690763975, 1880347072),
            new(701980252875, 199316789632), new(-1453857185, 822651844), new(69997945, 29380423),
        ],
    };
}
