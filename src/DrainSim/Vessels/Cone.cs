namespace DrainSim.Vessels;

/// <summary>A frustum of an upright cone; one end may be a point, and either end may be the wider.</summary>
/// <remarks><code>
/// V = π·h·(r0² + r0·r + r²)/3,   r = r0 + (r1 − r0)·h/H,   A = π·r²
/// h = (3V/π)/(r0² + r0·r + r²),  r³ = r0³ + 3V·(r1 − r0)/(π·H)
///
/// r0, r1  radius at the bottom and at the top, m
/// H       height, m
/// </code>
/// The second line is (r − r0)·H/(r1 − r0) without its cancellation, and holds for r1 = r0. The upper half is
/// measured from the top, so that both ends are met exactly.
/// </remarks>
public sealed record Cone : Vessel
{
    private double? bottomDiameter;
    private double? topDiameter;
    private Derived<Frustum> derived;

    /// <summary>Inside diameter at the bottom, m; at least 0, and not 0 at both ends.</summary>
    public required double BottomDiameter
    {
        get => bottomDiameter.GetValueOrDefault();
        init
        {
            bottomDiameter = Require.NotNegative(value, "cone bottom diameter", "m");
            derived.PartSet(WorkOut);
        }
    }

    /// <summary>Inside diameter at the top, m; at least 0, and not 0 at both ends.</summary>
    public required double TopDiameter
    {
        get => topDiameter.GetValueOrDefault();
        init
        {
            topDiameter = Require.NotNegative(value, "cone top diameter", "m");
            derived.PartSet(WorkOut);
        }
    }

    /// <summary>Inside height, m; greater than 0.</summary>
    public required double ConeHeight
    {
        get;
        init
        {
            field = Require.Positive(value, "cone height", "m");
            derived.PartSet(WorkOut);
        }
    }

    /// <inheritdoc/>
    public override double Height => ConeHeight;

    /// <inheritdoc/>
    public override double Capacity => Shape.Capacity;

    private Frustum Shape => derived.Value ?? derived.Keep(WorkOut()!);

    /// <inheritdoc/>
    public override double Volume(double level)
    {
        Frustum shape = Shape;
        double h = Math.Clamp(level, 0, ConeHeight);
        return shape.NarrowsUpwards && h > ConeHeight / 2
            ? shape.Capacity - Section(shape.Top, shape.RadiusBelowTop(ConeHeight - h), ConeHeight - h)
            : Section(shape.Bottom, RadiusAt(shape, h), h);
    }

    /// <inheritdoc/>
    public override double Area(double level)
    {
        Frustum shape = Shape;
        double h = Math.Clamp(level, 0, ConeHeight);
        double r = RadiusAt(shape, h);
        return Math.PI * r * r;
    }

    /// <inheritdoc/>
    public override double Level(double volume)
    {
        Frustum shape = Shape;
        double v = Math.Clamp(volume, 0, shape.Capacity);
        return v > shape.Capacity / 2
            ? ConeHeight - Depth(shape.Top, -shape.Widening, shape.Capacity - v)
            : Depth(shape.Bottom, shape.Widening, v);
    }

    private double RadiusAt(Frustum shape, double h) =>
        h > ConeHeight / 2 ? shape.RadiusBelowTop(ConeHeight - h) : shape.RadiusAbove(h);

    private static double Section(double r0, double r, double h) => Math.PI / 3 * h * (r0 * r0 + r0 * r + r * r);

    private static double Depth(double r0, double widening, double v)
    {
        if (v <= 0)
            return 0;
        double r = Math.Cbrt(r0 * r0 * r0 + 3 / Math.PI * widening * v);
        return 3 / Math.PI * v / (r0 * r0 + r0 * r + r * r);
    }

    private Frustum? WorkOut()
    {
        if (bottomDiameter is not { } bottom || topDiameter is not { } top || ConeHeight == 0)
            return null;
        Require.Positive(Math.Max(bottom, top), "the larger diameter of a cone", "m");
        return new Frustum(bottom / 2, top / 2, (top - bottom) / 2 / ConeHeight, Section(bottom / 2, top / 2, ConeHeight));
    }

    /// <param name="Bottom">radius at the bottom, m</param>
    /// <param name="Top">radius at the top, m</param>
    /// <param name="Widening">growth of the radius per height, 1</param>
    /// <param name="Capacity">volume when full, m³</param>
    private sealed record Frustum(double Bottom, double Top, double Widening, double Capacity)
    {
        public bool NarrowsUpwards => Widening < 0;

        public double RadiusAbove(double h) => Bottom + Widening * h;

        public double RadiusBelowTop(double depth) => Top - Widening * depth;
    }
}
