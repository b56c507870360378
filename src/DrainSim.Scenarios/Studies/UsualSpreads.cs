using DrainSim.Studies.Sampling;

namespace DrainSim.Scenarios.Studies;

/// <summary>How far the numbers of the trade usually lie off, by the last key of their path.</summary>
public static class UsualSpreads
{
    /// <summary>Standard deviates of the ends of a range that is taken as 95 % of the values.</summary>
    private const double Range95 = 1.96;

    /// <summary>Keys that have a usual spread.</summary>
    public static IReadOnlyList<string> Keys { get; } = ["roughness", "loss", "bore", "level", "elevation", "to", "rise"];

    /// <summary>The usual spread of a parameter about its value; null where the trade has none.</summary>
    /// <param name="path">dotted path of the parameter</param>
    /// <param name="value">its value, SI</param>
    /// <param name="source">where the spread comes from</param>
    public static Spread? Find(string path, double value, out string source)
    {
        ArgumentNullException.ThrowIfNull(path);
        string key = path[(path.LastIndexOf('.') + 1)..];
        (Spread? spread, source) = key switch
        {
            // Seamless steel 0.02 to 0.1 mm, welded 0.04 to 0.1 mm, glass 0.0015 to 0.01 mm, concrete 0.3 to 3 mm: a factor of 1.6 and more to either side.
            "roughness" when value > 0 => (new LogNormalSpread { Median = value, LogDeviation = Math.Log(1.6) / Range95 },
                "a factor of 1.6 to either side: ranges for one material in I. E. Idelchik, Handbook of Hydraulic Resistance, as in 'drainsim materials'"),
            "loss" when value > 0 => (new LogNormalSpread { Median = value, LogDeviation = Math.Log(1.3) / Range95 },
                "30 % to either side: common practice, no source"),
            // 36.5 to 39.7 mm for 38 mm, 24.2 to 26.6 mm for 25 mm, 48.1 to 51.6 mm for 50 mm.
            "bore" when value > 0 => ((Spread?)new UniformSpread(0.96 * value, 1.04 * value),
                "4 % to either side: tolerance of hoses made without a mandrel, EN ISO 1307:2008, 25 to 50 mm"),
            "level" => (new NormalSpread { Mean = value, Deviation = 0.003 }, "a dip repeats within some 3 mm: common practice, no source"),
            "elevation" or "to" or "rise" => (new NormalSpread { Mean = value, Deviation = 0.01 },
                "10 mm by tape on site: common practice, no source"),
            _ => (null, ""),
        };
        return spread;
    }
}
