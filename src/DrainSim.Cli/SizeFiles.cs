using System.Text;
using DrainSim.Reports.Files;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Pictures;
using DrainSim.Reports.Studies;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies;

namespace DrainSim.Cli;

/// <summary>Writes what a sizing looked at and found: <c>NAME.size.csv</c> and <c>NAME.size.png</c>.</summary>
/// <param name="plan">the sizing</param>
/// <param name="result">what it found</param>
/// <param name="standard">the standard sizes beside it</param>
/// <param name="units">units for people</param>
internal sealed class SizeFiles(SizePlan plan, SizingResult result, IReadOnlyList<StandardCase> standard, UnitSystem units)
{
    /// <summary>Writes both files, or none.</summary>
    /// <param name="folder">where they go</param>
    /// <returns>their paths</returns>
    public IReadOnlyList<string> Write(string folder)
    {
        List<(string Kind, double Value, CaseResult Result)> cases =
        [
            .. result.Scan.Select(point => ("looked_at", point.Value, point.Result)),
            .. result.Values.Select(value => (value.IsJump ? "jump" : "found", value.Value, new CaseResult(value.Run, ""))),
            .. standard.Select(size => (size.Size.Id, size.Size.Bore, size.Result)),
        ];
        string csv = Table(cases);
        string name = plan.Scenario.Base.Name + ".size";
        using var output = new OutputFolder(folder);
        output.Write(name + ".csv", stream => stream.Write(Encoding.UTF8.GetBytes(csv)));
        output.Write(name + ".png", stream => SweepPicture.Write(stream, Report(csv)));
        return output.Complete();
    }

    private string Table(List<(string Kind, double Value, CaseResult Result)> cases)
    {
        using var table = new SweepTable();
        var text = new StringBuilder(SweepTable.Header(["kind", plan.Parameter.Column]));
        for (int i = 0; i < cases.Count; i++)
        {
            (string kind, double value, CaseResult found) = cases[i];
            text.Append(table.Row(i + 1, [new ParameterCell(double.NaN, kind), new ParameterCell(value, null)], found));
        }

        return text.ToString();
    }

    private SweepReport Report(string csv)
    {
        var unit = plan.Parameter.Unit!;
        bool isLogarithmic = result.From > 0 && result.To > 3 * result.From && unit.Offset == 0;
        (SweepRow Row, double Value)[] rows = [.. SweepRows.ReadText(csv, 2)
            .Select(row => (row, NumberText.TryRead(row.Parameters[1], out double value) ? value : 0))
            .Where(row => row.Item1.Parameters[0] is "looked_at" or "found")
            .OrderBy(row => row.Item2)];
        SizingTarget target = plan.Target;
        return new SweepReport
        {
            Title = plan.Scenario.Base.Title,
            Count = result.Runs,
            Axes = [SweepFigure.AxisOf(plan.Parameter, isLogarithmic, [])],
            Points = [.. rows.Select(row => new SweepPoint([unit.FromSi(row.Value)], row.Row))],
            TargetTime = target.Quantity == ResultQuantity.DrainTime ? target.Value : null,
            TargetMargin = target.Quantity == ResultQuantity.LeastMargin ? target.Value : null,
            Marks =
            [
                .. result.Values.Select(value => (unit.FromSi(value.Value), SizeWording.Value(plan, value.Value, 4), true)),
                .. standard.Select(size => (unit.FromSi(size.Size.Bore), size.Size.Id, false)),
            ],
            Units = units,
            Subtitle = SizeWording.Brief(plan, result, units),
        };
    }
}
