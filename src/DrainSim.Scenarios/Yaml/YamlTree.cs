using YamlDotNet.Core;
using YamlDotNet.Core.Events;

namespace DrainSim.Scenarios.Yaml;

/// <summary>Builds a scenario's tree from the events of the YAML parser.</summary>
/// <remarks>
/// The tree is built here and not by the library's own model, so that anchors, tags and deep nesting
/// end the reading before anything grows: <c>a: &amp;a [*a]</c> would be a tree within itself, and a
/// hundred thousand open brackets would overflow the stack.
/// </remarks>
internal sealed class YamlTree
{
    /// <summary>Deepest nesting that is read; the vocabulary needs eight.</summary>
    public const int MostDepth = 50;

    private readonly Parser parser;
    private readonly List<Problem> problems;
    private readonly Stack<Position> openBrackets = [];
    private readonly Stack<string> keys = [];
    private int depth;

    private YamlTree(string text, List<Problem> problems)
    {
        parser = new Parser(new StringReader(text));
        this.problems = problems;
    }

    /// <summary>The keys of a scenario; null, with a problem, when the text cannot be read.</summary>
    /// <param name="text">the whole file</param>
    /// <param name="problems">what is wrong is added here</param>
    public static BlockNode? Load(string text, List<Problem> problems)
    {
        YamlTree tree = new(text, problems);
        try
        {
            return tree.Document();
        }
        catch (YamlRefusal refusal)
        {
            problems.Add(new Problem(refusal.At.Line, refusal.At.Column, "", refusal.Message, refusal.Accepted));
        }
        catch (YamlException e)
        {
            problems.Add(YamlFault.Of(text, tree.openBrackets, At(e.Start), e.Message));
        }
        // The scanner lets these out of text that it did not foresee; none of them carries a place.
        catch (Exception e) when (e is InvalidOperationException or ArgumentException or FormatException
            or OverflowException or IndexOutOfRangeException or NullReferenceException)
        {
            Position last = tree.parser.Current is { } current ? At(current.End) : new Position(1, 1);
            problems.Add(YamlFault.Of(text, tree.openBrackets, last, ""));
        }
        return null;
    }

    private BlockNode Document()
    {
        Next<StreamStart>();
        if (Next() is StreamEnd)
            throw new YamlRefusal(new Position(1, 1), "the file is empty", "A scenario has at least liquid, tank and line");
        Node root = Node(Next());
        Next<DocumentEnd>();
        if (Next() is DocumentStart second)
            throw new YamlRefusal(At(second.Start), "a second document begins here", "One file is one scenario");
        return root switch
        {
            BlockNode block => block,
            TextNode { Text: "" } => throw new YamlRefusal(root.At, "the file is empty",
                "A scenario has at least liquid, tank and line"),
            _ => throw new YamlRefusal(root.At, "the file does not begin with a key", "A scenario is keys with values, such as 'title: Rinse tank'"),
        };
    }

    private Node Node(ParsingEvent e)
    {
        Position at = At(e.Start);
        if (e is AnchorAlias or NodeEvent { Anchor.IsEmpty: false })
            throw new YamlRefusal(at, "anchors and aliases are not read", "Write the value out where it is needed");
        if (e is NodeEvent { Tag.IsEmpty: false })
            throw new YamlRefusal(at, "tags are not read", "Write the value without '!'");
        switch (e)
        {
            case Scalar scalar:
                return new TextNode(scalar.Value, scalar.Style != ScalarStyle.Plain, at);
            case SequenceStart list:
                return Nested(at, list.Style == SequenceStyle.Flow, Items);
            case MappingStart block:
                return Nested(at, block.Style == MappingStyle.Flow, Entries);
            default:
                throw new YamlRefusal(at, "the text cannot be read as YAML", "");
        }
    }

    private Node Nested(Position at, bool isBracket, Func<Position, Node> content)
    {
        if (++depth > MostDepth)
            throw new YamlRefusal(at, $"values are nested more than {MostDepth} deep", "A scenario needs no more than eight");
        if (isBracket)
            openBrackets.Push(at);
        Node node = content(at);
        if (isBracket)
            openBrackets.Pop();
        depth--;
        return node;
    }

    private ListNode Items(Position at)
    {
        List<Node> items = [];
        for (ParsingEvent e = Next(); e is not SequenceEnd; e = Next())
            items.Add(Node(e));
        return new ListNode(items, at);
    }

    private BlockNode Entries(Position at)
    {
        List<Entry> entries = [];
        Dictionary<string, Position> seen = [];
        for (ParsingEvent e = Next(); e is not MappingEnd; e = Next())
        {
            if (Node(e) is not TextNode key)
                throw new YamlRefusal(At(e.Start), "a list or a block stands where a key should be", "A key is one word");
            if (key is { Text: "<<", IsQuoted: false })
                throw new YamlRefusal(key.At, "merge keys are not read", "Write the keys out");
            keys.Push(Quote.Plain(key.Text));
            Node value = Node(Next());
            if (seen.TryAdd(key.Text, key.At))
                entries.Add(new Entry(key.Text, key.At, value));
            else
                problems.Add(new Problem(key.At.Line, key.At.Column, string.Join('.', keys.Reverse()),
                    $"the key stands twice, first in line {seen[key.Text].Line}", "Each key stands once"));
            keys.Pop();
        }
        return new BlockNode(entries, at);
    }

    private ParsingEvent Next() => parser.MoveNext() && parser.Current is { } current
        ? current
        : throw new InvalidOperationException("the events end early");

    private void Next<T>()
    {
        if (Next() is not T)
            throw new InvalidOperationException("another event was expected");
    }

    private static Position At(Mark mark) => new((int)mark.Line, (int)mark.Column);
}
