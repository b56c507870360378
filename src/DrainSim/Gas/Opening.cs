namespace DrainSim.Gas;

/// <summary>A way for gas between a headspace and the air outside.</summary>
/// <remarks>
/// A closed set: the cases live beside this file. What flows is taken as air in both directions; vapour of the
/// liquid that leaves with it is not counted.
/// </remarks>
public abstract record Opening
{
    private protected Opening()
    {
    }

    /// <summary>Name by which a parameter path finds the opening; null when it has none.</summary>
    public string? Name { get; init; }

    /// <summary>Bore, m; greater than 0; for another shape that of the same area.</summary>
    public required double Bore { get; init => field = Require.Positive(value, "vent bore", "m"); }

    /// <summary>Area of the bore, m².</summary>
    public double Area => Math.PI / 4 * Bore * Bore;

    /// <summary>Mass flow into the headspace, kg/s; negative when gas leaves; never rises with the pressure.</summary>
    /// <param name="pressure">absolute pressure in the headspace, Pa</param>
    /// <param name="outside">the air outside</param>
    /// <param name="slope">dW/dp, kg/(s·Pa); at most 0</param>
    public abstract double MassFlow(double pressure, in Surroundings outside, out double slope);

    private protected double OrificeFlow(
        double pressure, in Surroundings outside, double dischargeCoefficient, out double slope)
    {
        GasFlow flow = CompressibleOrifice.Flow(
            outside.Pressure, pressure, outside.Temperature, Area, dischargeCoefficient, IdealGas.Air);
        slope = flow.SecondSlope;
        return flow.MassFlow;
    }
}
