using System.Globalization;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies;

namespace DrainSim.Cli.Terminal;

/// <summary>What a sizing found, on the terminal.</summary>
internal static class SizeBlock
{
    /// <summary>Writes the values found, the standard sizes beside them, and where the files are.</summary>
    public static void Write(TextWriter output, SizePlan plan, SizingResult result, IReadOnlyList<StandardCase> standard,
        IReadOnlyList<string> files, UnitSystem units)
    {
        var format = new MeasureFormat(units);
        output.WriteLine(plan.Scenario.Base.Title);
        bool isFirst = true;
        foreach (string line in SizeWording.Lines(plan, result, units))
        {
            foreach (string part in Paragraph.Lines((isFirst ? "" : "  ") + line, Paragraph.Width, hang: isFirst ? 0 : 4))
                output.WriteLine(part);
            isFirst = false;
        }

        if (standard.Count > 0)
        {
            output.WriteLine();
            Table(plan, result.Target, standard, format).WriteText(output);
        }

        output.WriteLine();
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{result.Runs} runs. Files: {string.Join(", ", files)}"));
    }

    private static ColumnTable Table(SizePlan plan, SizingTarget target, IReadOnlyList<StandardCase> standard, MeasureFormat format)
    {
        var table = new ColumnTable(
            new Column { Title = "standard size" },
            new Column { Title = "bore", IsNumber = true },
            new Column { Title = target.Quantity?.Name.Replace('_', ' ') ?? "limits", IsNumber = true },
            new Column { Title = "against the target" },
            new Column { Title = "outcome" },
            new Column { Title = "least margin", IsNumber = true });
        foreach (StandardCase size in standard)
        {
            DrainSim.Studies.RunSummary? run = size.Result.Run;
            double? value = run is null ? null : target.Quantity?.Of(run);
            table.Add(
                size.Size.Id,
                SizeWording.Value(plan, size.Size.Bore),
                target.Quantity is { } quantity && value is { } known ? ResultWording.Text(quantity, known, format)
                    : target.Quantity is null && run is not null ? run.BrokenLimits.IsEmpty ? "kept" : "broken" : "",
                target.Quantity is { } wanted && value is { } given
                    ? ResultWording.Text(wanted, Math.Abs(given - target.Value), format) + (given > target.Value ? " more" : " less")
                    : "",
                run is null ? size.Result.Cause : OutcomeCodes.Code(run.Outcome),
                run is { NoStart: null } ? format.Pressure(run.LeastMargin) : "");
        }

        return table;
    }
}
