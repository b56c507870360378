namespace DrainSim.Lines;

/// <summary>A straight run of one bore.</summary>
public sealed record StraightRun : PathItem
{
    /// <summary>Developed length along the axis, m; greater than 0.</summary>
    public required double Length { get; init => field = Require.Positive(value, "run length", "m"); }

    /// <summary>Elevation gained from its start to its end, m; negative where the run falls.</summary>
    public required double Rise { get; init => field = Require.Finite(value, "rise", "m"); }

    /// <summary>Equivalent sand-grain roughness, m; null when it is the line's.</summary>
    public double? Roughness
    {
        get;
        init => field = value is { } roughness ? Require.NotNegative(roughness, "roughness", "m") : null;
    }
}
