using System.Globalization;

namespace DrainSim.Scenarios;

/// <summary>One fault of a scenario, with its place.</summary>
/// <param name="Line">line in the file, from 1; 0 for a value that was set from outside the file</param>
/// <param name="Column">column in the file, from 1; 0 with line 0</param>
/// <param name="Key">dotted path of the key; empty when the fault is the file's as a whole</param>
/// <param name="Fault">what was found, without a full stop</param>
/// <param name="Accepted">what would be accepted, a sentence or a question without a full stop; empty when there is nothing to say</param>
public sealed record Problem(int Line, int Column, string Key, string Fault, string Accepted)
{
    /// <summary>Whether the scenario is refused or runs with a warning.</summary>
    public Severity Severity { get; init; }

    /// <summary>The file, when it is another than the scenario's, such as a strapping table; else null.</summary>
    public string? File { get; init; }

    /// <summary>The line of the file as printable text; null when there is none to show.</summary>
    public string? Excerpt { get; init; }

    /// <summary>Where the caret stands under <see cref="Excerpt"/>, characters before it.</summary>
    public int CaretAt { get; init; }

    /// <summary>Fault and help in one line of text.</summary>
    public string Sentence
    {
        get
        {
            string end = Accepted.Length > 0 && Accepted[^1] is '?' or '.' ? "" : ".";
            if (Accepted.Length == 0)
                return Fault + ".";
            string joint = char.IsLower(Accepted[0]) ? "; " : ". ";
            return Fault + joint + Accepted + end;
        }
    }

    /// <summary>File, line, column, key and sentence, as one line.</summary>
    /// <param name="scenarioFile">the scenario's file as the user named it</param>
    public string Text(string scenarioFile)
    {
        string place = Line > 0
            ? string.Create(CultureInfo.InvariantCulture, $"{File ?? scenarioFile}:{Line}:{Column}: ")
            : $"{File ?? scenarioFile}: ";
        string severity = Severity == Severity.Warning ? "warning: " : "";
        string key = Key.Length > 0 ? Key + ": " : "";
        return place + severity + key + Sentence;
    }
}
