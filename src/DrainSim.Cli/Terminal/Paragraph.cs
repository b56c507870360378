namespace DrainSim.Cli.Terminal;

/// <summary>Breaks a sentence into lines for the terminal.</summary>
internal static class Paragraph
{
    /// <summary>Width of the terminal's text, characters.</summary>
    public const int Width = 96;

    /// <summary>The lines of a text, broken at spaces; a word longer than a line stands alone.</summary>
    /// <param name="text">one paragraph; spaces at its start are kept</param>
    /// <param name="width">longest line, characters</param>
    /// <param name="hang">spaces before every line but the first</param>
    public static IEnumerable<string> Lines(string text, int width, int hang)
    {
        string indent = "";
        string rest = text.TrimEnd();
        while (indent.Length + rest.Length > width)
        {
            int room = width - indent.Length;
            int firstWord = rest.Length - rest.TrimStart().Length;
            int space = rest.LastIndexOf(' ', room);
            if (space <= firstWord)
                space = rest.IndexOf(' ', firstWord + 1);
            if (space < 0)
                break;
            yield return indent + rest[..space].TrimEnd();
            rest = rest[(space + 1)..].TrimStart();
            indent = new string(' ', hang);
        }
        yield return indent + rest;
    }
}
