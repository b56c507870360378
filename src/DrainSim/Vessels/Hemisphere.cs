namespace DrainSim.Vessels;

/// <summary>A hemispherical head: as deep as the shell's radius.</summary>
public sealed record Hemisphere : Head
{
    /// <inheritdoc/>
    public override double DepthOn(double diameter) => diameter / 2;

    internal override StandingHead Stand(double radius) => new StandingSpheroid(radius, radius);

    internal override LyingHead Lie(double radius) => new LyingSpheroid(radius, radius);
}
