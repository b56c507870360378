using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>
/// The picture of a line: its elevation with the pressure head along it, and the pressure against its limit,
/// at the start and at the worst moment, over the length of the line.
/// </summary>
public static class LinePicture
{
    /// <summary>Width, px.</summary>
    public const int Width = 1240;

    /// <summary>Height, px.</summary>
    public const int Height = 1300;

    private const float Left = 118;
    private const float Right = Width - 40;

    /// <summary>Draws a line and writes it as PNG: the same bytes for the same run on every machine.</summary>
    /// <param name="stream">receives the PNG; left open</param>
    /// <param name="report">the run and how it is told</param>
    /// <exception cref="IOException">the stream refuses</exception>
    public static void Write(Stream stream, RunReport report)
    {
        using var sheet = new Sheet(Width, Height);
        var along = new LinePressures(report.Result);
        float top = PageText.Head(sheet, report, Subtitle(report, along));
        PageText.Foot(sheet, report.Result.Job, report.Format);
        float room = Height - 102 - top;
        DrawElevation(sheet, report, along, new SKRect(Left, top + 44, Right, top + 0.58f * room - 44));
        var lower = new SKRect(Left, top + 0.58f * room + 44, Right, top + room - 44);
        DrawPressure(sheet, report, along, lower);
        sheet.Write(stream);
    }

    private static string Subtitle(RunReport report, LinePressures along)
    {
        string margin = PageText.Margin(report, Verdict.LimitName(report.Result.Job));
        if (along.Named?.Name is { } name)
        {
            margin += $", in {name}";
        }
        return along.Worst.Time > 0
            ? $"Worst moment: {MeasureFormat.Duration(along.Worst.Time)} after the start, {margin}."
            : $"Worst moment: the start, {margin}.";
    }

    private static void DrawElevation(Sheet sheet, RunReport report, LinePressures along, SKRect frame)
    {
        double[] startHead = along.Heads(along.Pressures(along.Start));
        double[] worstHead = along.Heads(along.Pressures(along.Worst));
        double[] all = Finite([.. along.Elevations, .. startHead, .. worstHead, along.Start.Level, 0]);
        Unit unit = report.Format.LengthUnit(all.Max() - all.Min());
        Panel panel = Frame(frame, report, along, unit, all, 0.12, 8);
        double[] xs = InUnit(along.Distances, LengthUnit(report, along));
        double[] pipe = InUnit(along.Elevations, unit);
        double[] start = InUnit(startHead, unit);
        double[] worst = InUnit(worstHead, unit);
        DrawCurves(panel, xs, start, worst, along);
        panel.Curve(xs, pipe, Palette.Ink);
        panel.Draw(sheet);
        PageText.RowTitle(sheet, frame, $"Elevation above the tank's lowest point, {unit.Sign}");
        var notes = new Notes(sheet, panel);
        notes.KeepClearOf(xs, pipe);
        notes.KeepClearOf(xs, start);
        notes.KeepClearOf(xs, worst);
        MarkPipe(sheet, panel, notes, report, along, unit);
        NameCurves(notes, xs, start, worst, along, "head");
    }

    private static void MarkPipe(
        Sheet sheet, Panel panel, Notes notes, RunReport report, LinePressures along, Unit unit)
    {
        Unit length = LengthUnit(report, along);
        int last = along.Elevations.Length - 1;
        var marks = new List<(int Node, string Name)> { (0, "inlet"), (last, "outlet") };
        if (along.CrestIndex > 0 && along.CrestIndex < last)
        {
            marks.Add((along.CrestIndex, "crest"));
        }
        foreach ((int node, string name) in marks)
        {
            SKPoint at = panel.At(length.From(along.Distances[node]), unit.From(along.Elevations[node]));
            sheet.Dot(at, 7, Palette.Ink);
            notes.KeepClearOf(at, 8);
            notes.Add(at, PageText.Note(Palette.Ink), 300, false, $"{name} {report.Format.Length(along.Elevations[node])}");
        }
    }

    private static void DrawPressure(Sheet sheet, RunReport report, LinePressures along, SKRect frame)
    {
        Job job = report.Result.Job;
        double limit = LineProfile.PressureLimit(job);
        double[] startPressure = along.Pressures(along.Start);
        double[] worstPressure = along.Pressures(along.Worst);
        double[] all = Finite([.. startPressure, .. worstPressure, limit, 0]);
        Unit unit = report.Format.PressureUnit(all.Max());
        Panel panel = Frame(frame, report, along, unit, all, 0.16, 7);
        double[] xs = InUnit(along.Distances, LengthUnit(report, along));
        double[] start = InUnit(startPressure, unit);
        double[] worst = InUnit(worstPressure, unit);
        DrawCurves(panel, xs, start, worst, along);
        panel.Draw(sheet);
        PageText.RowTitle(sheet, frame, $"Pressure in the line, {unit.Sign} absolute");
        PageText.AxisTitle(sheet, frame, $"length along the line from the inlet, {LengthUnit(report, along).Sign}");
        var notes = new Notes(sheet, panel);
        notes.KeepClearOf(xs, start);
        notes.KeepClearOf(xs, worst);
        notes.Reference(unit.From(limit), $"{Verdict.LimitName(job)[4..]} {report.Format.Pressure(limit)}",
            PageText.Note(Palette.Limit), isAbove: true, width: 3);
        MarkLowPoint(sheet, panel, notes, report, xs, worst, worstPressure);
        NameCurves(notes, xs, start, worst, along, "pressure");
    }

    private static void MarkLowPoint(Sheet sheet, Panel panel, Notes notes, RunReport report,
        double[] xs, double[] worst, double[] pressures)
    {
        int low = 0;
        for (int node = 1; node < pressures.Length - 1; node++)
        {
            low = pressures[node] < pressures[low] ? node : low;
        }
        if (!double.IsFinite(worst[low]))
        {
            return;
        }
        SKPoint at = panel.At(xs[low], worst[low]);
        sheet.Dot(at, 7, Palette.Pressure);
        notes.KeepClearOf(at, 8);
        notes.Add(at, PageText.Note(Palette.Pressure), 300, true, $"low point {report.Format.Pressure(pressures[low])}");
    }

    private static void DrawCurves(Panel panel, double[] xs, double[] start, double[] worst, LinePressures along)
    {
        panel.Curve(xs, start, Palette.Liquid);
        if (along.Worst.Time > 0)
        {
            panel.Curve(xs, worst, Palette.Pressure, isDashed: true);
        }
    }

    private static void NameCurves(
        Notes notes, double[] xs, double[] start, double[] worst, LinePressures along, string quantity)
    {
        if (along.Worst.Time > 0)
        {
            notes.AddAlong(xs, start, PageText.Note(Palette.Liquid), $"{quantity} {along.StartName}");
            notes.AddAlong(xs, worst, PageText.Note(Palette.Pressure), $"{quantity} at the worst moment");
        }
        else
        {
            notes.AddAlong(xs, start, PageText.Note(Palette.Liquid), $"{quantity} at the start, the worst moment");
        }
    }

    private static Panel Frame(SKRect frame, RunReport report, LinePressures along, Unit unit, double[] all,
        double room, int steps)
    {
        double least = unit.From(all.Min());
        double most = unit.From(all.Max());
        double span = most > least ? most - least : 1;
        (double Least, double Most) vertical = (least - 0.05 * span, most + room * span);
        double length = LengthUnit(report, along).From(along.Distances[^1]);
        (double Least, double Most) horizontal = (-0.02 * Math.Max(length, 1e-3), 1.04 * Math.Max(length, 1e-3));
        var panel = new Panel(frame, horizontal, vertical);
        panel.SetTicks(AxisTicks.Decimal(horizontal.Least, horizontal.Most, 10),
            AxisTicks.Decimal(vertical.Least, vertical.Most, steps));
        return panel;
    }

    private static Unit LengthUnit(RunReport report, LinePressures along) =>
        report.Format.LengthUnit(Math.Max(along.Distances[^1], 1));

    private static double[] InUnit(double[] values, Unit unit) => [.. values.Select(unit.From)];

    private static double[] Finite(double[] values) => [.. values.Where(double.IsFinite)];
}
