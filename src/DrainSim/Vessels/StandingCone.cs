namespace DrainSim.Vessels;

/// <summary>An upright cone standing on its tip.</summary>
/// <remarks><code>
/// V = π·R²·d·s³/3,   A = π·R²·s²,   s = h/d
/// </code></remarks>
internal sealed class StandingCone(double radius, double depth)
    : StandingHead(depth, Math.PI / 3 * radius * radius * depth)
{
    private readonly double area = Math.PI * radius * radius;

    public override double Volume(double h)
    {
        double s = h / Depth;
        return Capacity * s * s * s;
    }

    public override double Area(double h)
    {
        double s = h / Depth;
        return area * s * s;
    }

    public override double Level(double volume) => Depth * Math.Cbrt(volume / Capacity);
}
