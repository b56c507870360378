using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Studies;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>The level curves of a few runs over each other, each with its name.</summary>
internal static class CoursePanel
{
    /// <summary>Draws the panel.</summary>
    /// <param name="sheet">the page</param>
    /// <param name="report">the sweep</param>
    /// <param name="frame">where its data lie, px</param>
    public static void Draw(Sheet sheet, SweepReport report, SKRect frame)
    {
        var format = new MeasureFormat(report.Units);
        var axis = new TimeAxis(report.Courses.Max(course => course.Result.StoppedAt), null);
        double most = report.Courses.Max(course => course.Result.Job.Level);
        Unit unit = format.LengthUnit(most);
        Panel panel = axis.Panel(frame, (0, 1.1 * unit.From(most)), 8);
        (string Name, double[] Xs, double[] Ys, SKColor Color)[] curves = [.. report.Courses.Select((course, i) => Curve(course, axis, unit, Palette.Step(i, report.Courses.Count)))];
        foreach ((_, double[] xs, double[] ys, SKColor color) in curves)
        {
            panel.Curve(xs, ys, color);
        }
        panel.Draw(sheet);
        PageText.RowTitle(sheet, frame, $"Level in the tank, {unit.Sign}");
        PageText.AxisTitle(sheet, frame, $"time since the start, {axis.Unit.Sign}");
        foreach ((_, double[] xs, double[] ys, SKColor color) in curves)
        {
            sheet.Dot(panel.At(xs[^1], ys[^1]), 5, color);
        }
        WriteNames(sheet, report, frame, curves);
    }

    /// <summary>Lists the curves at the upper right, which falling levels leave free.</summary>
    private static void WriteNames(Sheet sheet, SweepReport report, SKRect frame, (string Name, double[] Xs, double[] Ys, SKColor Color)[] curves)
    {
        TextLook look = PageText.Note(Palette.Ink);
        float width = curves.Max(curve => Sheet.Measure(curve.Name, look));
        float left = frame.Right - width - 12, y = frame.Top + look.LineHeight;
        string title = report.Axes[0].Name;
        sheet.Text(title, frame.Right - 12 - Sheet.Measure(title, look), y, look, halo: true);
        foreach ((string name, _, _, SKColor color) in curves)
        {
            y += look.LineHeight;
            sheet.Line(new SKPoint(left - 46, y - 7), new SKPoint(left - 12, y - 7), color, 4);
            sheet.Text(name, left, y, look, halo: true);
        }
    }

    private static (string, double[], double[], SKColor) Curve((string Name, DrainResult Result) course, TimeAxis axis, Unit unit, SKColor color)
    {
        var points = new Course(course.Result);
        return (course.Name, points.Values(now => now.Time, axis.Unit.Size), points.Values(now => now.Level, unit.Size), color);
    }
}
