namespace DrainSim.Studies.Sampling;

/// <summary>Random numbers that depend on nothing but their keys: the same on every thread and every machine.</summary>
/// <remarks>
/// The mixing function of G. L. Steele, D. Lea, C. H. Flood, Fast splittable pseudorandom number generators,
/// OOPSLA 2014, doi:10.1145/2660193.2660195.
/// </remarks>
internal static class Coins
{
    /// <summary>64 random bits of two keys.</summary>
    public static ulong Hash(ulong key, ulong number)
    {
        ulong z = Mix(key + 0x9E3779B97F4A7C15) ^ number;
        return Mix(z * 0x9E3779B97F4A7C15 + 0x9E3779B97F4A7C15);
    }

    /// <summary>A number strictly between 0 and 1.</summary>
    public static double Share(ulong key, ulong number) => ((Hash(key, number) >> 11) + 0.5) / 9007199254740992.0;

    private static ulong Mix(ulong z)
    {
        z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9;
        z = (z ^ (z >> 27)) * 0x94D049BB133111EB;
        return z ^ (z >> 31);
    }
}
