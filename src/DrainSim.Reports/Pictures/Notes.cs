using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>Writes labels into a panel where there is room for them.</summary>
internal sealed class Notes
{
    private readonly Sheet sheet;
    private readonly Panel panel;
    private readonly LabelPlacer placer;

    /// <summary>Notes on one panel.</summary>
    /// <param name="sheet">the page</param>
    /// <param name="panel">the figure on it</param>
    public Notes(Sheet sheet, Panel panel)
    {
        this.sheet = sheet;
        this.panel = panel;
        placer = new LabelPlacer(panel.Frame);
    }

    /// <summary>Keeps notes away from a curve.</summary>
    public void KeepClearOf(double[] xs, double[] ys) =>
        placer.KeepClearOf([.. xs.Zip(ys, panel.At).Where(point => float.IsFinite(point.Y))]);

    /// <summary>Keeps notes away from a mark.</summary>
    public void KeepClearOf(SKPoint mark, float radius) =>
        placer.KeepClearOf(new SKRect(mark.X - radius, mark.Y - radius, mark.X + radius, mark.Y + radius));

    /// <summary>Keeps notes away from a line down the whole panel.</summary>
    public void KeepClearOf(float x) =>
        placer.KeepClearOf([new SKPoint(x, panel.Frame.Top), new SKPoint(x, panel.Frame.Bottom)]);

    /// <summary>Writes a note near what it speaks of, with a thin pointer where it stands apart.</summary>
    /// <param name="anchor">what it speaks of, px</param>
    /// <param name="look">how it looks; the first line bold where <paramref name="isHeaded"/></param>
    /// <param name="reach">how far away it may stand, px</param>
    /// <param name="isHeaded">whether the first line is bold</param>
    /// <param name="lines">what it says</param>
    /// <returns>whether there was room</returns>
    public bool Add(SKPoint anchor, TextLook look, float reach, bool isHeaded, params string[] lines) =>
        Add(anchor, look, reach, isHeaded, isNeeded: false, lines);

    /// <summary>Writes a headed note that must not be left out: over a curve if there is no other room.</summary>
    public void AddNeeded(SKPoint anchor, TextLook look, float reach, params string[] lines) =>
        Add(anchor, look, reach, isHeaded: true, isNeeded: true, lines);

    private bool Add(SKPoint anchor, TextLook look, float reach, bool isHeaded, bool isNeeded, string[] lines)
    {
        TextLook head = look with { IsBold = isHeaded };
        float width = lines.Select((line, i) => Sheet.Measure(line, i == 0 ? head : look)).Max();
        var size = new SKSize(width, lines.Length * look.LineHeight);
        SKRect? found = placer.Find(anchor, size, reach) ?? (isNeeded ? placer.FindOnCurve(anchor, size, reach) : null);
        if (found is not { } place)
        {
            return false;
        }
        Point(anchor, place, look.Color);
        bool isRight = place.MidX < anchor.X - width / 4;
        for (int i = 0; i < lines.Length; i++)
        {
            TextLook own = i == 0 ? head : look;
            float x = isRight ? place.Right - Sheet.Measure(lines[i], own) : place.Left;
            sheet.Text(lines[i], x, place.Top + i * look.LineHeight + 0.98f * look.Size, own, halo: true);
        }
        return true;
    }

    /// <summary>Names a curve: close to it where somewhere along it there is room, else with a pointer.</summary>
    public void AddAlong(double[] xs, double[] ys, TextLook look, string name)
    {
        foreach (double share in (ReadOnlySpan<double>)[0.55, 0.7, 0.4, 0.82, 0.25, 0.12])
        {
            if (Add(On(xs, ys, share), look, 12, false, name))
            {
                return;
            }
        }
        Add(On(xs, ys, 0.55), look, 400, false, name);
    }

    /// <summary>Draws a thin dashed line across the panel at a value, with its name at the left, above or below it.</summary>
    /// <returns>whether the value lies in the panel</returns>
    public bool Reference(double value, string name, TextLook look, bool isAbove, float width = 1.5f)
    {
        if (!panel.Shows(value))
        {
            return false;
        }
        var at = new SKPoint(panel.Frame.Left, panel.At(0, value).Y);
        var end = new SKPoint(panel.Frame.Right, at.Y);
        sheet.Line(at, end, look.Color, width, 9, 6);
        foreach (bool above in (ReadOnlySpan<bool>)[isAbove, !isAbove])
        {
            if (WriteBeside(at.Y, name, look, above))
            {
                break;
            }
        }
        placer.KeepClearOf([at, end]);
        return true;
    }

    /// <summary>The point of a curve at a share of its horizontal extent, px.</summary>
    private SKPoint On(double[] xs, double[] ys, double share)
    {
        double x = xs[0] + share * (xs[^1] - xs[0]);
        int next = Math.Max(1, Array.FindIndex(xs, one => one >= x));
        if (xs.Length == 1 || xs[next] <= xs[next - 1])
        {
            return panel.At(x, ys[0]);
        }
        double part = (x - xs[next - 1]) / (xs[next] - xs[next - 1]);
        return panel.At(x, ys[next - 1] + part * (ys[next] - ys[next - 1]));
    }

    private bool WriteBeside(float y, string name, TextLook look, bool above)
    {
        float width = Sheet.Measure(name, look);
        float top = above ? y - look.LineHeight - 7 : y + 9;
        for (float share = 0; share <= 1; share += 0.125f)
        {
            float x = panel.Frame.Left + 12 + share * (panel.Frame.Width - width - 24);
            var place = SKRect.Create(x, top, width, look.LineHeight);
            if (placer.IsFree(place))
            {
                placer.KeepClearOf(place);
                sheet.Text(name, place.Left, place.Top + 0.98f * look.Size, look, halo: true);
                return true;
            }
        }
        return false;
    }

    /// <summary>A pointer from a label to its anchor, where they stand apart.</summary>
    private void Point(SKPoint anchor, SKRect place, SKColor color)
    {
        if (LabelPlacer.PointerEnd(anchor, place) is not { } near)
        {
            return;
        }
        float distance = SKPoint.Distance(anchor, near);
        float clear = 12 / distance;
        var from = new SKPoint(anchor.X + clear * (near.X - anchor.X), anchor.Y + clear * (near.Y - anchor.Y));
        float stop = 1 - 5 / distance;
        var to = new SKPoint(anchor.X + stop * (near.X - anchor.X), anchor.Y + stop * (near.Y - anchor.Y));
        sheet.Line(from, to, color.WithAlpha(0x90), 1.5f);
        placer.KeepClearOf([from, near]);
    }
}
