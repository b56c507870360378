using System.Globalization;
using System.Text;

namespace DrainSim.Scenarios;

/// <summary>The problems of one scenario as text for people.</summary>
public static class ProblemReport
{
    /// <summary>Every problem with its line and a caret, and a closing line; empty when there is no problem.</summary>
    /// <param name="reading">the reading of the file</param>
    public static string Refusal(ScenarioReading reading)
    {
        ArgumentNullException.ThrowIfNull(reading);
        if (!reading.IsRefused)
            return "";
        int count = reading.Problems.Count + reading.Untold;
        string problems = count == 1 ? "1 problem" : string.Create(CultureInfo.InvariantCulture, $"{count} problems");
        string shown = reading.Untold > 0
            ? string.Create(CultureInfo.InvariantCulture, $", {reading.Problems.Count} of them shown")
            : "";
        return $"{Entries(reading.FileName, reading.Problems)}{problems}{shown}. Nothing was run and nothing was written.\n";
    }

    /// <summary>Problems or warnings, each with its line and a caret; lines end in a line feed.</summary>
    /// <param name="scenarioFile">the scenario's file as the user named it</param>
    /// <param name="problems">problems or warnings, in file order</param>
    public static string Entries(string scenarioFile, IReadOnlyList<Problem> problems)
    {
        ArgumentNullException.ThrowIfNull(problems);
        StringBuilder text = new();
        foreach (Problem problem in problems)
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
