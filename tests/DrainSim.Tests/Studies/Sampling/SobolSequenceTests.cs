using DrainSim.Studies.Sampling;

namespace DrainSim.Tests.Studies.Sampling;

/// <summary>Sobol's points, plain and scrambled.</summary>
public sealed class SobolSequenceTests
{
    /// <remarks>
    /// As the program of Joe and Kuo prints the first eight points of three coordinates; it goes through each block of 2^k
    /// points in Gray-code order.
    /// </remarks>
    [Fact]
    public void The_first_points_are_those_of_the_authors_program()
    {
        double[][] printed =
        [
            [0, 0.5, 0.75, 0.25, 0.375, 0.875, 0.625, 0.125],
            [0, 0.5, 0.25, 0.75, 0.375, 0.875, 0.125, 0.625],
            [0, 0.5, 0.25, 0.75, 0.625, 0.125, 0.875, 0.375],
        ];
        for (int dimension = 0; dimension < 3; dimension++)
            Assert.Equal(printed[dimension], Enumerable.Range(0, 8).Select(i => Plain(i ^ (i >> 1), dimension)));
    }

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void Every_coordinate_of_the_first_2_to_the_k_points_has_one_in_each_strip(bool isScrambled)
    {
        for (int dimension = 0; dimension < SobolSequence.MostDimensions; dimension++)
        {
            int[] strips = [.. Enumerable.Range(0, 256).Select(i => (int)(256 * At(i, dimension, isScrambled))).Order()];
            Assert.Equal(Enumerable.Range(0, 256), strips);
        }
    }

    /// <summary>The first two coordinates are a (0, m, 2)-net: one point of 2^m in every box of area 2^−m.</summary>
    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void The_first_two_coordinates_have_one_point_in_every_elementary_box(bool isScrambled)
    {
        const int m = 8;
        for (int k = 0; k <= m; k++)
        {
            int columns = 1 << k, rows = 1 << (m - k);
            IEnumerable<int> boxes = Enumerable.Range(0, 1 << m)
                .Select(i => (int)(columns * At(i, 0, isScrambled)) * rows + (int)(rows * At(i, 1, isScrambled)));
            Assert.Equal(1 << m, boxes.Distinct().Count());
        }
    }

    [Fact]
    public void Another_key_scrambles_otherwise_and_the_same_one_alike()
    {
        double[] Of(ulong key) => [.. Enumerable.Range(0, 32).Select(i => SobolSequence.Scrambled((uint)i, 3, key))];
        Assert.Equal(Of(7), Of(7));
        Assert.NotEqual(Of(7), Of(8));
    }

    private static double Plain(int index, int dimension) => SobolSequence.Digits((uint)index, dimension) / 4294967296.0;

    private static double At(int index, int dimension, bool isScrambled) =>
        isScrambled ? SobolSequence.Scrambled((uint)index, dimension, 12345) : Plain(index, dimension);
}
