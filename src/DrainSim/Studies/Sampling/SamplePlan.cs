using MathNet.Numerics;
using MathNet.Numerics.Random;

namespace DrainSim.Studies.Sampling;

/// <summary>The points of a study in the unit cube, in repetitions that are independent of each other.</summary>
/// <remarks>
/// The repetitions tell how far another seed would have led: what is computed from each of them scatters, and the
/// scatter over the root of their number is the sampling error (A. B. Owen, Monte Carlo theory, methods and
/// examples, chapter 17.5: randomised quasi-Monte Carlo). A point depends on its number and the seed alone.
/// </remarks>
public sealed class SamplePlan
{
    /// <summary>Most parameters of a study.</summary>
    public const int MostDimensions = SobolSequence.MostDimensions;

    /// <summary>Repetitions in a plan.</summary>
    public const int Repetitions = 16;

    private readonly SamplingMethod method;
    private readonly ulong seed;
    private readonly int[][] strips = [];

    /// <summary>Lays a plan out.</summary>
    /// <param name="method">how the points of a repetition lie</param>
    /// <param name="dimensions">number of parameters, 1 to <see cref="MostDimensions"/></param>
    /// <param name="least">least number of points; the next multiple of <see cref="Repetitions"/> is taken</param>
    /// <param name="seed">another seed gives other points, the same one the same</param>
    /// <exception cref="ArgumentOutOfRangeException">there are too many or too few parameters or points</exception>
    public SamplePlan(SamplingMethod method, int dimensions, int least, int seed)
    {
        Require.Within(dimensions, 1, MostDimensions, "number of uncertain parameters", "");
        Require.Within(least, 2 * Repetitions, 1 << 24, "number of samples", "");
        this.method = method;
        this.seed = (ulong)(uint)seed;
        Dimensions = dimensions;
        PerRepetition = (least + Repetitions - 1) / Repetitions;
        if (method == SamplingMethod.LatinHypercube)
            strips = [.. Enumerable.Range(0, Repetitions * dimensions).Select(Shuffled)];
    }

    /// <summary>Number of parameters.</summary>
    public int Dimensions { get; }

    /// <summary>Points in a repetition.</summary>
    public int PerRepetition { get; }

    /// <summary>Points in all.</summary>
    public int Count => PerRepetition * Repetitions;

    /// <summary>The repetition that a point belongs to.</summary>
    /// <param name="index">number of the point, from 0</param>
    public int RepetitionOf(int index) => index / PerRepetition;

    /// <summary>Fills in a point; every coordinate lies strictly between 0 and 1.</summary>
    /// <param name="index">number of the point, from 0</param>
    /// <param name="point">takes the coordinates</param>
    public void Point(int index, Span<double> point)
    {
        (int repetition, int own) = Math.DivRem(index, PerRepetition);
        for (int j = 0; j < Dimensions; j++)
        {
            ulong key = Coins.Hash(seed, (ulong)(repetition * MostDimensions + j));
            point[j] = method == SamplingMethod.Sobol
                ? SobolSequence.Scrambled((uint)own, j, key)
                : (strips[repetition * Dimensions + j][own] + Coins.Share(key, (ulong)own)) / PerRepetition;
        }
    }

    private int[] Shuffled(int number)
    {
        var random = new Xoshiro256StarStar((int)Coins.Hash(seed, (ulong)number + (1ul << 40)), threadSafe: false);
        return Combinatorics.GeneratePermutation(PerRepetition, random);
    }
}
