namespace DrainSim.Gas;

/// <summary>A headspace whose own gas has a say in the pressure.</summary>
public abstract record ConfinedHeadspace : Headspace
{
    private protected ConfinedHeadspace()
    {
    }

    /// <summary>Polytropic exponent n of the gas, 1: 1 keeps its temperature, 1.4 takes up no heat; 1 to 1.67.</summary>
    public double PolytropicExponent
    {
        get;
        init => field = Require.Within(value, 1, 1.67, "polytropic exponent", "");
    } = 1;

    /// <summary>Pressure at the start, vapour included, Pa absolute; null for that of the atmosphere.</summary>
    public double? InitialPressure
    {
        get;
        init => field = value is { } pressure ? Require.Positive(pressure, "initial headspace pressure", "Pa") : null;
    }
}
