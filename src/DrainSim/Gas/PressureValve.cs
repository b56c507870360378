namespace DrainSim.Gas;

/// <summary>A valve that a pressure difference across it lifts, one way alone.</summary>
/// <remarks>
/// The open share rises in a straight line from 0 at the set pressure to 1 at the full-open pressure; the flow is that of
/// an orifice with the open share of the bore's area. Real pallets pop and flutter: common practice, no source.
/// </remarks>
public abstract record PressureValve : Opening
{
    private protected PressureValve()
    {
    }

    /// <summary>Difference from the atmosphere at which the valve begins to open, Pa; at least 0.</summary>
    public required double SetPressure { get; init => field = Require.NotNegative(value, "set pressure", "Pa"); }

    /// <summary>What the difference must gain over the set pressure to open the valve fully, Pa; greater than 0.</summary>
    public required double OpeningRise { get; init => field = Require.Positive(value, "full-open less set pressure", "Pa"); }

    /// <summary>Discharge coefficient Cd of the fully open bore, 1; greater than 0, at most 1.</summary>
    public double DischargeCoefficient
    {
        get;
        init => field = Require.Within(Require.Positive(value, "discharge coefficient", ""), 0, 1, "discharge coefficient", "");
    } = VentOrifice.SharpEdge;

    /// <summary>Difference from the atmosphere at which the valve is fully open, Pa.</summary>
    public double FullOpenPressure => SetPressure + OpeningRise;

    /// <summary>Open share of the bore's area, 1.</summary>
    /// <param name="difference">pressure difference in the direction that opens the valve, Pa</param>
    public double OpenShare(double difference) => Math.Clamp((difference - SetPressure) / OpeningRise, 0, 1);

    // The sign is that of d(difference)/d(pressure in the headspace).
    private protected double ValveFlow(
        double pressure, in Surroundings outside, double difference, double sign, out double slope)
    {
        slope = 0;
        double share = OpenShare(difference);
        if (share <= 0)
            return 0;
        double full = OrificeFlow(pressure, outside, DischargeCoefficient, out double fullSlope);
        slope = share * fullSlope + (share < 1 ? sign * full / OpeningRise : 0);
        return share * full;
    }
}
