using DrainSim.Reports.Measures;
using DrainSim.Reports.Studies;
using DrainSim.Reports.Wording;
using DrainSim.Studies.Uncertainty;

namespace DrainSim.Cli.Terminal;

/// <summary>What an uncertainty study found, on the terminal.</summary>
internal static class UncertaintyBlock
{
    /// <summary>Writes the verdict, the percentiles, the chances, the ranking, and where the files are.</summary>
    public static void Write(TextWriter output, UncertaintyReport report, IReadOnlyList<string> files)
    {
        UncertaintyResult result = report.Result;
        var format = new MeasureFormat(report.Units);
        output.WriteLine(report.Title);
        foreach (string line in Paragraph.Lines(UncertaintyWording.Sentence(result), Paragraph.Width, hang: 0))
            output.WriteLine(line);
        output.WriteLine();
        WritePercentiles(output, report, format);
        output.WriteLine();
        WriteChances(output, result, format);
        if (result.Study.Parameters.Count > 0)
            WriteShares(output, result);
        output.WriteLine();
        output.WriteLine("Files: " + string.Join(", ", files));
    }

    private static void WritePercentiles(TextWriter output, UncertaintyReport report, MeasureFormat format)
    {
        List<Column> columns =
        [
            new Column { Title = "" },
            new Column { Title = "drain time", IsNumber = true },
            new Column { Title = "left in the tank", IsNumber = true },
        ];
        if (report.Clock is not null)
            columns.Add(new Column { Title = "finish", IsNumber = true });
        var table = new ColumnTable(columns);
        for (int k = 0; k < report.Result.DrainTime.Count; k++)
        {
            Percentile time = report.Result.DrainTime[k];
            List<string> cells = [UncertaintyWording.Name(time), UncertaintyWording.Time(time), UncertaintyWording.Volume(report.Result.LeftVolume[k], format)];
            if (report.Clock is { } clock)
                cells.Add(double.IsFinite(time.Value) ? clock.DayAndTime(time.Value) : "");
            table.Add([.. cells]);
        }

        table.Notes.Add("P95: 95 of 100 cases stay below; a job that is not done takes for ever. ±: 95 % interval over other seeds.");
        table.WriteText(output);
    }

    private static void WriteChances(TextWriter output, UncertaintyResult result, MeasureFormat format)
    {
        var table = new ColumnTable(new Column { Title = "chance of" }, new Column { Title = "share (95 % interval)", IsNumber = true });
        foreach (OutcomeChance one in result.Outcomes)
            table.Add(OutcomeCodes.Code(one.Outcome), UncertaintyWording.Chance(one.Chance));
        foreach (LimitChance limit in result.Limits)
            table.Add($"{LimitWording.Bound(limit.Kind, limit.Bound, format)}: kept", UncertaintyWording.Chance(limit.Kept));
        if (result.Limits.Count > 1 && result.AllLimits is { } all)
            table.Add("all limits kept", UncertaintyWording.Chance(all));
        if (result.Refused > 0)
            table.Notes.Add($"{result.Refused} of {result.Count} samples make no job and count in nothing: {result.FirstFault}.");
        table.WriteText(output);
    }

    private static void WriteShares(TextWriter output, UncertaintyResult result)
    {
        var table = new ColumnTable(
            new Column { Title = "uncertain", IsWrapped = true }, new Column { Title = "spread", IsWrapped = true },
            new Column { Title = "of the time's spread", IsNumber = true }, new Column { Title = "of the volume's", IsNumber = true });
        SpreadShares? time = result.DrainTimeShares, left = result.LeftVolumeShares;
        foreach (int j in Enumerable.Range(0, result.Study.Parameters.Count).OrderByDescending(j => (time ?? left)?.Shares[j] ?? 0))
        {
            UncertainParameter parameter = result.Study.Parameters[j];
            table.Add(parameter.Path, parameter.Spread.Text(parameter.Unit),
                time is null ? "does not vary" : UncertaintyWording.Share(time.Shares[j]),
                left is null ? "does not vary" : UncertaintyWording.Share(left.Shares[j]));
        }

        if ((time ?? left) is { } shares)
            table.Notes.Add(UncertaintyWording.SharesNote(shares));
        foreach (UncertainParameter usual in result.Study.Parameters.Where(parameter => parameter.Source is not null))
            table.Notes.Add($"{usual.Path}: {usual.Source}.");
        output.WriteLine();
        table.WriteText(output);
    }
}
