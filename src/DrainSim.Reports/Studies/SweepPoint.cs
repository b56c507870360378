namespace DrainSim.Reports.Studies;

/// <summary>A case of a sweep in a picture.</summary>
/// <param name="Values">the values of the axes, in their units</param>
/// <param name="Row">what became of it</param>
public sealed record SweepPoint(IReadOnlyList<double> Values, SweepRow Row)
{
    /// <summary>Whether the job was done.</summary>
    public bool IsDone => Row.DrainTime is not null;

    /// <summary>Why the job was not done, in a few words.</summary>
    public string Cause => Row.Outcome == SweepTable.Impossible
        ? Row.Reason[(Row.Reason.IndexOf(": ", StringComparison.Ordinal) is var colon && colon >= 0 ? colon + 2 : 0)..]
        : Row.Reason.Length > 0 ? $"{Row.Outcome.Replace('_', ' ')}: {Row.Reason.Replace('_', ' ')}" : Row.Outcome.Replace('_', ' ');

    /// <summary>The kind of ending, by which neighbours are taken together.</summary>
    public string Kind => Row.Outcome == SweepTable.Impossible ? SweepTable.Impossible : Row.Outcome + Row.Reason;
}
