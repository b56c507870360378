namespace DrainSim.Draining;

/// <summary>Where the job is.</summary>
public sealed record Site
{
    /// <summary>Standard acceleration of gravity, m/s²; ISO 80000-3, exact by definition.</summary>
    public const double StandardGravity = 9.80665;

    /// <summary>Atmospheric pressure, Pa absolute; greater than 0.</summary>
    public double AtmosphericPressure
    {
        get;
        init => field = Require.Positive(value, "atmospheric pressure", "Pa");
    } = 101325;

    /// <summary>Acceleration of gravity, m/s²; greater than 0.</summary>
    public double Gravity { get; init => field = Require.Positive(value, "gravity", "m/s2"); } = StandardGravity;
}
