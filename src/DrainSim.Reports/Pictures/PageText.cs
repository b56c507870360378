using System.Globalization;
using DrainSim.Draining;
using DrainSim.Reports.Measures;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>What stands around the panels of a page: title, verdict, headings, foot.</summary>
internal static class PageText
{
    private const float Margin = 44;

    private static readonly TextLook TitleLook = new(36, Palette.Ink, IsBold: true);
    private static readonly TextLook VerdictLook = new(25, Palette.Ink);
    private static readonly TextLook HeadingLook = new(23, Palette.Ink, IsBold: true);
    private static readonly TextLook FootLook = new(19, Palette.Muted);

    /// <summary>How a note in a panel looks.</summary>
    public static TextLook Note(SKColor color) => new(21, color);

    /// <summary>Writes title and subtitle.</summary>
    /// <returns>where the room below them begins, px</returns>
    public static float Head(Sheet sheet, RunReport report, string subtitle)
    {
        float width = sheet.Width - 2 * Margin;
        float y = 26;
        foreach ((string text, TextLook look, int lines) in
            ((string, TextLook, int)[])[(report.Title, TitleLook, 2), (subtitle, VerdictLook, 4)])
        {
            foreach (string line in Sheet.Wrap(text, look, width, lines))
            {
                y += look.LineHeight;
                sheet.Text(line, Margin, y, look);
            }
            y += 6;
        }
        return y + 14;
    }

    /// <summary>Writes the foot: liquid, line, and what the page is not.</summary>
    public static void Foot(Sheet sheet, Job job, MeasureFormat format)
    {
        var profile = new LineProfile(job.Line);
        string count = job.Line.Parallel > 1
            ? string.Create(CultureInfo.InvariantCulture, $"{job.Line.Parallel} lines of ") : "line of ";
        string plant = $"{job.Liquid.Name} at {format.Temperature(job.Liquid.Temperature)} · "
            + $"{count}{format.Length(job.Line.Bore)} bore, {format.Length(profile.Points[^1].Along)} long, "
            + $"outlet at {format.Length(profile.Outlet)}";
        string note = $"DrainSim {Series.ResultDocument.Version} · quasi-steady · informs, authorises nothing";
        float y = sheet.Height - 50;
        foreach (string text in (ReadOnlySpan<string>)[plant, note])
        {
            sheet.Text(Sheet.Wrap(text, FootLook, sheet.Width - 2 * Margin, 1)[0], Margin, y, FootLook);
            y += FootLook.LineHeight;
        }
    }

    /// <summary>Writes the heading of a row above its frame.</summary>
    public static void RowTitle(Sheet sheet, SKRect frame, string text) =>
        sheet.Text(text, Margin, frame.Top - 14, HeadingLook);

    /// <summary>Writes the name of the time axis at the right, on the line of the last row's heading.</summary>
    public static void TimeTitle(Sheet sheet, SKRect frame, TimeAxis axis)
    {
        string text = axis.End > 0 ? $"time since the start, {axis.Unit.Sign}" : "at the start";
        TextLook look = Note(Palette.Ink);
        sheet.Text(text, frame.Right - Sheet.Measure(text, look), frame.Bottom + 62, look);
    }
}
