namespace DrainSim.Scenarios.Yaml;

/// <summary>Says in plain words why a text is not YAML.</summary>
internal static class YamlFault
{
    /// <summary>The problem behind an exception of the parser.</summary>
    /// <param name="text">the whole file</param>
    /// <param name="openBrackets">places of the brackets and braces that were open, the innermost first</param>
    /// <param name="at">where the parser stopped</param>
    /// <param name="message">the parser's own words; empty when it had none</param>
    public static Problem Of(string text, Stack<Position> openBrackets, Position at, string message)
    {
        if (TabbedLine(text) is { } tab)
            return new Problem(tab.Line, tab.Column, "", "a tab indents this line", "YAML indents with spaces alone");
        if (openBrackets.TryPeek(out Position open))
            return new Problem(open.Line, open.Column, "", "this bracket or brace is not closed as it should be",
                "Each '[' needs its ']', each '{' its '}', with commas between the items");
        string words = message.Trim().TrimEnd('.');
        string fault = words.Length == 0
            ? "the text cannot be read as YAML"
            : $"the text cannot be read as YAML: {char.ToLowerInvariant(words[0])}{words[1..]}";
        return new Problem(at.Line, at.Column, "", fault, "Look at the indentation, the colons and the quotation marks here");
    }

    private static Position? TabbedLine(string text)
    {
        int line = 0;
        foreach (ReadOnlySpan<char> content in text.AsSpan().EnumerateLines())
        {
            line++;
            int indent = content.Length - content.TrimStart().Length;
            int tab = content[..indent].IndexOf('\t');
            if (tab >= 0 && indent < content.Length)
                return new Position(line, tab + 1);
        }
        return null;
    }
}
