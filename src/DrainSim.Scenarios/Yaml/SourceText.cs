using System.Text;

namespace DrainSim.Scenarios.Yaml;

/// <summary>The lines of a file, for showing a problem's place.</summary>
internal sealed class SourceText(string text)
{
    /// <summary>Most characters of a line that are shown.</summary>
    private const int Width = 100;

    private readonly string[] lines = text.ReplaceLineEndings("\n").Split('\n');

    /// <summary>The first character that no text has, such as a NUL; null when there is none.</summary>
    public Position? FindControlCharacter()
    {
        for (int line = 0; line < lines.Length; line++)
        {
            int column = lines[line].AsSpan().IndexOfAnyInRange('\u0000', '\u0008');
            if (column >= 0)
                return new Position(line + 1, column + 1);
        }
        return null;
    }

    /// <summary>The problem with the line that it points to, made printable.</summary>
    public Problem Show(Problem problem)
    {
        if (problem.Line < 1 || problem.Line > lines.Length || lines[problem.Line - 1].Trim().Length == 0)
            return problem;
        string line = lines[problem.Line - 1];
        int caret = Math.Clamp(problem.Column - 1, 0, line.Length);
        int start = caret < Width - 20 ? 0 : caret - Width / 2;
        StringBuilder shown = new(start > 0 ? "…" : "");
        int caretShown = shown.Length + caret - start;
        foreach (char letter in line.AsSpan(start, Math.Min(Width, line.Length - start)))
            shown.Append(Rune.TryCreate(letter, out Rune rune) ? Quote.IsShown(rune) ? letter : ' ' : '?');
        if (start + Width < line.Length)
            shown.Append('…');
        return problem with { Excerpt = shown.ToString().TrimEnd(), CaretAt = caretShown };
    }
}
