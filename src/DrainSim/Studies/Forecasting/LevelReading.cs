namespace DrainSim.Studies.Forecasting;

/// <summary>One reading of the level.</summary>
public readonly record struct LevelReading
{
    /// <param name="time">when it was taken, s since the start of the job; at least 0</param>
    /// <param name="level">level above the tank's lowest inside point, m</param>
    /// <param name="resolution">smallest step that the instrument shows, m; greater than 0</param>
    /// <exception cref="ArgumentOutOfRangeException">a number is out of its range</exception>
    public LevelReading(double time, double level, double resolution)
    {
        Time = Require.NotNegative(time, "time of a reading", "s");
        Level = Require.NotNegative(level, "level of a reading", "m");
        Resolution = Require.Positive(resolution, "resolution of a reading", "m");
    }

    /// <summary>When it was taken, s since the start of the job.</summary>
    public double Time { get; }

    /// <summary>Level above the tank's lowest inside point, m.</summary>
    public double Level { get; }

    /// <summary>Smallest step that the instrument shows, m.</summary>
    public double Resolution { get; }

    /// <summary>
    /// Standard uncertainty that the resolution alone leaves, m: that of a uniform distribution of this width (JCGM 100:2008,
    /// Guide to the expression of uncertainty in measurement, F.2.2.1).
    /// </summary>
    public double Uncertainty => Resolution / Math.Sqrt(12);
}
