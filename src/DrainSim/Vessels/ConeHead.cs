namespace DrainSim.Vessels;

/// <summary>A conical head, given by its depth or by the angle of the cone.</summary>
public sealed record ConeHead : Head
{
    private ConeHead()
    {
    }

    /// <summary>Inside depth, m; null when the angle is given.</summary>
    public double? Depth { get; private init; }

    /// <summary>Included angle at the apex, rad; null when the depth is given.</summary>
    public double? IncludedAngle { get; private init; }

    /// <summary>A cone of a given depth.</summary>
    /// <param name="depth">inside depth, m; greater than 0</param>
    /// <exception cref="ArgumentOutOfRangeException">names the quantity and its unit</exception>
    public static ConeHead OfDepth(double depth) => new() { Depth = Require.Positive(depth, "depth of the cone head", "m") };

    /// <summary>A cone of a given included angle: 60° is steep, 120° flat.</summary>
    /// <param name="angle">included angle at the apex, rad; from 0.01 to 3.14</param>
    /// <exception cref="ArgumentOutOfRangeException">names the quantity and its unit</exception>
    public static ConeHead OfAngle(double angle) =>
        new() { IncludedAngle = Require.Within(angle, 0.01, 3.14, "included angle of the cone head", "rad") };

    /// <inheritdoc/>
    public override double DepthOn(double diameter) =>
        Depth ?? diameter / 2 / Math.Tan(IncludedAngle.GetValueOrDefault() / 2);

    internal override StandingHead Stand(double radius) => new StandingCone(radius, DepthOn(2 * radius));

    internal override LyingHead Lie(double radius) => new LyingCone(radius, DepthOn(2 * radius));
}
