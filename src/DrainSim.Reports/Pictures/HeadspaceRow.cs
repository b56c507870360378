using DrainSim.Draining;
using DrainSim.Reports.Measures;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>The row of a picture that shows the pressure in the headspace against the tank's ratings.</summary>
internal static class HeadspaceRow
{
    /// <summary>Pressure that fills the row of a tank that hardly breathes at all, Pa.</summary>
    private const double LeastSpan = 10;

    /// <summary>Whether a run has such a row: one whose gas has a pressure of its own.</summary>
    public static bool IsNeeded(DrainResult result) => result.HeadspacePressure is not null;

    /// <summary>Draws the row.</summary>
    public static void Draw(Sheet sheet, RunReport report, Course course, TimeAxis axis, SKRect frame)
    {
        Job job = report.Result.Job;
        double atmosphere = job.Site.AtmosphericPressure;
        double[] gauge = [.. course.Instants.Select(now => (now.HeadspacePressure ?? atmosphere) - atmosphere)];
        double[] shown = [.. gauge, 0, .. Ratings(job).Select(rating => rating.Value)];
        Unit unit = report.Format.PressureUnit(Math.Max(shown.Max(), -shown.Min()));
        double span = Math.Max(unit.From(shown.Max() - shown.Min()), unit.From(LeastSpan));
        (double least, double most) = (unit.From(shown.Min()) - 0.2 * span, unit.From(shown.Max()) + 0.25 * span);
        Panel panel = axis.Panel(frame, (least, most), 4);
        double[] xs = axis.Times(course), ys = [.. gauge.Select(unit.From)];
        panel.Curve(xs, ys, Palette.Pressure);
        panel.Draw(sheet);
        PageText.RowTitle(sheet, frame, $"Headspace above (+) or below (−) the atmosphere, {unit.Sign}");
        var notes = new Notes(sheet, panel);
        notes.KeepClearOf(xs, ys);
        axis.MarkEnd(sheet, panel, notes);
        foreach ((double value, string name) in Ratings(job))
        {
            notes.Reference(unit.From(value), $"{name} {report.Format.Pressure(Math.Abs(value))}",
                PageText.Note(Palette.Limit), isAbove: value < 0, width: 3);
        }
        if (report.Result.LargestVacuum is { Value: > 1 } vacuum && axis.End > 0)
        {
            SKPoint at = panel.At(axis.At(vacuum.Time), unit.From(-vacuum.Value));
            sheet.Dot(at, 6, Palette.Pressure);
            notes.Add(at, PageText.Note(Palette.Pressure), 300, false, $"largest vacuum {report.Format.Pressure(vacuum.Value)}");
        }
    }

    private static IEnumerable<(double Value, string Name)> Ratings(Job job)
    {
        if (job.VacuumRating is { } vacuum)
            yield return (-vacuum, "vacuum rating");
        if (job.PressureRating is { } pressure)
            yield return (pressure, "pressure rating");
        if (job.Limits?.LargestVacuum is { } limit && limit != job.VacuumRating)
            yield return (-limit, "largest vacuum allowed");
    }
}
