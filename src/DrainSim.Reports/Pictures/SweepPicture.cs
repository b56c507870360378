using System.Globalization;
using DrainSim.Reports.Studies;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>
/// The picture of a sweep. One parameter: the level curves where they are few, then drain time and margin against the
/// parameter. Two: maps of both. More, or rows of a table: drain time and margin from case to case.
/// </summary>
public static class SweepPicture
{
    /// <summary>Width, px.</summary>
    public const int Width = 1240;

    /// <summary>Height of a picture without level curves, px.</summary>
    public const int Height = 1300;

    /// <summary>Height of a picture with level curves, px.</summary>
    public const int TallHeight = 1700;

    /// <summary>Most courses that are drawn over each other.</summary>
    public const int MostCourses = 8;

    private const float Left = 118;
    private const float Right = Width - 40;

    /// <summary>Draws a sweep and writes it as PNG: the same bytes for the same sweep on every machine.</summary>
    /// <param name="stream">receives the PNG; left open</param>
    /// <param name="report">the sweep and how it is told</param>
    /// <exception cref="IOException">the stream refuses</exception>
    public static void Write(Stream stream, SweepReport report)
    {
        ArgumentNullException.ThrowIfNull(report);
        bool isTall = report.Courses.Count > 0;
        using var sheet = new Sheet(Width, isTall ? TallHeight : Height);
        float top = PageText.Head(sheet, report.Title, report.Subtitle);
        PageText.Foot(sheet, string.Create(CultureInfo.InvariantCulture,
            $"{report.Count} cases over {string.Join(" and ", report.Axes.Select(axis => axis.Name))}"));
        float room = sheet.Height - 102 - top;
        if (SweepMap.IsMap(report))
        {
            new SweepMap(sheet, report).Draw(new SKRect(Left, top, Right, top + room));
        }
        else
        {
            float curves = isTall ? 0.42f * room : 0;
            if (isTall)
            {
                CoursePanel.Draw(sheet, report, Row(top, curves));
            }
            new SweepCurves(sheet, report).Draw(Row(top + curves, (room - curves) / 2), Row(top + (room + curves) / 2, (room - curves) / 2));
        }
        sheet.Write(stream);
    }

    private static SKRect Row(float top, float height) => new(Left, top + 44, Right, top + height - 44);
}
