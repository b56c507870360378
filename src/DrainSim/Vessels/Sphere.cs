namespace DrainSim.Vessels;

/// <summary>A sphere.</summary>
/// <remarks><code>
/// V = π·h²·(3D − 2h)/6,   A = π·h·(D − h)
///
/// D   inside diameter, m
/// h   level, m
/// </code></remarks>
public sealed record Sphere : Vessel
{
    /// <summary>Inside diameter, m; greater than 0.</summary>
    public required double Diameter { get; init => field = Require.Positive(value, "sphere diameter", "m"); }

    /// <inheritdoc/>
    public override double Height => Diameter;

    /// <inheritdoc/>
    public override double Capacity => Math.PI / 6 * Diameter * Diameter * Diameter;

    /// <inheritdoc/>
    public override double Volume(double level)
    {
        double s = Math.Clamp(level, 0, Diameter) / Diameter;
        double capacity = Capacity;
        return s <= 0.5
            ? capacity * SphericalCap.VolumeShare(s)
            : capacity - capacity * SphericalCap.VolumeShare(1 - s);
    }

    /// <inheritdoc/>
    public override double Area(double level)
    {
        double h = Math.Clamp(level, 0, Diameter);
        return Math.PI * h * (Diameter - h);
    }

    /// <inheritdoc/>
    public override double Level(double volume)
    {
        double capacity = Capacity;
        double v = Math.Clamp(volume, 0, capacity);
        return v <= capacity / 2
            ? Diameter * SphericalCap.HeightShare(v / capacity)
            : Diameter - Diameter * SphericalCap.HeightShare((capacity - v) / capacity);
    }
}
