using DrainSim.Reports.Measures;
using DrainSim.Reports.Studies;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>Maps of drain time and margin over the two parameters of a sweep.</summary>
internal sealed class SweepMap
{
    /// <summary>Cells up to which each tells its value.</summary>
    private const int MostToldAcross = 9;
    private const int MostToldUp = 10;

    /// <summary>Values up to which each has its tick.</summary>
    private const int MostTicks = 10;

    private readonly Sheet sheet;
    private readonly SweepReport report;
    private readonly MeasureFormat format;
    private readonly double[] across;
    private readonly double[] up;

    /// <param name="sheet">the page</param>
    /// <param name="report">the sweep</param>
    public SweepMap(Sheet sheet, SweepReport report)
    {
        (this.sheet, this.report, format) = (sheet, report, new MeasureFormat(report.Units));
        across = Places(report, 0);
        up = Places(report, 1);
    }

    /// <summary>Whether a sweep is a whole grid over two parameters.</summary>
    public static bool IsMap(SweepReport report) => report.Axes.Count == 2
        && Places(report, 0).Length is > 1 and var columns && Places(report, 1).Length is > 1 and var rows
        && (long)columns * rows == report.Points.Count && report.Points.Count == report.Count;

    /// <summary>Draws both maps.</summary>
    /// <param name="room">where they go, px</param>
    public void Draw(SKRect room)
    {
        float height = room.Height / 2;
        DrawMap(new SKRect(room.Left, room.Top + 44, room.Right - 40, room.Top + height - 84), "Drain time",
            point => point.Row.DrainTime, MeasureFormat.Duration, Palette.Liquid);
        DrawMap(new SKRect(room.Left, room.Top + height + 44, room.Right - 40, room.Bottom - 70), "Least margin at the low point",
            point => point.Row.LeastMargin, format.Pressure, Palette.Pressure);
    }

    private void DrawMap(SKRect frame, string title, Func<SweepPoint, double?> value, Func<double, string> text, SKColor dark)
    {
        double[] values = [.. report.Points.Select(value).OfType<double>()];
        (double least, double most) = values.Length == 0 ? (0, 1) : (values.Min(), values.Max());
        (double[] xs, double[] ys) = (Edges(across), Edges(up));
        var panel = new Panel(frame, (xs[0], xs[^1]), (ys[0], ys[^1]));
        panel.SetTicks(Ticks(report.Axes[0], across, xs, 10), Ticks(report.Axes[1], up, ys, 6));
        bool isTold = across.Length <= MostToldAcross && up.Length <= MostToldUp;
        panel.Plot.Grid.IsVisible = false;
        panel.Draw(sheet);
        foreach (SweepPoint point in report.Points)
        {
            SKRect cell = Cell(panel, xs, ys, point);
            double? here = value(point);
            double share = here is { } known ? most > least ? (known - least) / (most - least) : 0.5 : 0;
            sheet.Fill(cell, here is null ? Palette.Undone : Palette.Ramp(dark, share));
            if (isTold)
            {
                Tell(cell, here is { } told ? text(told) : point.Row.Outcome.Replace('_', ' '), here is null ? Palette.Limit : share > 0.45 ? Palette.Paper : Palette.Ink);
            }
        }
        string range = values.Length == 0 ? ": none" : $": {text(least)} (light) to {text(most)} (dark)";
        PageText.RowTitle(sheet, frame, title + range);
        PageText.AxisTitle(sheet, frame, $"across: {report.Axes[0].Title};  up: {report.Axes[1].Title}");
        if (!isTold)
        {
            NameUndone(panel, xs, ys, value);
        }
    }

    /// <summary>Names each way in which cells have no value, in the middle of its cells.</summary>
    private void NameUndone(Panel panel, double[] xs, double[] ys, Func<SweepPoint, double?> value)
    {
        var notes = new Notes(sheet, panel);
        foreach (IGrouping<string, SweepPoint> kind in report.Points.Where(point => value(point) is null).GroupBy(point => point.Kind))
        {
            SweepPoint[] points = [.. kind];
            SKRect cell = Cell(panel, xs, ys, points[points.Length / 2]);
            TextLook look = PageText.Note(Palette.Limit);
            notes.Add(new SKPoint(cell.MidX, cell.MidY), look, 400, false, [.. Sheet.Wrap(points[points.Length / 2].Cause, look, 300, 3)]);
        }
    }

    private void Tell(SKRect cell, string text, SKColor color)
    {
        TextLook look = PageText.Note(color) with { Size = 18 };
        string shown = Sheet.Wrap(text, look, cell.Width - 6, 1)[0];
        sheet.Text(shown, cell.MidX - Sheet.Measure(shown, look) / 2, cell.MidY + 0.35f * look.Size, look);
    }

    private SKRect Cell(Panel panel, double[] xs, double[] ys, SweepPoint point)
    {
        int i = Index(0, across, point), j = Index(1, up, point);
        SKPoint lower = panel.At(xs[i], ys[j]), upper = panel.At(xs[i + 1], ys[j + 1]);
        return new SKRect(MathF.Round(lower.X), MathF.Round(upper.Y), MathF.Round(upper.X), MathF.Round(lower.Y));
    }

    private int Index(int axis, double[] places, SweepPoint point) =>
        Array.BinarySearch(places, report.Axes[axis].At(point.Values[axis]));

    private static double[] Places(SweepReport report, int axis) =>
        [.. report.Points.Select(point => report.Axes[axis].At(point.Values[axis])).Distinct().Order()];

    /// <summary>A tick at every value where they are few or words, else at round numbers.</summary>
    private static AxisTicks Ticks(SweepAxis axis, double[] places, double[] edges, int count) => axis.Words.Count > 0
        ? AxisTicks.Words(axis.Words)
        : axis.IsLogarithmic ? AxisTicks.Logarithmic(edges[0], edges[^1])
        : places.Length <= MostTicks ? AxisTicks.At(places)
        : AxisTicks.Decimal(edges[0], edges[^1], count);

    private static double[] Edges(double[] places)
    {
        double[] edges = new double[places.Length + 1];
        for (int i = 1; i < places.Length; i++)
        {
            edges[i] = (places[i - 1] + places[i]) / 2;
        }
        edges[0] = places[0] - (edges[1] - places[0]);
        edges[^1] = places[^1] + (places[^1] - edges[^2]);
        return edges;
    }
}
