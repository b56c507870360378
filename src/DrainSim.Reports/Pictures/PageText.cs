using System.Globalization;
using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Reports.Measures;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>What stands around the panels of a page: title, verdict, headings, foot.</summary>
internal static class PageText
{
    private const float Edge = 44;

    private static readonly TextLook TitleLook = new(36, Palette.Ink, IsBold: true);
    private static readonly TextLook LongTitleLook = new(28, Palette.Ink, IsBold: true);
    private static readonly TextLook VerdictLook = new(25, Palette.Ink);
    private static readonly TextLook HeadingLook = new(23, Palette.Ink, IsBold: true);
    private static readonly TextLook FootLook = new(19, Palette.Muted);

    /// <summary>How a note in a panel looks.</summary>
    public static TextLook Note(SKColor color) => new(21, color);

    /// <summary>The least margin of a run in words, against a limit by name.</summary>
    public static string Margin(RunReport report, string limit) => report.Result.LeastMargin.Value switch
    {
        > 1 and var above => $"{report.Format.Pressure(above)} above {limit}",
        < -1 and var below => $"{report.Format.Pressure(-below)} below {limit}",
        _ => $"at {limit}",
    };

    /// <summary>Writes title and subtitle.</summary>
    /// <returns>where the room below them begins, px</returns>
    public static float Head(Sheet sheet, RunReport report, string subtitle) => Head(sheet, report.Title, subtitle);

    /// <summary>Writes title and subtitle.</summary>
    /// <returns>where the room below them begins, px</returns>
    public static float Head(Sheet sheet, string title, string subtitle)
    {
        float width = sheet.Width - 2 * Edge;
        float y = 26;
        bool isLong = Sheet.Wrap(title, TitleLook, width, 3).Count > 2;
        foreach ((string text, TextLook look) in
            ((string, TextLook)[])[(title, isLong ? LongTitleLook : TitleLook), (subtitle, VerdictLook)])
        {
            foreach (string line in Sheet.Wrap(text, look, width, 4))
            {
                y += look.LineHeight;
                sheet.Text(line, Edge, y, look);
            }
            y += 6;
        }
        return y + 14;
    }

    /// <summary>Writes the foot: liquid, line, and what the page is not.</summary>
    public static void Foot(Sheet sheet, Job job, MeasureFormat format)
    {
        string plant = $"{job.Liquid.Name} at {format.Temperature(job.Liquid.Temperature)} · "
            + (job.DrawOffs.Count > 1 ? SeveralLines(job, format) : OneLine(job.Line, format));
        Foot(sheet, plant);
    }

    /// <summary>Writes the foot: a line of what the page is of, and what it is not.</summary>
    public static void Foot(Sheet sheet, string plant)
    {
        string note = $"DrainSim {Series.ResultDocument.Version} · quasi-steady · informs, authorises nothing";
        float y = sheet.Height - 50;
        foreach (string text in (ReadOnlySpan<string>)[plant, note])
        {
            sheet.Text(Sheet.Wrap(text, FootLook, sheet.Width - 2 * Edge, 1)[0], Edge, y, FootLook);
            y += FootLook.LineHeight;
        }
    }

    private static string OneLine(Line line, MeasureFormat format)
    {
        var profile = new LineProfile(line);
        string count = line.Parallel > 1 ? string.Create(CultureInfo.InvariantCulture, $"{line.Parallel} lines of ") : "line of ";
        return $"{count}{format.Length(line.Bore)} bore, {format.Length(profile.Points[^1].Along)} long, "
            + $"outlet at {format.Length(profile.Outlet)}";
    }

    private static string SeveralLines(Job job, MeasureFormat format) => "lines: " + string.Join(", ",
        job.DrawOffs.Select((drawOff, i) => $"{Wording.LimitWording.NameOf(drawOff.Line, i)} {format.Length(drawOff.Line.Bore)}"));

    /// <summary>Writes the heading of a row above its frame.</summary>
    public static void RowTitle(Sheet sheet, SKRect frame, string text) =>
        sheet.Text(text, Edge, frame.Top - 20, HeadingLook);

    /// <summary>Writes the name of the horizontal axis below the last row, at the right.</summary>
    public static void AxisTitle(Sheet sheet, SKRect frame, string text)
    {
        TextLook look = Note(Palette.Ink);
        sheet.Text(text, frame.Right - Sheet.Measure(text, look), frame.Bottom + 62, look);
    }
}
