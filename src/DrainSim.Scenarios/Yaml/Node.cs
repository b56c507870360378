namespace DrainSim.Scenarios.Yaml;

/// <summary>A piece of a scenario's tree with its place in the text.</summary>
/// <param name="At">where it begins</param>
internal abstract record Node(Position At);

/// <summary>A single value, as text.</summary>
/// <param name="Text">the text without quotation marks</param>
/// <param name="IsQuoted">whether it stood in quotation marks or was a block of text</param>
/// <param name="At">where it begins</param>
internal sealed record TextNode(string Text, bool IsQuoted, Position At) : Node(At);

/// <summary>A list.</summary>
/// <param name="Items">its items in order</param>
/// <param name="At">where it begins</param>
internal sealed record ListNode(IReadOnlyList<Node> Items, Position At) : Node(At);

/// <summary>Keys with their values.</summary>
/// <param name="Entries">in the order of the file, each key once</param>
/// <param name="At">where it begins</param>
internal sealed record BlockNode(IReadOnlyList<Entry> Entries, Position At) : Node(At)
{
    /// <summary>The entry of a key; null when there is none.</summary>
    public Entry? Find(string key) => Entries.FirstOrDefault(entry => entry.Key == key);
}

/// <summary>A key with its value.</summary>
/// <param name="Key">the key as written</param>
/// <param name="KeyAt">where the key begins</param>
/// <param name="Value">what it holds</param>
internal sealed record Entry(string Key, Position KeyAt, Node Value);
