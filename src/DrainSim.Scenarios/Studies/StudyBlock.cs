using DrainSim.Scenarios.Reading;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Studies;

/// <summary>The block of a sweep or a sizing, as it is written.</summary>
internal sealed record StudyBlock
{
    /// <summary>Values that are set for all cases, in the order of the file.</summary>
    public IReadOnlyList<(string Path, string Text)> Set { get; init; } = [];

    /// <summary>Parameters that vary, in the order of the file, with their values.</summary>
    public IReadOnlyList<(string Path, ValueList Values)> Vary { get; init; } = [];

    /// <summary>Name of the CSV file with the cases; null where there is none.</summary>
    public string? Cases { get; init; }

    /// <summary>The parameter to size; null where there is none.</summary>
    public string? Parameter { get; init; }

    /// <summary>The range to size it within; null where there is none.</summary>
    public string? Between { get; init; }

    /// <summary>What sizing is to reach; null where there is none.</summary>
    public string? Target { get; init; }

    /// <summary>Reads the blocks of all studies of a file, where it has them, and tells what is wrong with their form.</summary>
    /// <param name="file">the whole scenario</param>
    public static void Check(BlockReader file)
    {
        Read(file, "sweep");
        Read(file, "size");
        UncertaintyBlock.Read(file);
        ForecastBlock.Read(file);
    }

    /// <summary>Reads a block; an empty one where the file has none.</summary>
    /// <param name="file">the whole scenario</param>
    /// <param name="key"><c>sweep</c> or <c>size</c></param>
    public static StudyBlock Read(BlockReader file, string key)
    {
        if (file.Block(key) is not { } block)
            return new StudyBlock();
        bool isSweep = key == "sweep";
        var read = new StudyBlock
        {
            Set = Texts(block),
            Vary = isSweep ? Lists(block) : [],
            Cases = isSweep ? block.Word("cases") : null,
            Parameter = isSweep ? null : block.Word("parameter"),
            Between = isSweep ? null : block.Word("between"),
            Target = isSweep ? null : block.Word("target"),
        };
        block.Finish();
        return read;
    }

    /// <summary>The values that a study's block sets for all cases.</summary>
    internal static List<(string, string)> Texts(BlockReader block)
    {
        List<(string, string)> set = [];
        if (block.Block("set") is not { } keys)
            return set;
        foreach (Entry entry in keys.Entries)
        {
            if (keys.Word(entry.Key) is { } text)
                set.Add((entry.Key, text));
        }

        return set;
    }

    private static List<(string, ValueList)> Lists(BlockReader block)
    {
        List<(string, ValueList)> vary = [];
        if (block.Block("vary") is not { } keys)
            return vary;
        foreach (Entry entry in keys.Entries)
        {
            if (ValuesOf(keys, entry) is { } values)
                vary.Add((entry.Key, values));
        }

        return vary;
    }

    private static ValueList? ValuesOf(BlockReader keys, Entry entry)
    {
        string[] items = entry.Value is ListNode list ? [.. list.Items.OfType<TextNode>().Select(item => item.Text)] : [];
        if (entry.Value is ListNode all)
        {
            keys.Has(entry.Key);
            if (items.Length == all.Items.Count && items.Length > 0 && items.All(item => item.Length > 0))
                return ValueList.Of(items);
            keys.Refuse(entry.Key, "is no list of values", ValueList.Help);
            return null;
        }

        if (keys.Word(entry.Key) is not { } text)
            return null;
        if (ValueList.TryRead(text, out ValueList? values, out string fault))
            return values;
        keys.Refuse(entry.Key, fault, "");
        return null;
    }
}
