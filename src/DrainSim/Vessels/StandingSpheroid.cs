namespace DrainSim.Vessels;

/// <summary>The lower half of an upright spheroid.</summary>
/// <remarks><code>
/// V = π·R²·h²·(3d − h)/(3·d²),   A = π·R²·h·(2d − h)/d²
///
/// R   radius of the shell, m
/// d   depth of the head, m
/// </code></remarks>
internal sealed class StandingSpheroid(double radius, double depth)
    : StandingHead(depth, 2.0 / 3 * Math.PI * radius * radius * depth)
{
    private readonly double area = Math.PI * radius * radius;

    public override double Volume(double h) => 2 * Capacity * SphericalCap.VolumeShare(h / (2 * Depth));

    public override double Area(double h)
    {
        double s = h / Depth;
        return area * s * (2 - s);
    }

    public override double Level(double volume) =>
        Math.Min(2 * Depth * SphericalCap.HeightShare(volume / (2 * Capacity)), Depth);
}
