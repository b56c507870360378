using System.Globalization;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Reading;

/// <summary>Finds a value in a scenario's tree by its dotted path.</summary>
internal static class ParameterPath
{
    /// <summary>How an item of a list is called: by its name, or by its place from 1.</summary>
    /// <param name="list">path of the list</param>
    /// <param name="item">the item</param>
    /// <param name="index">its place from 0</param>
    public static string OfItem(string list, Node item, int index) => NameOf(item) is { } name
        ? $"{list}.{name}"
        : string.Create(CultureInfo.InvariantCulture, $"{list}[{index + 1}]");

    /// <summary>Paths of all single values, in file order.</summary>
    public static List<string> All(BlockNode root)
    {
        List<string> paths = [];
        Collect(root, "", paths);
        return paths;
    }

    /// <summary>The tree with one value set; missing keys are added. Null when the path leads nowhere.</summary>
    public static BlockNode? Set(BlockNode root, string path, string text)
    {
        string[] steps = path.Replace("[", ".[", StringComparison.Ordinal).Split('.');
        // What a tank is fitted with may be called without the tank.
        if (steps[0] is "headspace" or "inflow" && root.Find(steps[0]) is null)
            steps = ["tank", .. steps];
        return steps.Any(step => step.Length == 0) ? null : Set(root, steps, text) as BlockNode;
    }

    private static Node? Set(Node node, ReadOnlySpan<string> steps, string text)
    {
        if (steps.Length == 0)
            return node is TextNode ? new TextNode(text, false, Position.Outside) : null;
        return node switch
        {
            BlockNode block => InBlock(block, steps, text),
            ListNode list => InList(list, steps, text),
            _ => null,
        };
    }

    private static BlockNode? InBlock(BlockNode block, ReadOnlySpan<string> steps, string text)
    {
        string key = steps[0];
        Entry? entry = block.Find(key);
        Node old = entry?.Value ?? (steps.Length == 1
            ? new TextNode("", false, Position.Outside)
            : new BlockNode([], Position.Outside));
        if (key[0] == '[' || Set(old, steps[1..], text) is not { } value)
            return null;
        return entry is null
            ? block with { Entries = [.. block.Entries, new Entry(key, Position.Outside, value)] }
            : block with { Entries = [.. block.Entries.Select(e => e.Key == key ? e with { Value = value } : e)] };
    }

    private static ListNode? InList(ListNode list, ReadOnlySpan<string> steps, string text)
    {
        Node[] items = [.. list.Items];
        for (int i = 0; i < items.Length; i++)
        {
            bool isMeant = steps[0] == NameOf(items[i])
                || steps[0] == string.Create(CultureInfo.InvariantCulture, $"[{i + 1}]");
            if (!isMeant)
                continue;
            if (Set(items[i], steps[1..], text) is not { } item)
                return null;
            items[i] = item;
            return list with { Items = items };
        }
        return null;
    }

    private static void Collect(Node node, string path, List<string> paths)
    {
        switch (node)
        {
            case TextNode:
                paths.Add(path);
                break;
            case BlockNode block:
                foreach (Entry entry in block.Entries)
                    Collect(entry.Value, path.Length == 0 ? entry.Key : $"{path}.{entry.Key}", paths);
                break;
            case ListNode list:
                for (int i = 0; i < list.Items.Count; i++)
                    Collect(list.Items[i], OfItem(path, list.Items[i], i), paths);
                break;
        }
    }

    private static string? NameOf(Node item) =>
        item is BlockNode block && block.Find("name")?.Value is TextNode { Text.Length: > 0 } name ? name.Text : null;
}
