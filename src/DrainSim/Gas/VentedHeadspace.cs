namespace DrainSim.Gas;

/// <summary>A headspace that breathes through openings.</summary>
public sealed record VentedHeadspace : ConfinedHeadspace
{
    private readonly Opening[] openings = [];

    /// <summary>The openings, at least one; two records are equal only when they share the list.</summary>
    /// <exception cref="ArgumentOutOfRangeException">there is none</exception>
    public required IReadOnlyList<Opening> Openings
    {
        get => openings;
        init
        {
            ArgumentNullException.ThrowIfNull(value);
            openings = value.Count > 0
                ? [.. value]
                : throw new ArgumentOutOfRangeException(null, "number of openings of a vented headspace must be at least 1, got 0");
        }
    }

    /// <summary>Mass flow into the headspace through all openings, kg/s; negative when gas leaves.</summary>
    /// <param name="pressure">absolute pressure in the headspace, Pa</param>
    /// <param name="outside">the air outside</param>
    /// <param name="slope">dW/dp, kg/(s·Pa); at most 0</param>
    public double MassFlow(double pressure, in Surroundings outside, out double slope)
    {
        double flow = 0;
        slope = 0;
        foreach (Opening opening in openings)
        {
            flow += opening.MassFlow(pressure, outside, out double own);
            slope += own;
        }
        return flow;
    }
}
