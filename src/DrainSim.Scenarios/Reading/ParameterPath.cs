using System.Globalization;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Reading;

/// <summary>Finds a value in a scenario's tree by its dotted path.</summary>
internal static class ParameterPath
{
    private static readonly string[] Studies = ["sweep", "size", "uncertainty", "forecast"];

    /// <summary>Keys of which only one may stand in a block: setting one takes the place of the others.</summary>
    private static readonly string[][] Rivals =
    [
        ["level", "contents", "fill"],
        ["bore", "size"],
        ["bore", "schedule"],
        ["roughness", "material"],
        ["edge", "loss"],
        ["viscosity", "kinematic_viscosity"],
        ["altitude", "atmospheric_pressure"],
        ["to", "rise"],
        ["kv", "cv"],
        ["stop_at_level", "stop_at_volume"],
    ];

    /// <summary>Whether a key of the file holds a study and nothing of the job.</summary>
    public static bool IsStudy(string key) => Studies.Contains(key);

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
        foreach (Entry entry in root.Entries.Where(entry => !IsStudy(entry.Key)))
            Collect(entry.Value, entry.Key, paths);
        return paths;
    }

    /// <summary>What stands at a path; null when nothing does.</summary>
    public static Node? Find(BlockNode root, string path)
    {
        Node? node = root;
        foreach (string step in StepsOf(Whole(root, path)))
        {
            node = node switch
            {
                BlockNode block => block.Find(step)?.Value,
                ListNode list => list.Items.Where((item, index) => IsCalled(item, index, step)).FirstOrDefault(),
                _ => null,
            };
        }

        return node;
    }

    /// <summary>The tree with one value set; missing keys are added. Null when the path leads nowhere.</summary>
    public static BlockNode? Set(BlockNode root, string path, string text)
    {
        string[] steps = StepsOf(Whole(root, path));
        return steps.Any(step => step.Length == 0) ? null : Set(root, steps, text) as BlockNode;
    }

    /// <summary>The path as the reading calls it: what a tank is fitted with may be called without the tank.</summary>
    public static string Whole(BlockNode root, string path)
    {
        int end = path.IndexOf('.', StringComparison.Ordinal);
        string first = end < 0 ? path : path[..end];
        return first is "headspace" or "inflow" && root.Find(first) is null ? "tank." + path : path;
    }

    private static string[] StepsOf(string path) => path.Replace("[", ".[", StringComparison.Ordinal).Split('.');

    private static bool IsCalled(Node item, int index, string step) =>
        step == NameOf(item) || step == string.Create(CultureInfo.InvariantCulture, $"[{index + 1}]");

    private static Node? Set(Node node, ReadOnlySpan<string> steps, string text)
    {
        if (steps.Length == 0)
            return node is TextNode or ListNode ? new TextNode(text, false, Position.Outside) : null;
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
            ? block with { Entries = [.. block.Entries.Where(e => !AreRivals(e.Key, key)), new Entry(key, Position.Outside, value)] }
            : block with { Entries = [.. block.Entries.Select(e => e.Key == key ? e with { Value = value } : e)] };
    }

    private static bool AreRivals(string one, string other) =>
        one != other && Rivals.Any(rivals => rivals.Contains(one) && rivals.Contains(other));

    private static ListNode? InList(ListNode list, ReadOnlySpan<string> steps, string text)
    {
        Node[] items = [.. list.Items];
        for (int i = 0; i < items.Length; i++)
        {
            if (!IsCalled(items[i], i, steps[0]))
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
