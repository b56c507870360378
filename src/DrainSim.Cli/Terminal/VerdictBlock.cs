using System.Globalization;
using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Reports;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;

namespace DrainSim.Cli.Terminal;

/// <summary>What a planner reads after a run: one screen, the verdict first.</summary>
internal static class VerdictBlock
{
    /// <summary>A margin that a gauge could not tell from none, Pa.</summary>
    private const double LeastToldMargin = 1;

    /// <summary>Writes the whole block.</summary>
    public static void Write(TextWriter output, FinishedRun run)
    {
        RunReport report = run.Report;
        DrainResult result = report.Result;
        var format = new MeasureFormat(report.Units);
        output.WriteLine(report.Title);
        output.WriteLine(Verdict.Sentence(result, format));
        output.WriteLine();
        foreach ((string label, string text) in Facts(result, format, report.Clock))
            WriteParagraph(output, $"  {label,-14}{text}", hang: 16);
        if (result.Lines.Count > 1)
            WriteList(output, "Lines", result.Lines.Select((line, i) => LimitWording.Text(line, i, format)));
        WriteList(output, "Limits", result.LimitChecks.Select(check => LimitWording.Text(check, format)));
        WriteSection(output, "Levels to expect", LevelTable.Lines(result, format, report.Clock));
        WriteList(output, "What would let it go on", result.Remedies.Select(remedy => EventWording.Text(remedy, format)));
        WriteList(output, "Warnings", Warnings(run));
        WriteList(output, "Cautions", Cautions.For(result, format).Select(caution => caution.Text));
        if (run.Files.Count > 0)
        {
            output.WriteLine();
            output.WriteLine("Files: " + FileList(run));
        }
    }

    /// <summary>Writes the verdict in one line, with the scenario's name where it is one of several.</summary>
    public static void WriteLine(TextWriter output, FinishedRun run, bool isAlone, bool withWarnings)
    {
        string sentence = Verdict.Sentence(run.Report.Result, new MeasureFormat(run.Report.Units));
        output.WriteLine(isAlone ? sentence : $"{run.Report.Name}: {sentence}");
        if (!withWarnings)
            return;
        foreach (string line in Warnings(run).SelectMany(text => Paragraph.Lines("  - " + text, Paragraph.Width, hang: 4)))
            output.WriteLine(line);
    }

    /// <summary>What was suspicious in the scenario and what makes its result less sure.</summary>
    private static IEnumerable<string> Warnings(FinishedRun run)
    {
        var format = new MeasureFormat(run.Report.Units);
        return run.Reading.Warnings
            .Select(warning => string.Create(CultureInfo.InvariantCulture, $"Line {warning.Line}, {warning.Key}: {warning.Sentence}"))
            .Concat(run.Report.Result.Warnings.Select(warning => EventWording.Text(warning, format)));
    }

    private static IEnumerable<(string Label, string Text)> Facts(DrainResult result, MeasureFormat format, Clock? clock)
    {
        if (result.NoStart is null)
        {
            string byClock = clock is null ? "" : $", {clock.Moment(result.StoppedAt)} ({clock.Zone})";
            yield return ("Finish", $"{MeasureFormat.Duration(result.StoppedAt)} after the start{byClock}{Tail(result)}");
        }
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
            yield return ("Low point", LowPoint(result, format));
        }
        if (AirBand(result, format) is { } band)
            yield return ("Air", band);
        if (result.LargestVacuum is { } vacuum)
            yield return ("Headspace", Headspace(vacuum, result.Job, format));
        if (result.ReceiverLevel is { } depth)
            yield return ("Receiver", $"{format.Length(depth)} deep when it stopped");
        if (result.BalanceLevel is { } balance)
            yield return ("Balance", $"inflow and outflow are equal at a level of {format.Length(balance)}");
        if (result.Lines is [{ RanFullAt: { } full }, ..])
            yield return ("Line full", $"{MeasureFormat.Duration(full)} after the start");
        if (result.Prime is { } prime)
            yield return ("To start", Prime(prime, format));
    }

    /// <summary>Where the last hundredth takes longer than all the rest: when the rest is done.</summary>
    private static string Tail(DrainResult result)
    {
        double? most = result.Trace.TimeAtVolume(0.01 * result.InitialVolume);
        return most < 0.5 * result.StoppedAt ? $"; 99 % is out after {MeasureFormat.Duration(most.Value)}" : "";
    }

    private static string? AirBand(DrainResult result, MeasureFormat format)
    {
        DrainEvent may = result.Events.FirstOrDefault(moment => moment.Code == EventCode.AirMayBeDrawn);
        DrainEvent likely = result.Events.FirstOrDefault(moment => moment.Code == EventCode.AirDrawn);
        if (may.Code != EventCode.AirMayBeDrawn)
            return null;
        string from = $"a vortex may draw it into the inlet from a level of {format.Length(may.Level)} ({MeasureFormat.Duration(may.Time)}) down";
        return likely.Code == EventCode.AirDrawn
            ? $"{from}, and likely does from {format.Length(likely.Level)} ({MeasureFormat.Duration(likely.Time)})"
            : from;
    }

    private static string Headspace(Extreme vacuum, Job job, MeasureFormat format)
    {
        string largest = vacuum.Value > 1
            ? $"{format.Pressure(vacuum.Value)} below the atmosphere at most,{When(vacuum.Time)}"
            : "never below the atmosphere";
        return job.VacuumRating is { } rating ? $"{largest}; the tank is rated for {format.Pressure(rating)}" : largest;
    }

    private static string LowPoint(DrainResult result, MeasureFormat format)
    {
        Job job = result.JobAt(result.LeastMargin.Time);
        int index = result.Lines.Select((line, i) => (line.LeastMargin.Value, i)).Min().i;
        Line worst = job.DrawOffs[index].Line;
        LineNode node = new LineHydraulics(worst, job.Liquid, job.Site.Gravity).Node(result.LeastMarginNode);
        string margin = result.LeastMargin.Value < LeastToldMargin
            ? "at its limit"
            : $"at least {format.Pressure(result.LeastMargin.Value)} above its limit";
        double pressure = result.Trace.At(Math.Clamp(result.LeastMargin.Time, 0, result.Trace.End)).LowPointPressure;
        string place = node.Item is { } item && worst.Path[item].Name is { } name ? $", at {name}" : "";
        place += job.DrawOffs.Count > 1 ? $" of {LimitWording.NameOf(worst, index)}" : "";
        return $"{margin}: {format.Pressure(pressure)} absolute{When(result.LeastMargin.Time)}, "
            + $"{format.Length(node.Elevation)} up{place}";
    }

    private static string Prime(PrimeReport prime, MeasureFormat format) =>
        $"{format.Volume(prime.LineVolume)} fills the line; it runs by itself once the front in the outer leg stands "
        + $"below {format.Length(prime.FrontElevation)}; static lift {format.Length(prime.StaticLift)} of at most "
        + $"{format.Length(prime.LiftLimit)}, suction {format.Pressure(prime.Suction)}"
            + (prime.DipFills is { } fills ? $"; by hand {MeasureFormat.Number(fills)} × dipped and capped" : "");

    private static string When(double time) =>
        time <= 0 ? " at the start" : $" after {MeasureFormat.Duration(time)}";

    /// <summary>The files, with the folder and the name once.</summary>
    private static string FileList(FinishedRun run)
    {
        string start = run.Files[0][..(run.Files[0].LastIndexOf(run.Report.Name, StringComparison.Ordinal) + run.Report.Name.Length)];
        return run.Files[0] + string.Concat(run.Files.Skip(1).Select(file => ", " + file[start.Length..]));
    }

    private static void WriteSection(TextWriter output, string heading, IEnumerable<string> lines)
    {
        bool isFirst = true;
        foreach (string line in lines)
        {
            if (isFirst)
            {
                output.WriteLine();
                output.WriteLine(heading);
            }
            isFirst = false;
            output.WriteLine(line);
        }
    }

    private static void WriteList(TextWriter output, string heading, IEnumerable<string> items) =>
        WriteSection(output, heading, items.SelectMany(item => Paragraph.Lines("  - " + item, Paragraph.Width, hang: 4)));

    private static void WriteParagraph(TextWriter output, string text, int hang)
    {
        foreach (string line in Paragraph.Lines(text, Paragraph.Width, hang))
            output.WriteLine(line);
    }
}
