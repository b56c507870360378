namespace DrainSim.Studies.Sampling;

/// <summary>Sobol's low-discrepancy sequence, scrambled at random so that its error can be seen.</summary>
/// <remarks>
/// Direction numbers: S. Joe, F. Y. Kuo, Constructing Sobol sequences with better two-dimensional projections,
/// SIAM J. Sci. Comput. 30 (2008) 2635–2654, doi:10.1137/070709359, their table new-joe-kuo-6, rows 2 to 12; the
/// first coordinate is van der Corput's sequence. Recurrence: P. Bratley, B. L. Fox, ACM Trans. Math. Softw. 14
/// (1988) 88–100. Scrambling: A. B. Owen, Randomly permuted (t,m,s)-nets and (t,s)-sequences (1995): each binary
/// digit is turned or not by a coin that depends on all digits before it; the coins are hashed, so that a point is
/// made from its number alone.
/// </remarks>
internal static class SobolSequence
{
    /// <summary>Most coordinates that the table has.</summary>
    public const int MostDimensions = 12;

    private const int Bits = 32;

    /// <summary>Degree and coefficients of the primitive polynomial, and the first direction integers, for coordinates 2 on.</summary>
    private static readonly (int Degree, uint Polynomial, uint[] First)[] Table =
    [
        (1, 0, [1]),
        (2, 1, [1, 3]),
        (3, 1, [1, 3, 1]),
        (3, 2, [1, 1, 1]),
        (4, 1, [1, 1, 3, 3]),
        (4, 4, [1, 3, 5, 13]),
        (5, 2, [1, 1, 5, 5, 17]),
        (5, 4, [1, 1, 5, 5, 5]),
        (5, 7, [1, 1, 7, 11, 19]),
        (5, 11, [1, 1, 5, 1, 1]),
        (5, 13, [1, 1, 1, 3, 11]),
    ];

    private static readonly uint[][] Directions = [.. Enumerable.Range(0, MostDimensions).Select(DirectionsOf)];

    /// <summary>A coordinate of a point, not scrambled, as a binary fraction of 32 digits.</summary>
    /// <param name="index">number of the point, from 0</param>
    /// <param name="dimension">number of the coordinate, from 0</param>
    public static uint Digits(uint index, int dimension)
    {
        uint x = 0;
        for (int bit = 0; index != 0; bit++, index >>= 1)
        {
            if ((index & 1) != 0)
                x ^= Directions[dimension][bit];
        }

        return x;
    }

    /// <summary>A coordinate of a scrambled point, strictly between 0 and 1.</summary>
    /// <param name="index">number of the point, from 0</param>
    /// <param name="dimension">number of the coordinate, from 0</param>
    /// <param name="key">what the scrambling depends on; another one for every coordinate and every repetition</param>
    public static double Scrambled(uint index, int dimension, ulong key)
    {
        uint digits = Digits(index, dimension), scrambled = 0;
        for (int bit = 0; bit < Bits; bit++)
        {
            uint before = bit == 0 ? 0 : digits >> (Bits - bit);
            uint coin = (uint)Coins.Hash(key, (ulong)bit << Bits | before) & 1;
            scrambled = scrambled << 1 | ((digits >> (Bits - 1 - bit)) & 1) ^ coin;
        }

        return (scrambled + 0.5) / 4294967296.0;
    }

    private static uint[] DirectionsOf(int dimension)
    {
        uint[] v = new uint[Bits];
        if (dimension == 0)
        {
            for (int i = 0; i < Bits; i++)
                v[i] = 1u << (Bits - 1 - i);
            return v;
        }

        (int s, uint a, uint[] first) = Table[dimension - 1];
        for (int i = 0; i < s; i++)
            v[i] = first[i] << (Bits - 1 - i);
        for (int i = s; i < Bits; i++)
        {
            v[i] = v[i - s] ^ (v[i - s] >> s);
            for (int k = 1; k < s; k++)
                v[i] ^= ((a >> (s - 1 - k)) & 1) * v[i - k];
        }

        return v;
    }
}
