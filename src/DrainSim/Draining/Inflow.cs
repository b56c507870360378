namespace DrainSim.Draining;

/// <summary>What runs into the tank meanwhile: a flow that is constant or follows a table over time.</summary>
public sealed record Inflow
{
    private readonly (double Time, double Flow)[] points = [];

    /// <summary>Points (time, s; flow, m³/s), rising in time, straight lines between, constant before and after.</summary>
    /// <exception cref="ArgumentOutOfRangeException">there is none, times do not rise, or a flow is negative</exception>
    public required IReadOnlyList<(double Time, double Flow)> Points
    {
        get => points;
        init
        {
            ArgumentNullException.ThrowIfNull(value);
            ArgumentOutOfRangeException.ThrowIfZero(value.Count, "inflow points");
            double last = double.NegativeInfinity;
            foreach ((double time, double flow) in value)
            {
                Require.NotNegative(flow, "inflow", "m3/s");
                if (!(Require.Finite(time, "inflow time", "s") > last))
                    throw new ArgumentOutOfRangeException(null, "inflow times must rise");
                last = time;
            }

            points = [.. value];
        }
    }

    /// <summary>A flow that never changes.</summary>
    /// <param name="flow">flow, m³/s; at least 0</param>
    public static Inflow Constant(double flow) => new() { Points = [(0, flow)] };

    /// <summary>Flow into the tank, m³/s.</summary>
    /// <param name="time">since the start, s</param>
    public double Flow(double time)
    {
        if (time <= points[0].Time)
            return points[0].Flow;
        if (time >= points[^1].Time)
            return points[^1].Flow;
        int i = 1;
        while (points[i].Time < time)
            i++;
        double share = (time - points[i - 1].Time) / (points[i].Time - points[i - 1].Time);
        return points[i - 1].Flow + share * (points[i].Flow - points[i - 1].Flow);
    }

    /// <summary>How fast the flow changes, m³/s²; at a point of the table as just after it.</summary>
    /// <param name="time">since the start, s</param>
    public double Slope(double time)
    {
        if (time < points[0].Time || time >= points[^1].Time)
            return 0;
        int i = 1;
        while (points[i].Time <= time)
            i++;
        return (points[i].Flow - points[i - 1].Flow) / (points[i].Time - points[i - 1].Time);
    }

    /// <summary>Volume that has run in since a time, m³.</summary>
    /// <param name="from">from, s</param>
    /// <param name="to">to, s; at least <paramref name="from"/></param>
    public double Volume(double from, double to)
    {
        double volume = 0, at = from;
        foreach ((double time, _) in points)
        {
            if (time > at && time < to)
            {
                volume += (time - at) * (Flow(at) + Flow(time)) / 2;
                at = time;
            }
        }

        return volume + (to - at) * (Flow(at) + Flow(to)) / 2;
    }
}
