using DrainSim.Reports.Measures;
using DrainSim.Reports.Studies;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>Drain time and margin against the one parameter of a sweep, or from case to case.</summary>
internal sealed class SweepCurves
{
    /// <summary>Points up to which each gets a dot.</summary>
    private const int MostDots = 30;

    private readonly Sheet sheet;
    private readonly SweepReport report;
    private readonly MeasureFormat format;
    private readonly SweepAxis axis;
    private readonly double[] places;
    private readonly double left;
    private readonly double right;

    /// <param name="sheet">the page</param>
    /// <param name="report">the sweep</param>
    public SweepCurves(Sheet sheet, SweepReport report)
    {
        (this.sheet, this.report, format) = (sheet, report, new MeasureFormat(report.Units));
        bool isOne = report.Axes.Count == 1;
        axis = isOne ? report.Axes[0] : new SweepAxis("case", "", false, []);
        places = [.. report.Points.Select(point => axis.At(isOne ? point.Values[0] : point.Row.Case))];
        (left, right) = (places.Min(), places.Max());
        double margin = axis.Words.Count > 0 ? 0.5 : right > left ? 0.03 * (right - left) : 0.5;
        (left, right) = (left - margin, right + margin);
    }

    /// <summary>Draws both panels.</summary>
    /// <param name="upper">where the drain times lie, px</param>
    /// <param name="lower">where the margins lie, px</param>
    public void Draw(SKRect upper, SKRect lower)
    {
        DrawTimes(upper);
        DrawMargins(lower);
        PageText.AxisTitle(sheet, lower, axis.Title);
    }

    private void DrawTimes(SKRect frame)
    {
        double?[] times = [.. report.Points.Select(point => point.Row.DrainTime)];
        double most = Math.Max(times.Max() ?? 0, report.TargetTime ?? 0);
        Unit unit = MeasureFormat.TimeUnit(most);
        Panel panel = PanelOver(frame, (0, most > 0 ? 1.25 * unit.From(most) : 1), most > 0);
        MarkStretches(panel, frame);
        Notes notes = DrawCurve(panel, times, unit, Palette.Liquid);
        PageText.RowTitle(sheet, frame, $"Drain time, {unit.Sign}");
        if (report.TargetTime is { } target)
        {
            notes.Reference(unit.From(target), $"asked for: {MeasureFormat.Duration(target)}", PageText.Note(Palette.Limit), isAbove: true, width: 2.5f);
        }
        MarkValues(panel, notes, times, unit);
        NameStretches(panel, notes);
        NameExtremes(panel, notes, times, unit, Palette.Liquid, MeasureFormat.Duration);
    }

    private void DrawMargins(SKRect frame)
    {
        double?[] margins = [.. report.Points.Select(point => point.Row.LeastMargin)];
        double most = Math.Max(margins.Max() ?? 0, report.TargetMargin ?? 0), least = Math.Min(0, margins.Min() ?? 0);
        most = Math.Max(most, 1000);
        Unit unit = format.PressureUnit(most);
        double span = unit.From(most - least);
        Panel panel = PanelOver(frame, (unit.From(least) - (least < 0 ? 0.05 * span : 0), unit.From(most) + 0.25 * span), margins.Any(margin => margin is not null));
        MarkStretches(panel, frame);
        Notes notes = DrawCurve(panel, margins, unit, Palette.Pressure);
        PageText.RowTitle(sheet, frame, $"Least margin at the low point, {unit.Sign}");
        if (least < 0)
        {
            notes.Reference(0, "no margin", PageText.Note(Palette.Limit), isAbove: true, width: 2.5f);
        }
        if (report.TargetMargin is { } target)
        {
            notes.Reference(unit.From(target), $"asked for: {format.Pressure(target)}", PageText.Note(Palette.Limit), isAbove: true, width: 2.5f);
        }
        NameExtremes(panel, notes, margins, unit, Palette.Pressure, format.Pressure);
    }

    private Panel PanelOver(SKRect frame, (double Least, double Most) vertical, bool hasTicks)
    {
        var panel = new Panel(frame, (left, right), vertical);
        AxisTicks ticks = axis.Words.Count > 0 ? AxisTicks.Words(axis.Words)
            : axis.IsLogarithmic ? AxisTicks.Logarithmic(left, right)
            : AxisTicks.Decimal(left, right, 10);
        panel.SetTicks(ticks, hasTicks ? AxisTicks.Decimal(vertical.Least, vertical.Most, 6) : AxisTicks.None);
        return panel;
    }

    /// <summary>Draws a value of the points as a curve with gaps, and as dots where they are few.</summary>
    private Notes DrawCurve(Panel panel, double?[] values, Unit unit, SKColor color)
    {
        foreach ((int from, int to) in Runs(i => values[i] is not null))
        {
            if (to > from && axis.Words.Count == 0)
            {
                panel.Curve(places[from..(to + 1)], [.. values[from..(to + 1)].Select(value => unit.From(value!.Value))], color);
            }
        }
        panel.Draw(sheet);
        var notes = new Notes(sheet, panel);
        for (int i = 0; i < values.Length; i++)
        {
            if (values[i] is { } value && (values.Length <= MostDots || IsAlone(values, i)))
            {
                SKPoint at = panel.At(places[i], unit.From(value));
                sheet.Dot(at, 5, color);
                notes.KeepClearOf(at, 6);
            }
        }
        foreach ((int from, int to) in Runs(i => values[i] is not null))
        {
            notes.KeepClearOf(places[from..(to + 1)], [.. values[from..(to + 1)].Select(value => unit.From(value!.Value))]);
        }
        return notes;
    }

    private static bool IsAlone(double?[] values, int i) =>
        (i == 0 || values[i - 1] is null) && (i == values.Length - 1 || values[i + 1] is null);

    /// <summary>Tints the stretches in which the job is not done.</summary>
    private void MarkStretches(Panel panel, SKRect frame)
    {
        foreach ((int from, int to) in Stretches())
        {
            float x = panel.At(Before(from), 0).X, end = panel.At(Behind(to), 0).X;
            sheet.Fill(new SKRect(x, frame.Top, end, frame.Bottom), Palette.Undone);
        }
    }

    /// <summary>Draws a line at each value found, and a dot on the curve at each standard one beside it.</summary>
    private void MarkValues(Panel panel, Notes notes, double?[] values, Unit unit)
    {
        foreach ((double value, _, _) in report.Marks.Where(mark => mark.IsFound))
        {
            float x = panel.At(axis.At(value), 0).X;
            sheet.Line(new SKPoint(x, panel.Frame.Top), new SKPoint(x, panel.Frame.Bottom), Palette.Limit, 2.5f, 3, 5);
            notes.KeepClearOf(x);
        }
        foreach ((double value, string name, bool isFound) in report.Marks.OrderByDescending(mark => mark.IsFound))
        {
            if (isFound)
            {
                SKPoint top = new(panel.At(axis.At(value), 0).X, panel.Frame.Top + 0.12f * panel.Frame.Height);
                notes.Add(top, PageText.Note(Palette.Limit), 300, true, name);
            }
            else if (On(values, axis.At(value)) is { } known)
            {
                SKPoint at = panel.At(axis.At(value), unit.From(known));
                sheet.Dot(at, 6, Palette.Ink);
                notes.KeepClearOf(at, 7);
                notes.Add(at, PageText.Note(Palette.Ink), 400, false, name);
            }
        }
    }

    /// <summary>The value of the curve at a place between its points; null in a gap.</summary>
    private double? On(double?[] values, double place)
    {
        int next = Array.FindIndex(places, one => one >= place);
        return next > 0 ? values[next - 1] + (values[next] - values[next - 1]) * (place - places[next - 1]) / (places[next] - places[next - 1])
            : next == 0 && places[0] == place ? values[0]
            : null;
    }

    private void NameStretches(Panel panel, Notes notes)
    {
        TextLook look = PageText.Note(Palette.Limit);
        foreach ((int from, int to) in Stretches().OrderByDescending(stretch => stretch.To - stretch.From).Take(6))
        {
            float x = panel.At((Before(from) + Behind(to)) / 2, 0).X;
            IReadOnlyList<string> lines = Sheet.Wrap(report.Points[(from + to) / 2].Cause, look, 260, 3);
            notes.Add(new SKPoint(x, panel.Frame.Top + 0.3f * panel.Frame.Height), look, 400, false, [.. lines]);
        }
    }

    private void NameExtremes(Panel panel, Notes notes, double?[] values, Unit unit, SKColor color, Func<double, string> text)
    {
        int[] known = [.. Enumerable.Range(0, values.Length).Where(i => values[i] is not null)];
        if (known.Length == 0)
        {
            return;
        }
        foreach (int i in ((int[])[known.MinBy(i => values[i]), known.MaxBy(i => values[i])]).Distinct())
        {
            notes.Add(panel.At(places[i], unit.From(values[i]!.Value)), PageText.Note(color), 200, true, text(values[i]!.Value));
        }
    }

    private IEnumerable<(int From, int To)> Stretches() => Runs(i => !report.Points[i].IsDone, (one, other) => report.Points[one].Kind == report.Points[other].Kind);

    /// <summary>Neighbouring points of which a statement holds.</summary>
    private IEnumerable<(int From, int To)> Runs(Func<int, bool> holds, Func<int, int, bool>? belong = null)
    {
        for (int i = 0; i < places.Length; i++)
        {
            if (!holds(i))
            {
                continue;
            }
            int from = i;
            while (i + 1 < places.Length && holds(i + 1) && (belong?.Invoke(from, i + 1) ?? true))
            {
                i++;
            }
            yield return (from, i);
        }
    }

    private double Before(int i) => i == 0 ? left : (places[i - 1] + places[i]) / 2;

    private double Behind(int i) => i == places.Length - 1 ? right : (places[i] + places[i + 1]) / 2;
}
