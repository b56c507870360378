namespace DrainSim.Vessels;

/// <summary>Half a spheroid at the end of a lying shell.</summary>
/// <remarks><code>
/// V = π·d·h²·(3R − h)/(6·R),   A = π·d·h·(2R − h)/(2·R)
///
/// R   radius of the shell, m
/// d   depth of the head, m
/// </code></remarks>
internal sealed class LyingSpheroid(double radius, double depth) : LyingHead
{
    public override double Volume(double h, double phi) => Math.PI * depth / (6 * radius) * h * h * (3 * radius - h);

    public override double Area(double h) => Math.PI * depth / (2 * radius) * h * (2 * radius - h);
}
