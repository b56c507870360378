using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>The row of a picture that shows the flow out of the tank, in all and by each of several lines.</summary>
internal static class FlowRow
{
    /// <summary>Draws the row.</summary>
    public static void Draw(Sheet sheet, RunReport report, Course course, TimeAxis axis, SKRect frame)
    {
        DrainResult result = report.Result;
        double peak = course.Instants.Max(now => now.Flow);
        double[] inflow = [.. course.Instants.Select(now => result.JobAt(now.Time).Inflow?.Flow(now.Time) ?? 0)];
        double least = course.Instants.Min(now => Math.Min(now.Flow, now.LineFlows?.Min() ?? 0));
        double highest = Math.Max(peak, inflow.Max());
        Unit unit = report.Format.FlowUnit(Math.Max(highest, -least));
        double top = highest > 0 ? 1.32 * unit.From(highest) : least < 0 ? -0.2 * unit.From(least) : 1;
        Panel panel = axis.Panel(frame, (Math.Min(0, 1.1 * unit.From(least)), top), highest > 0 || least < 0 ? 4 : 0);
        double[] xs = axis.Times(course), ys = course.Values(now => now.Flow, unit.Size);
        double[][] each = [.. Enumerable.Range(0, result.Lines.Count > 1 ? result.Lines.Count : 0)
            .Select(i => course.Values(now => now.LineFlows?[i] ?? 0, unit.Size))];
        for (int i = 0; i < each.Length; i++)
        {
            panel.Curve(xs, each[i], ColorOf(i), isDashed: true);
        }
        panel.Curve(xs, ys, Palette.Flow);
        double[] into = [.. inflow.Select(unit.From)];
        bool isFed = inflow.Max() > 0;
        if (isFed)
        {
            panel.Curve(xs, into, Palette.Liquid, isDashed: true);
        }
        panel.Draw(sheet);
        PageText.RowTitle(sheet, frame, $"Flow out of the tank, {unit.Sign}");
        var notes = new Notes(sheet, panel);
        notes.KeepClearOf(xs, ys);
        foreach (double[] own in each)
        {
            notes.KeepClearOf(xs, own);
        }
        axis.MarkEnd(sheet, panel, notes);
        if (isFed)
        {
            notes.KeepClearOf(xs, into);
            notes.AddAlong(xs, into, PageText.Note(Palette.Liquid), "inflow");
        }
        MarkLargest(sheet, panel, notes, report, axis, unit, peak);
        for (int i = 0; i < each.Length; i++)
        {
            notes.AddAlong(xs, each[i], PageText.Note(ColorOf(i)), LimitWording.NameOf(result.Lines[i].DrawOff.Line, i));
        }
    }

    private static SKColor ColorOf(int line) => Palette.Lines[line % Palette.Lines.Length];

    private static void MarkLargest(
        Sheet sheet, Panel panel, Notes notes, RunReport report, TimeAxis axis, Unit unit, double peak)
    {
        Extreme largest = report.Result.LargestFlow;
        if (peak <= 0)
        {
            notes.Add(panel.At(0, 0), PageText.Note(Palette.Flow), 100, false, largest.Value > 0 ? "runs back" : "no flow");
            return;
        }
        SKPoint at = panel.At(axis.At(largest.Time), unit.From(largest.Value));
        sheet.Dot(at, 6, Palette.Flow);
        notes.Add(at, PageText.Note(Palette.Flow), 240, false, $"largest {report.Format.Flow(largest.Value)}");
    }
}
