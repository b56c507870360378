using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>Finds room for labels in a frame: clear of the curve, of each other and of the edges.</summary>
internal sealed class LabelPlacer
{
    private const float Gap = 6;

    /// <summary>What it costs to stand below or to the left, px: beside a falling curve there is most room above.</summary>
    private const float Below = 60;

    private static readonly (float X, float Y, float Distance)[] Trials = [.. Spots().OrderBy(spot => spot.Cost)
        .Select(spot => (spot.X, spot.Y, spot.Distance))];

    private readonly SKRect frame;
    private readonly List<SKRect> taken = [];
    private readonly List<SKPoint> curve = [];

    /// <summary>An empty frame.</summary>
    /// <param name="frame">no label leaves it, px</param>
    public LabelPlacer(SKRect frame) => this.frame = SKRect.Inflate(frame, -Gap, -Gap);

    /// <summary>Keeps labels away from a curve.</summary>
    public void KeepClearOf(IReadOnlyList<SKPoint> points)
    {
        for (int i = 0; i < points.Count; i++)
        {
            curve.Add(points[i]);
            if (i + 1 < points.Count)
            {
                AddBetween(points[i], points[i + 1]);
            }
        }
    }

    /// <summary>Keeps labels away from a place.</summary>
    public void KeepClearOf(SKRect place) => taken.Add(place);

    /// <summary>Finds the place nearest to an anchor, above it or beside it if there is one.</summary>
    /// <param name="anchor">what the label speaks of, px</param>
    /// <param name="size">size of the label, px</param>
    /// <param name="reach">how far from the anchor it may stand, px</param>
    /// <returns>the place, which is taken from now on; null when there is none</returns>
    public SKRect? Find(SKPoint anchor, SKSize size, float reach)
    {
        return FindClear(anchor, size, reach, mayPointerCross: false)
            ?? FindClear(anchor, size, reach, mayPointerCross: true);
    }

    /// <summary>The end of a pointer from an anchor to a label; null where they stand close enough without one.</summary>
    public static SKPoint? PointerEnd(SKPoint anchor, SKRect place)
    {
        var near = new SKPoint(
            Math.Clamp(anchor.X, place.Left, place.Right), Math.Clamp(anchor.Y, place.Top, place.Bottom));
        return SKPoint.Distance(anchor, near) < 24 ? null : near;
    }

    /// <summary>Finds the place nearest to an anchor that covers no other label, whatever curve it covers.</summary>
    /// <inheritdoc cref="Find"/>
    public SKRect? FindOnCurve(SKPoint anchor, SKSize size, float reach)
    {
        foreach ((float x, float y, float distance) in Trials)
        {
            SKRect place = Beside(anchor, size, x, y, distance);
            if (distance <= reach && IsFreeOfLabels(place))
            {
                taken.Add(place);
                return place;
            }
        }
        return null;
    }

    /// <summary>Whether a place lies in the frame and nothing is there.</summary>
    public bool IsFree(SKRect place) =>
        IsFreeOfLabels(place) && !curve.Exists(SKRect.Inflate(place, Gap, Gap).Contains);

    private bool IsFreeOfLabels(SKRect place) =>
        frame.Contains(place) && !taken.Exists(other => SKRect.Inflate(other, Gap, Gap / 2).IntersectsWith(place));

    private SKRect? FindClear(SKPoint anchor, SKSize size, float reach, bool mayPointerCross)
    {
        foreach ((float x, float y, float distance) in Trials)
        {
            SKRect place = Beside(anchor, size, x, y, distance);
            if (distance <= reach && IsFree(place) && IsClear(anchor, place, mayPointerCross))
            {
                taken.Add(place);
                return place;
            }
        }
        return null;
    }

    /// <summary>Whether a pointer to a place crosses no other label and no curve that it may not.</summary>
    private bool IsClear(SKPoint anchor, SKRect place, bool mayPointerCross)
    {
        if (PointerEnd(anchor, place) is not { } end)
        {
            return true;
        }
        float length = SKPoint.Distance(anchor, end);
        for (float along = 24; along < length; along += 5)
        {
            float share = along / length;
            var point = new SKPoint(anchor.X + share * (end.X - anchor.X), anchor.Y + share * (end.Y - anchor.Y));
            if (taken.Exists(other => SKRect.Inflate(other, 3, 3).Contains(point))
                || !mayPointerCross && curve.Exists(other => SKPoint.DistanceSquared(other, point) < 16))
            {
                return false;
            }
        }
        return true;
    }

    private static IEnumerable<(float X, float Y, float Distance, float Cost)> Spots() =>
        from distance in (float[])[10, 26, 46, 70, 100, 135, 175, 220, 270, 330, 400]
        from direction in ((float X, float Y)[])[(1, -1), (0, -1), (-1, -1), (1, 0), (-1, 0), (-1, 1), (1, 1), (0, 1)]
        let isBelow = direction.Y > 0 || direction is (-1, 0)
        select (direction.X, direction.Y, distance, distance + (isBelow ? Below : 0));

    private SKRect Beside(SKPoint anchor, SKSize size, float x, float y, float distance)
    {
        float left = anchor.X + x * distance + (x > 0 ? 0 : x < 0 ? -size.Width : -size.Width / 2);
        float top = anchor.Y + y * distance + (y > 0 ? 0 : y < 0 ? -size.Height : -size.Height / 2);
        left = Math.Clamp(left, frame.Left, Math.Max(frame.Left, frame.Right - size.Width));
        top = Math.Clamp(top, frame.Top, Math.Max(frame.Top, frame.Bottom - size.Height));
        return SKRect.Create(left, top, size.Width, size.Height);
    }

    private void AddBetween(SKPoint from, SKPoint to)
    {
        float distance = SKPoint.Distance(from, to);
        int parts = (int)(distance / 4);
        for (int part = 1; part < parts; part++)
        {
            float share = part / (float)parts;
            curve.Add(new SKPoint(from.X + share * (to.X - from.X), from.Y + share * (to.Y - from.Y)));
        }
    }
}
