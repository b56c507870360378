using DrainSim.Draining;
using DrainSim.Reports;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;

namespace DrainSim.Cli.Terminal;

/// <summary>What a planner reads after a run: one screen, the verdict first.</summary>
internal static class VerdictBlock
{
    /// <summary>Writes the block.</summary>
    /// <param name="output">takes it</param>
    /// <param name="report">the run and how it is told</param>
    /// <param name="readingWarnings">what was suspicious in the scenario, one line each</param>
    /// <param name="files">the files written; empty when none were</param>
    public static void Write(
        TextWriter output, RunReport report, IReadOnlyList<string> readingWarnings, IReadOnlyList<string> files)
    {
        DrainResult result = report.Result;
        var format = new MeasureFormat(report.Units);
        output.WriteLine(report.Title);
        WriteParagraph(output, Verdict.Sentence(result, format), hang: 0);
        output.WriteLine();
        foreach ((string label, string text) in Facts(result, format))
            WriteParagraph(output, $"  {label,-14}{text}", hang: 16);
        WriteSection(output, "Levels to expect", LevelTable.Lines(result, format));
        WriteList(output, "What would let it go on", [.. result.Remedies.Select(remedy => EventWording.Text(remedy, format))]);
        WriteList(output, "Warnings",
            [.. readingWarnings, .. result.Warnings.Select(warning => EventWording.Text(warning, format))]);
        WriteList(output, "Cautions", [.. Cautions.For(result.Job, format).Select(caution => caution.Text)]);
        if (files.Count > 0)
        {
            output.WriteLine();
            WriteParagraph(output, $"Files: {string.Join(", ", files)}", hang: 7);
        }
    }

    private static IEnumerable<(string Label, string Text)> Facts(DrainResult result, MeasureFormat format)
    {
        if (result.NoStart is null)
            yield return ("Finish", $"{MeasureFormat.Duration(result.StoppedAt)} after the start");
        yield return ("Left", $"{format.Volume(result.LeftVolume)} of {format.Volume(result.InitialVolume)}, "
            + $"at a level of {format.Length(result.FinalLevel)}");
        if (result.FallBack is { } back)
        {
            yield return ("Falls back", $"{format.Volume(back.IntoTank)} from the inner leg into the tank (level then "
                + $"{format.Length(back.LevelAfter)}); {format.Volume(back.OutOfOutlet)} run out at the outlet");
        }
        if (result.NoStart is null)
        {
            yield return ("Largest flow", $"{format.Flow(result.LargestFlow.Value)}{When(result.LargestFlow.Time)}, "
                + $"{format.Velocity(result.LargestVelocity.Value)} in the narrowest bore");
            yield return ("Low point", $"at least {format.Pressure(result.LeastMargin.Value)} above its limit, "
                + $"{format.Pressure(result.LeastLowPointPressure.Value)} absolute{When(result.LeastMargin.Time)}");
        }
        if (result.Prime is { } prime)
            yield return ("To start", Prime(prime, format));
    }

    private static string Prime(PrimeReport prime, MeasureFormat format) =>
        $"{format.Volume(prime.LineVolume)} fills the line; it runs by itself once the front in the outer leg stands "
        + $"below {format.Length(prime.FrontElevation)}; static lift {format.Length(prime.StaticLift)} of at most "
        + $"{format.Length(prime.LiftLimit)}, suction {format.Pressure(prime.Suction)}";

    private static string When(double time) =>
        time <= 0 ? " at the start" : $" after {MeasureFormat.Duration(time)}";

    private static void WriteSection(TextWriter output, string heading, IEnumerable<string> lines)
    {
        string[] all = [.. lines];
        if (all.Length == 0)
            return;
        output.WriteLine();
        output.WriteLine(heading);
        foreach (string line in all)
            output.WriteLine(line);
    }

    private static void WriteList(TextWriter output, string heading, IReadOnlyList<string> items) =>
        WriteSection(output, heading, items.SelectMany(item => Paragraph.Lines("  - " + item, Paragraph.Width, hang: 4)));

    private static void WriteParagraph(TextWriter output, string text, int hang)
    {
        foreach (string line in Paragraph.Lines(text, Paragraph.Width, hang))
            output.WriteLine(line);
    }
}
