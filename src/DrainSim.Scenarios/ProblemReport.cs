using System.Globalization;
using System.Text;

namespace DrainSim.Scenarios;

/// <summary>The problems of one scenario as text for people.</summary>
public static class ProblemReport
{
    /// <summary>Most problems that are printed; the closing line counts all.</summary>
    public const int MostShown = 50;

    /// <summary>Every problem with its line and a caret, and a closing line; lines end in a line feed.</summary>
    /// <param name="scenarioFile">the scenario's file as the user named it</param>
    /// <param name="problems">the refusals, in file order; at least one</param>
    public static string Refusal(string scenarioFile, IReadOnlyList<Problem> problems)
    {
        ArgumentNullException.ThrowIfNull(problems);
        StringBuilder text = new(Entries(scenarioFile, problems));
        string count = problems.Count == 1
            ? "1 problem"
            : string.Create(CultureInfo.InvariantCulture, $"{problems.Count} problems");
        string shown = problems.Count > MostShown
            ? string.Create(CultureInfo.InvariantCulture, $", the first {MostShown} shown")
            : "";
        return text.Append(count).Append(shown).Append(". Nothing was run and nothing was written.\n").ToString();
    }

    /// <summary>Every problem or warning with its line and a caret; lines end in a line feed.</summary>
    /// <param name="scenarioFile">the scenario's file as the user named it</param>
    /// <param name="problems">problems or warnings, in file order</param>
    public static string Entries(string scenarioFile, IReadOnlyList<Problem> problems)
    {
        ArgumentNullException.ThrowIfNull(problems);
        StringBuilder text = new();
        foreach (Problem problem in problems.Take(MostShown))
        {
            text.Append(problem.Text(scenarioFile)).Append('\n');
            if (problem.Excerpt is not { } excerpt)
                continue;
            string number = problem.Line.ToString(CultureInfo.InvariantCulture).PadLeft(4);
            text.Append(number).Append(" | ").Append(excerpt).Append('\n');
            text.Append(' ', number.Length).Append(" | ").Append(' ', problem.CaretAt).Append("^\n");
        }
        return text.ToString();
    }
}
