using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>
/// The picture of a run: the falling level with the stop and the events, the flow, the headspace where it has a pressure
/// of its own, and the low-point pressure against its limit, over one time axis; upright, in the proportions of an A4 page.
/// </summary>
public static class RunPicture
{
    /// <summary>Width, px.</summary>
    public const int Width = 1240;

    /// <summary>Height, px.</summary>
    public const int Height = 1700;

    private const float Left = 118;
    private const float Right = Width - 40;

    /// <summary>Draws a run and writes it as PNG: the same bytes for the same run on every machine.</summary>
    /// <param name="stream">receives the PNG; left open</param>
    /// <param name="report">the run and how it is told</param>
    /// <exception cref="IOException">the stream refuses</exception>
    public static void Write(Stream stream, RunReport report)
    {
        using var sheet = new Sheet(Width, Height);
        float top = PageText.Head(sheet, report, Verdict.Sentence(report.Result, report.Format));
        PageText.Foot(sheet, report.Result.Job, report.Format);
        var course = new Course(report.Result);
        var axis = new TimeAxis(course.End, report.Clock);
        float room = Height - 102 - top;
        bool hasGas = HeadspaceRow.IsNeeded(report.Result);
        (float level, float flow, float gas) = hasGas ? (0.37f, 0.19f, 0.20f) : (0.47f, 0.23f, 0);
        DrawLevel(sheet, report, course, axis, Row(top, level * room));
        FlowRow.Draw(sheet, report, course, axis, Row(top + level * room, flow * room));
        if (hasGas)
        {
            HeadspaceRow.Draw(sheet, report, course, axis, Row(top + (level + flow) * room, gas * room));
        }
        float above = level + flow + gas;
        DrawPressure(sheet, report, course, axis, Row(top + above * room, (1 - above) * room));
        sheet.Write(stream);
    }

    private static SKRect Row(float top, float height) => new(Left, top + 44, Right, top + height - 44);

    private static void DrawLevel(Sheet sheet, RunReport report, Course course, TimeAxis axis, SKRect frame)
    {
        DrainResult result = report.Result;
        var profile = new LineProfile(result.Job.Line);
        double start = result.Job.Level;
        (double least, double most) = LevelPanel.Range(result, profile);
        Unit unit = report.Format.LengthUnit(Math.Max(start, most - least));
        Panel panel = axis.Panel(frame, (unit.From(least), unit.From(most)), 8);
        double[] xs = axis.Times(course);
        double[] ys = course.Values(now => now.Level, unit.Size);
        panel.Tint(xs, ys, Palette.LiquidTint);
        panel.Curve(xs, ys, Palette.Liquid);
        double[]? below = LevelPanel.ReceiverSurface(result) is { } bottom
            ? course.Values(now => bottom + (now.ReceiverLevel ?? 0), unit.Size) : null;
        if (below is not null)
        {
            panel.Curve(xs, below, Palette.Receiver, isDashed: true);
        }
        panel.Draw(sheet);
        PageText.RowTitle(sheet, frame, below is null ? $"Level in the tank, {unit.Sign}" : $"Surfaces above the tank's lowest point, {unit.Sign}");
        var notes = new Notes(sheet, panel);
        notes.KeepClearOf(xs, ys);
        if (below is not null)
        {
            notes.KeepClearOf(xs, below);
            notes.AddAlong(xs, below, PageText.Note(Palette.Receiver), "surface in the receiver");
        }
        new LevelPanel(sheet, panel, report, axis, unit, notes).Annotate(profile);
    }

    private static void DrawPressure(Sheet sheet, RunReport report, Course course, TimeAxis axis, SKRect frame)
    {
        DrainResult result = report.Result;
        double limit = LineProfile.PressureLimit(result.Job);
        double[] finite = [.. course.Instants.Select(now => now.LowPointPressure).Where(double.IsFinite), limit];
        Unit unit = report.Format.PressureUnit(Math.Max(finite.Max(), 1000));
        double most = unit.From(Math.Max(finite.Max(), 1000));
        double least = unit.From(Math.Min(finite.Min(), 0));
        double below = Math.Min(least, unit.From(limit)) < 0.03 * most ? 0.05 : 0;
        Panel panel = axis.Panel(frame, (least - below * (most - least), most + 0.2 * (most - least)), 7);
        double[] xs = axis.Times(course);
        double[] ys = course.Values(now => now.LowPointPressure, unit.Size);
        panel.Curve(xs, ys, Palette.Pressure);
        panel.Draw(sheet);
        PageText.RowTitle(sheet, frame, $"Lowest pressure in the line, {unit.Sign} absolute");
        PageText.AxisTitle(sheet, frame, axis.Title);
        var notes = new Notes(sheet, panel);
        notes.KeepClearOf(xs, ys);
        axis.MarkEnd(sheet, panel, notes);
        string name = LineProfile.IsLimitGiven(result.Job) ? "least pressure allowed" : "vapour pressure";
        notes.Reference(unit.From(limit), $"{name} {report.Format.Pressure(limit)}",
            PageText.Note(Palette.Limit), isAbove: true, width: 3);
        MarkWorst(sheet, panel, notes, report, axis, unit);
    }

    private static void MarkWorst(
        Sheet sheet, Panel panel, Notes notes, RunReport report, TimeAxis axis, Unit unit)
    {
        Extreme worst = report.Result.LeastMargin;
        double pressure = report.Result.Trace.At(Math.Clamp(worst.Time, 0, axis.End)).LowPointPressure;
        if (!double.IsFinite(pressure) || !double.IsFinite(worst.Value))
        {
            return;
        }
        SKPoint at = panel.At(axis.At(worst.Time), unit.From(pressure));
        sheet.Dot(at, 7, Palette.Pressure);
        string margin = PageText.Margin(report, "the limit");
        string when = axis.End > 0 ? ", " + MeasureFormat.Duration(worst.Time) : "";
        notes.Add(at, PageText.Note(Palette.Pressure), 300, true, "worst: " + margin,
            report.Format.Pressure(pressure) + when);
    }
}
