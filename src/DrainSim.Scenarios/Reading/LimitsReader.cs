using DrainSim.Draining;
using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the block <c>limits</c>.</summary>
internal static class LimitsReader
{
    /// <summary>What the job must keep.</summary>
    public static JobLimits Read(BlockReader block)
    {
        double? atLeast = null, atMost = null;
        if (block.Block("drain_time") is { } window)
        {
            atLeast = window.Amount("at_least", Quantities.Time, Allowed.Positive);
            atMost = window.Amount("at_most", Quantities.Time, Allowed.Positive);
            if (atLeast > atMost)
                window.Refuse("at_most", "is shorter than 'at_least'", "The window ends after it begins");
            if (!window.Has("at_least") && !window.Has("at_most"))
                window.Miss("is missing", "Give at_least, at_most or both", "at_most");
            window.Finish();
        }
        JobLimits limits = new()
        {
            DrainTimeAtLeast = atLeast,
            DrainTimeAtMost = atMost,
            LeftVolume = block.Amount("left_volume", Quantities.Volume, Allowed.NotNegative),
            LargestFlow = block.Amount("largest_flow", Quantities.Flow, Allowed.Positive),
            LargestVelocity = block.Amount("largest_velocity", Quantities.Velocity, Allowed.Positive),
            FastestFall = block.Amount("fastest_fall", Quantities.Velocity, Allowed.Positive),
            LeastMargin = block.Amount("least_margin", Quantities.Pressure, Allowed.NotNegative),
            LargestVacuum = block.Amount("largest_vacuum", Quantities.Pressure, Allowed.NotNegative),
            ReceiverLevel = block.Amount("receiver_level", Quantities.Length, Allowed.NotNegative),
        };
        block.Finish();
        return limits;
    }
}
