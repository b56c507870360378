namespace DrainSim.Lines;

/// <summary>A hose or pipe from the tank to its outlet.</summary>
public sealed record Line
{
    /// <summary>Name; null where the tank has one line.</summary>
    public string? Name { get; init; }

    /// <summary>Bore at the inlet and wherever no item says otherwise, m; greater than 0.</summary>
    public required double Bore { get; init => field = Require.Positive(value, "bore", "m"); }

    /// <summary>Equivalent sand-grain roughness where no run says otherwise, m; 0 for a smooth wall.</summary>
    public required double Roughness { get; init => field = Require.NotNegative(value, "roughness", "m"); }

    /// <summary>Number of identical lines side by side; at least 1.</summary>
    public int Parallel
    {
        get;
        init => field = value >= 1
            ? value
            : throw new ArgumentOutOfRangeException(null, $"number of parallel lines must be at least 1, got {value}");
    } = 1;

    /// <summary>Where the liquid enters.</summary>
    public required Inlet Inlet { get; init; }

    /// <summary>The way from the inlet to the outlet, in order.</summary>
    public required IReadOnlyList<PathItem> Path { get; init; }

    /// <summary>What happens when the low point reaches the vapour pressure.</summary>
    public AtVapour AtVapour { get; init; } = AtVapour.Break;

    /// <summary>Least pressure allowed in the line, Pa absolute; null when the vapour pressure alone counts.</summary>
    public double? LeastPressure
    {
        get;
        init => field = value is { } pressure ? Require.NotNegative(pressure, "least pressure", "Pa") : null;
    }

    /// <summary>Elevation of a hole or vent on the line, below which the level lets air in, m; null for none.</summary>
    public double? AirBreak { get; init => field = value is { } hole ? Require.NotNegative(hole, "air break", "m") : null; }

    /// <summary>Vacuum that the hose stands before it flattens, Pa below the atmosphere; null where it is not known.</summary>
    public double? VacuumRating
    {
        get;
        init => field = value is { } rating ? Require.NotNegative(rating, "hose vacuum rating", "Pa") : null;
    }
}
