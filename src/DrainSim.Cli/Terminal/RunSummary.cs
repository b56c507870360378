using DrainSim.Draining;
using DrainSim.Reports;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;

namespace DrainSim.Cli.Terminal;

/// <summary>Several runs in one table.</summary>
internal static class RunSummary
{
    /// <summary>Writes a row for each run, in their order, and where their files are.</summary>
    public static void Write(TextWriter output, IReadOnlyList<FinishedRun> runs, string folder)
    {
        var table = new ColumnTable(
            new Column { Title = "scenario" },
            new Column { Title = "outcome" },
            new Column { Title = "time", IsNumber = true },
            new Column { Title = "left", IsNumber = true },
            new Column { Title = "level", IsNumber = true },
            new Column { Title = "least margin", IsNumber = true });
        foreach (RunReport report in runs.Select(run => run.Report))
        {
            DrainResult result = report.Result;
            var format = new MeasureFormat(report.Units);
            bool hasRun = result.NoStart is null;
            table.Add(
                report.Name,
                OutcomeCodes.Code(result.Outcome),
                hasRun ? MeasureFormat.Duration(result.StoppedAt) : "",
                format.Volume(result.LeftVolume),
                format.Length(result.FinalLevel),
                hasRun ? format.Pressure(result.LeastMargin.Value) : "");
        }
        if (runs.Any(run => run.Files.Count > 0))
            table.Notes.Add($"Files: {folder}");
        table.Notes.Add("Levels, advice and cautions of one of them: run it alone.");
        table.Notes.Add(Cautions.Closing.Text);
        output.WriteLine();
        table.WriteText(output);
    }
}
