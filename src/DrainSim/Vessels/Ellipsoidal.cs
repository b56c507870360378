namespace DrainSim.Vessels;

/// <summary>Half a spheroid; 2:1 unless a depth is given.</summary>
public sealed record Ellipsoidal : Head
{
    /// <summary>Inside depth, m, greater than 0; null for 2:1, a quarter of the shell's diameter.</summary>
    public double? Depth
    {
        get;
        init => field = value is { } depth ? Require.Positive(depth, "depth of the ellipsoidal head", "m") : null;
    }

    /// <inheritdoc/>
    public override double DepthOn(double diameter) => Depth ?? diameter / 4;

    internal override StandingHead Stand(double radius) => new StandingSpheroid(radius, DepthOn(2 * radius));

    internal override LyingHead Lie(double radius) => new LyingSpheroid(radius, DepthOn(2 * radius));
}
