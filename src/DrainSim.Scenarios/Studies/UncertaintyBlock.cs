using DrainSim.Scenarios.Reading;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Studies;

/// <summary>The block <c>uncertainty</c> of a scenario, as it is written.</summary>
internal sealed record UncertaintyBlock
{
    /// <summary>Values that are set for all samples, in the order of the file.</summary>
    public IReadOnlyList<(string Path, string Text)> Set { get; init; } = [];

    /// <summary>Parameters with their spreads, in the order of the file.</summary>
    public IReadOnlyList<(string Path, string Spread)> Parameters { get; init; } = [];

    /// <summary>Correlations, each <c>PATH, PATH = COEFFICIENT</c>.</summary>
    public IReadOnlyList<string> Correlations { get; init; } = [];

    /// <summary>Number of samples; null where it is not given.</summary>
    public string? Samples { get; init; }

    /// <summary>The seed; null where it is not given.</summary>
    public string? Seed { get; init; }

    /// <summary>How the points lie; null where it is not given.</summary>
    public string? Sampling { get; init; }

    /// <summary>Reads the block; an empty one where the file has none.</summary>
    public static UncertaintyBlock Read(BlockReader file)
    {
        if (file.Block("uncertainty") is not { } block)
            return new UncertaintyBlock();
        var read = new UncertaintyBlock
        {
            Set = StudyBlock.Texts(block),
            Parameters = Spreads(block),
            Correlations = Lines(block, "correlations", "A correlation reads 'tank.level, line.bore = 0.4'"),
            Samples = block.Word("samples"),
            Seed = block.Word("seed"),
            Sampling = block.Word("sampling"),
        };
        block.Finish();
        return read;
    }

    /// <summary>The texts of a list; a single text counts as a list of one.</summary>
    internal static IReadOnlyList<string> Lines(BlockReader block, string key, string help)
    {
        if (!block.Has(key))
            return [];
        if (block.ListIfAny(key) is not { } list)
            return block.Word(key) is { } word ? [word] : [];
        if (list.Items.All(item => item is TextNode { Text.Length: > 0 }))
            return [.. list.Items.Cast<TextNode>().Select(item => item.Text)];
        block.Refuse(key, "holds something else than single values", help);
        return [];
    }

    private static List<(string, string)> Spreads(BlockReader block)
    {
        List<(string, string)> spreads = [];
        if (block.Block("parameters") is not { } keys)
            return spreads;
        foreach (Entry entry in keys.Entries)
        {
            if (keys.Word(entry.Key) is not { } text)
                continue;
            if (SpreadText.TryRead(text, out _))
                spreads.Add((entry.Key, text));
            else
                keys.Refuse(entry.Key, $"{Quote.Of(text)} is no spread", SpreadText.Help);
        }

        return spreads;
    }
}
