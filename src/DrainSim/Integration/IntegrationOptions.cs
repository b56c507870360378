namespace DrainSim.Integration;

/// <summary>How accurately and for how long to integrate.</summary>
public sealed record IntegrationOptions
{
    /// <summary>Largest estimated error of a component in one step, relative to its error scale, 1;
    /// from 1e-13 to 0.1.</summary>
    public double RelativeTolerance
    {
        get;
        init => field = Require.Within(value, 1e-13, 0.1, "relative tolerance", "");
    } = 1e-8;

    /// <summary>Length of the first step tried, greater than 0; null to have it chosen at the cost of one
    /// derivative.</summary>
    public double? FirstStep
    {
        get;
        init => field = value is { } length ? Require.Positive(length, "first step", "") : null;
    }

    /// <summary>Most steps tried, the rejected included; at least 1.</summary>
    public int MaximumSteps
    {
        get;
        init => field = (int)Require.Within(value, 1, int.MaxValue, "maximum number of steps", "");
    } = 100_000;

    /// <summary>Number of equal parts of a step at whose ends the event functions are looked at; 1 to 1000.
    /// Two crossings of one function within one part are not seen.</summary>
    public int EventSamplesPerStep
    {
        get;
        init => field = (int)Require.Within(value, 1, 1000, "number of event samples in a step", "");
    } = 4;
}
