namespace DrainSim.Vessels;

/// <summary>A rectangular tank with upright walls.</summary>
public sealed record Box : Vessel
{
    /// <summary>Inside length, m; greater than 0.</summary>
    public required double Length { get; init => field = Require.Positive(value, "box length", "m"); }

    /// <summary>Inside width, m; greater than 0.</summary>
    public required double Width { get; init => field = Require.Positive(value, "box width", "m"); }

    /// <summary>Inside height of the walls, m; greater than 0.</summary>
    public required double WallHeight { get; init => field = Require.Positive(value, "box height", "m"); }

    /// <inheritdoc/>
    public override double Height => WallHeight;

    /// <inheritdoc/>
    public override double Capacity => Length * Width * WallHeight;

    /// <inheritdoc/>
    public override double Volume(double level) => Length * Width * Math.Clamp(level, 0, WallHeight);

    /// <inheritdoc/>
    public override double Area(double level) => Length * Width;

    /// <inheritdoc/>
    public override double Level(double volume) => WallHeight * Math.Clamp(volume / Capacity, 0, 1);
}
