namespace DrainSim.Vessels;

/// <summary>A lying cylindrical tank with a head at each end.</summary>
/// <remarks><code>
/// V = L·R²·(φ − sin φ·cos φ) + heads,   A = 2·L·√(h·(2R − h)) + heads,   h = R·(1 − cos φ)
///
/// L   length of the straight shell, m
/// R   radius, m
/// </code>
/// Shell and heads are symmetric about the axis, so the upper half is the capacity less the mirror image.
/// </remarks>
public sealed record HorizontalCylinder : Vessel
{
    private Derived<Parts> derived;

    /// <summary>Inside diameter of the shell, m; greater than 0.</summary>
    public required double Diameter
    {
        get;
        init
        {
            field = Require.Positive(value, "tank diameter", "m");
            derived.PartSet(WorkOut);
        }
    }

    /// <summary>Length of the straight shell between the tangent lines, m; greater than 0.</summary>
    public required double Length
    {
        get;
        init
        {
            field = Require.Positive(value, "shell length", "m");
            derived.PartSet(WorkOut);
        }
    }

    /// <summary>The closure at one end.</summary>
    public required Head FirstHead
    {
        get;
        init
        {
            field = value;
            derived.PartSet(WorkOut);
        }
    }

    /// <summary>The closure at the other end.</summary>
    public required Head SecondHead
    {
        get;
        init
        {
            field = value;
            derived.PartSet(WorkOut);
        }
    }

    /// <inheritdoc/>
    public override double Height => Diameter;

    /// <inheritdoc/>
    public override double Capacity => 2 * Worked.HalfVolume;

    /// <inheritdoc/>
    public override IReadOnlyList<double> SectionLevels => Worked.Kinks;

    private Parts Worked => derived.Value ?? derived.Keep(WorkOut()!);

    /// <inheritdoc/>
    public override double Volume(double level)
    {
        Parts parts = Worked;
        double h = Math.Clamp(level, 0, Diameter);
        return h <= parts.Radius ? parts.Volume(h) : 2 * parts.HalfVolume - parts.Volume(Diameter - h);
    }

    /// <inheritdoc/>
    public override double Area(double level)
    {
        Parts parts = Worked;
        double h = Math.Clamp(level, 0, Diameter);
        return parts.Area(Math.Min(h, Diameter - h));
    }

    /// <inheritdoc/>
    public override double Level(double volume)
    {
        Parts parts = Worked;
        double v = Math.Clamp(volume, 0, 2 * parts.HalfVolume);
        return v <= parts.HalfVolume ? parts.Level(v) : Diameter - parts.Level(2 * parts.HalfVolume - v);
    }

    private Parts? WorkOut() =>
        Diameter > 0 && Length > 0 && FirstHead is not null && SecondHead is not null
            ? new Parts(Diameter / 2, Length, FirstHead, SecondHead)
            : null;

    /// <summary>The lower half, for levels from 0 to R.</summary>
    private sealed class Parts
    {
        private readonly double length;
        private readonly LyingHead first;
        private readonly LyingHead second;

        public Parts(double radius, double length, Head firstHead, Head secondHead)
        {
            Radius = radius;
            this.length = length;
            first = firstHead.Lie(radius);
            second = secondHead == firstHead ? first : secondHead.Lie(radius);
            HalfVolume = Volume(radius);
            double[] lower = [.. new[] { first.Kink, second.Kink }.OfType<double>()];
            Kinks = [.. lower.Concat(lower.Select(level => 2 * radius - level)).Distinct().Order()];
        }

        public double Radius { get; }

        public double HalfVolume { get; }

        public IReadOnlyList<double> Kinks { get; }

        public double Volume(double h) => Volume(h, 2 * Math.Asin(Math.Sqrt(Math.Min(h / (2 * Radius), 0.5))));

        public double Volume(double h, double phi)
        {
            double shell = length * Radius * Radius / 2 * CircularSegment.AngleLessSine(2 * phi);
            double atFirst = first.Volume(h, phi);
            return shell + atFirst + (ReferenceEquals(first, second) ? atFirst : second.Volume(h, phi));
        }

        public double Area(double h)
        {
            double shell = 2 * length * Math.Sqrt(h * (2 * Radius - h));
            double atFirst = first.Area(h);
            return shell + atFirst + (ReferenceEquals(first, second) ? atFirst : second.Area(h));
        }

        public double Level(double volume)
        {
            if (volume <= 0)
                return 0;
            double start = CircularSegment.AngleNear(Math.PI * volume / HalfVolume) / 2;
            double phi = RisingCurve.Find(new Curve(this), volume, start, Math.PI / 2);
            return LevelAt(phi);
        }

        public double LevelAt(double phi)
        {
            double half = Math.Sin(phi / 2);
            return Math.Min(2 * Radius * half * half, Radius);
        }
    }

    /// <summary>Volume over the half angle φ, in which it is smooth.</summary>
    private readonly struct Curve(Parts parts) : IRisingCurve
    {
        public (double Value, double Slope) At(double x)
        {
            double h = parts.LevelAt(x);
            return (parts.Volume(h, x), parts.Area(h) * parts.Radius * Math.Sin(x));
        }
    }
}
