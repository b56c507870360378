using System.Globalization;

namespace DrainSim.Cli;

/// <summary>One of several equal parts of a study, for sharing it over machines.</summary>
/// <param name="Number">which part, from 1</param>
/// <param name="Of">number of parts</param>
internal readonly record struct Shard(int Number, int Of)
{
    /// <summary>The whole study.</summary>
    public static Shard Whole { get; } = new(1, 1);

    /// <summary>Whether it is the whole study.</summary>
    public bool IsWhole => Of == 1;

    /// <summary>What stands in the names of its files before the ending; empty for the whole.</summary>
    public string Suffix => IsWhole ? "" : string.Create(CultureInfo.InvariantCulture, $".{Number}-of-{Of}");

    /// <summary>Its cases of so many: a stretch without gaps, so that the parts joined are the whole.</summary>
    /// <param name="count">number of cases of the whole</param>
    /// <returns>number of its first case, and the number behind its last, from 0</returns>
    public (long First, long End) CasesOf(long count) =>
        ((long)((Int128)count * (Number - 1) / Of), (long)((Int128)count * Number / Of));

    /// <summary>Reads <c>2/8</c>.</summary>
    public static bool TryRead(string text, out Shard shard)
    {
        string[] parts = text.Split('/');
        shard = Whole;
        if (parts.Length != 2 || !TryCount(parts[0], out int number) || !TryCount(parts[1], out int of) || number < 1 || number > of)
            return false;
        shard = new Shard(number, of);
        return true;
    }

    private static bool TryCount(string text, out int count) =>
        int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out count);
}
