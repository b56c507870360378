namespace DrainSim.Vessels;

/// <summary>An earth or lined pond: a rectangular floor and four banks of one slope.</summary>
/// <remarks><code>
/// V = a·b·h + (a + b)·m·h² + (4/3)·m²·h³,   A = (a + 2·m·h)·(b + 2·m·h)
///
/// a, b  length and width of the floor, m
/// m     side slope, horizontal per vertical, 1
/// </code>
/// The level is the one positive root of the cubic, found by <see cref="RisingCurve"/>: Cardano's formula
/// cancels when the pond is nearly empty.
/// </remarks>
public sealed record Basin : Vessel
{
    /// <summary>Length of the floor, m; greater than 0.</summary>
    public required double BottomLength { get; init => field = Require.Positive(value, "basin bottom length", "m"); }

    /// <summary>Width of the floor, m; greater than 0.</summary>
    public required double BottomWidth { get; init => field = Require.Positive(value, "basin bottom width", "m"); }

    /// <summary>Slope of the banks, horizontal per vertical, 1; at least 0 (upright).</summary>
    public required double SideSlope { get; init => field = Require.NotNegative(value, "basin side slope", "m per m"); }

    /// <summary>Depth from the floor to the brim, m; greater than 0.</summary>
    public required double Depth { get; init => field = Require.Positive(value, "basin depth", "m"); }

    /// <inheritdoc/>
    public override double Height => Depth;

    /// <inheritdoc/>
    public override double Capacity => VolumeAt(Depth);

    /// <inheritdoc/>
    public override double Volume(double level) => VolumeAt(Math.Clamp(level, 0, Depth));

    /// <inheritdoc/>
    public override double Area(double level) => AreaAt(Math.Clamp(level, 0, Depth));

    /// <inheritdoc/>
    public override double Level(double volume)
    {
        if (volume <= 0)
            return 0;
        if (volume >= Capacity)
            return Depth;
        double m = SideSlope;
        double start = volume / (BottomLength * BottomWidth);
        if (m > 0)
        {
            start = Math.Min(start, Math.Sqrt(volume / ((BottomLength + BottomWidth) * m)));
            start = Math.Min(start, Math.Cbrt(0.75 * volume / (m * m)));
        }
        return RisingCurve.Find(new Curve(this), volume, start, Depth);
    }

    private double VolumeAt(double h)
    {
        double mh = SideSlope * h;
        return h * (BottomLength * BottomWidth + mh * (BottomLength + BottomWidth + 4.0 / 3 * mh));
    }

    private double AreaAt(double h) => (BottomLength + 2 * SideSlope * h) * (BottomWidth + 2 * SideSlope * h);

    private readonly struct Curve(Basin basin) : IRisingCurve
    {
        public (double Value, double Slope) At(double x) => (basin.VolumeAt(x), basin.AreaAt(x));
    }
}
