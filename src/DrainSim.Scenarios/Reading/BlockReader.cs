using DrainSim.Scenarios.Units;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Reading;

/// <summary>Asks a block for its keys by name and remembers which were asked for.</summary>
/// <remarks>
/// Every method that finds a fault adds the problem and returns null, so that the reading goes on and
/// all faults are told at once. <see cref="Finish"/> refuses the keys that nobody asked for.
/// </remarks>
internal sealed class BlockReader(BlockNode node, string path, Position at, Findings findings)
{
    private readonly List<string> asked = [];
    private readonly List<(string[] Keys, string Fault, string Help)> missing = [];

    /// <summary>Dotted path of the block; empty for the whole file.</summary>
    public string Path => path;

    /// <summary>Where the block's key stands.</summary>
    public Position At => at;

    /// <summary>What the reading gathers.</summary>
    public Findings Findings => findings;

    /// <summary>Its keys with their values, for a block whose keys are no fixed words.</summary>
    public IReadOnlyList<Entry> Entries => node.Entries;

    /// <summary>Dotted path of a key.</summary>
    public string PathOf(string key) => path.Length == 0 ? key : $"{path}.{key}";

    /// <summary>Whether the key stands in the block.</summary>
    public bool Has(string key) => Find(key) is not null;

    /// <summary>Refuses the value of a key, or the block when it has no such key.</summary>
    public void Refuse(string key, string fault, string accepted) =>
        findings.Refuse(PlaceOf(key), PathOf(key), fault, accepted);

    /// <summary>Warns of the value of a key, or of the block when it has no such key.</summary>
    public void Warn(string key, string fault, string accepted) =>
        findings.Warn(PlaceOf(key), PathOf(key), fault, accepted);

    /// <summary>Refuses the block for a key that it lacks, unless <see cref="Finish"/> finds the key misspelt.</summary>
    /// <param name="fault">what is missing</param>
    /// <param name="help">what to write</param>
    /// <param name="keys">the keys of which one would do</param>
    public void Miss(string fault, string help, params ReadOnlySpan<string> keys) => missing.Add((keys.ToArray(), fault, help));

    /// <summary>Makes a part of the plant; what the library refuses becomes a problem of the block.</summary>
    public T? Build<T>(Func<T> part)
        where T : class => findings.Build(at, path, part);

    /// <summary>Makes a part of the plant; what the library refuses becomes a problem of the key's value.</summary>
    public T? BuildAt<T>(string key, Func<T> part)
        where T : class => findings.Build(PlaceOf(key), PathOf(key), part);

    /// <summary>The one key of several that is given; null, with a problem, when none or more are.</summary>
    /// <param name="help">how to choose</param>
    /// <param name="keys">the keys of which one must stand</param>
    public string? OnlyOne(string help, params ReadOnlySpan<string> keys)
    {
        string? given = OneAtMost(help, keys, out int count);
        if (count == 0)
            Miss($"one of {Listed(keys, "or")} is missing", help, keys);
        return given;
    }

    /// <summary>The key of several that is given, if one is; null, with a problem, when more are.</summary>
    public string? AtMostOne(string help, params ReadOnlySpan<string> keys) => OneAtMost(help, keys, out _);

    /// <summary>The value of a key in SI; null when it is absent or refused.</summary>
    public double? Amount(string key, Quantity quantity, Allowed allowed)
    {
        if (Text(key) is not { } text)
            return null;
        QuantityReading reading = QuantityText.Read(text.Text, quantity);
        if (reading.IsRefused)
        {
            Refuse(key, reading.Fault, reading.Accepted);
            return null;
        }
        if (!allowed.Holds(reading.Value))
        {
            Refuse(key, $"{Quote.Of(text.Text)} is out of range", $"Give {quantity.WithArticle} {allowed.Rule}");
            return null;
        }
        Note(key, reading.Value, quantity.SiUnit, text.Text, isDefault: false);
        return reading.Value;
    }

    /// <summary>The value of a key in SI; null, with a problem, when it is absent or refused.</summary>
    public double? Needed(string key, Quantity quantity, Allowed allowed)
    {
        if (!Has(key))
            Miss("is missing", quantity.HowToWrite, key);
        return Amount(key, quantity, allowed);
    }

    /// <summary>The value of a key in SI, or the default when it is absent or refused.</summary>
    public double AmountOr(string key, Quantity quantity, Allowed allowed, double usual, string written)
    {
        if (!Has(key))
            Note(key, usual, quantity.SiUnit, written, isDefault: true);
        return Amount(key, quantity, allowed) ?? usual;
    }

    /// <summary>A whole number of at least 1; the default 1 when it is absent or refused.</summary>
    public int CountOr1(string key)
    {
        if (!Has(key))
        {
            Note(key, 1, "1", "1", isDefault: true);
            return 1;
        }
        if (Text(key) is not { } text)
            return 1;
        if (NumberText.TryRead(text.Text, out double count) && count is >= 1 and <= 1000 && double.IsInteger(count))
        {
            Note(key, count, "1", text.Text, isDefault: false);
            return (int)count;
        }
        Refuse(key, $"{Quote.Of(text.Text)} is not a count", "A count is a whole number from 1 to 1000");
        return 1;
    }

    /// <summary>The text of a key; null when it is absent, empty or no text.</summary>
    public string? Word(string key)
    {
        if (Text(key) is not { } text)
            return null;
        Note(key, null, null, text.Text, isDefault: false);
        return text.Text;
    }

    /// <summary>One of the words allowed, as the value that it stands for.</summary>
    /// <param name="key">the key</param>
    /// <param name="usual">what holds when it is absent or refused</param>
    /// <param name="choices">the words with their values</param>
    public T Choice<T>(string key, T usual, params ReadOnlySpan<(string Word, T Value)> choices)
    {
        List<string> words = [];
        string? text = Has(key) ? Text(key)?.Text : null;
        foreach ((string word, T value) in choices)
        {
            words.Add(word);
            bool isUsual = EqualityComparer<T>.Default.Equals(value, usual);
            if (word == text || (!Has(key) && isUsual))
            {
                Note(key, null, null, word, isDefault: text is null);
                return value;
            }
        }
        if (text is not null)
            Refuse(key, $"{Quote.Of(text)} is not known here", Meant(text, words, $"Give {Listed([.. words], "or")}"));
        return usual;
    }

    /// <summary>A row of a built-in table; null, with a problem, when the table has no such row.</summary>
    /// <param name="key">the key</param>
    /// <param name="what">what the rows are, <c>fitting</c></param>
    /// <param name="find">looks a name up</param>
    /// <param name="names">all names of the table</param>
    /// <param name="command">the command that lists them</param>
    public T? Row<T>(string key, string what, Func<string, T?> find, Func<IEnumerable<string>> names, string command)
        where T : class
    {
        if (Text(key) is not { } text)
            return null;
        if (find(text.Text) is { } row)
        {
            Note(key, null, null, text.Text, isDefault: false);
            return row;
        }
        Refuse(key, $"no {what} is called {Quote.Of(text.Text)}", Meant(text.Text, names(), $"'{command}' lists them all"));
        return null;
    }

    /// <summary>The block under a key; null when it is absent or no block.</summary>
    public BlockReader? Block(string key)
    {
        Entry? entry = Find(key);
        if (entry is null)
            return null;
        if (entry.Value is BlockNode block)
            return new BlockReader(block, PathOf(key), entry.KeyAt, findings);
        Refuse(key, entry.Value is TextNode { Text: "" } ? "is empty" : "is no block of keys", "Write its keys below it, indented");
        return null;
    }

    /// <summary>The items under a key; null when it is absent or no list.</summary>
    public ListNode? List(string key)
    {
        Entry? entry = Find(key);
        if (entry is null)
            return null;
        if (entry.Value is ListNode list)
            return list;
        Refuse(key, "is no list", "Write its items below it, each behind a hyphen");
        return null;
    }

    /// <summary>The block under a key; null, without a problem, when something else stands there.</summary>
    public BlockReader? BlockIfAny(string key) => Find(key) is { Value: BlockNode } ? Block(key) : null;

    /// <summary>The block under a key as it stands, its own keys not asked for one by one; null when it is absent or no block.</summary>
    public BlockNode? SettingsOf(string key) => Block(key) is null ? null : (BlockNode)Find(key)!.Value;

    /// <summary>Whether the value of a key can be read as a quantity.</summary>
    public bool IsAmount(string key, Quantity quantity) =>
        Find(key)?.Value is TextNode text && !QuantityText.Read(text.Text, quantity).IsRefused;

    /// <summary>The list under a key; null, without a problem, when something else stands there.</summary>
    public ListNode? ListIfAny(string key) => Find(key)?.Value as ListNode;

    /// <summary>Keeps a value for the echo.</summary>
    public void Note(string key, double? value, string? unit, string written, bool isDefault) =>
        findings.Note(new UnderstoodValue(PathOf(key), value, unit, written.Trim(), isDefault));

    /// <summary>Refuses every key that nobody asked for, and the block for every key that it lacks.</summary>
    public void Finish()
    {
        HashSet<string> meant = [];
        foreach (Entry entry in node.Entries.Where(entry => !asked.Contains(entry.Key)))
        {
            string? near = findings.IsFull ? null : Nearest.Find(entry.Key, asked);
            string help = near is null ? $"The keys here are {string.Join(", ", asked)}" : $"did you mean {Quote.Of(near)}?";
            findings.Refuse(entry.KeyAt, PathOf(Quote.Plain(entry.Key)), ScenarioDocument.NoSuchKey, help);
            if (near is not null)
                meant.Add(near);
        }
        foreach ((string[] keys, string fault, string help) in missing.Where(lack => !lack.Keys.Any(meant.Contains)))
            findings.Refuse(at, PathOf(keys[0]), fault, help, isShown: path.Length > 0);
    }

    private static string Meant(string text, IEnumerable<string> known, string otherwise) =>
        Nearest.Find(text, known) is { } near ? $"did you mean {Quote.Of(near)}?" : otherwise;

    private static string Listed(ReadOnlySpan<string> words, string joint)
    {
        string all = string.Join(", ", words[..^1].ToArray().Select(Quote.Of));
        return all.Length == 0 ? Quote.Of(words[^1]) : $"{all} {joint} {Quote.Of(words[^1])}";
    }

    private string? OneAtMost(string help, ReadOnlySpan<string> keys, out int count)
    {
        string? given = null;
        count = 0;
        foreach (string key in keys)
        {
            if (!Has(key))
                continue;
            count++;
            if (count > 1)
                findings.Refuse(Find(key)!.KeyAt, PathOf(key), $"stands beside {Quote.Of(given!)}", help);
            else
                given = key;
        }
        return count > 1 ? null : given;
    }

    private TextNode? Text(string key)
    {
        switch (Find(key)?.Value)
        {
            case null:
                return null;
            case TextNode { Text: "", IsQuoted: false } or TextNode { Text: "~" or "null", IsQuoted: false }:
                Refuse(key, "has no value", "Write one behind the colon, or leave the key out");
                return null;
            case TextNode text:
                return text;
            default:
                Refuse(key, "holds keys or a list where one value should be", "Write one value behind the colon");
                return null;
        }
    }

    private Entry? Find(string key)
    {
        if (!asked.Contains(key))
            asked.Add(key);
        return node.Find(key);
    }

    /// <summary>Where the value of a key stands, or the block when it has no such key.</summary>
    public Position PlaceOf(string key) => node.Find(key) switch
    {
        null => at,
        { Value: TextNode { Text: "", IsQuoted: false } } entry => entry.KeyAt,
        { } entry => entry.Value is TextNode ? entry.Value.At : entry.KeyAt,
    };
}
