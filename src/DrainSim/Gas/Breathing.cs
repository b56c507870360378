namespace DrainSim.Gas;

/// <summary>The pressure at which a headspace breathes in just what the liquid leaves free.</summary>
/// <remarks><code>
/// W(p) = Q · (p − pv)/(R·T)
///
/// W   mass flow in through the openings, kg/s;  Q  volume that the liquid leaves free, m³/s
/// p   pressure in the headspace, pv vapour pressure of the liquid, Pa;  R  gas constant of air, J/(kg·K);  T  temperature, K
/// </code>
/// The mass balance of the gas with its storage m·dp/p left out: right when the relaxation time of the headspace is
/// short against the time in which the outflow changes.
/// </remarks>
public static class Breathing
{
    private const int MostTurns = 200;

    // Beyond this many atmospheres no tank stands, so no pressure is looked for.
    private const double MostAtmospheres = 100;

    /// <summary>The pressure, Pa absolute; null when the openings cannot pass the flow.</summary>
    /// <remarks>Where nothing flows and valves are shut any pressure would do: that of the atmosphere is given.</remarks>
    /// <param name="headspace">the headspace and its openings</param>
    /// <param name="volumeOutflow">volume of liquid that leaves less what comes in, m³/s; negative while the tank fills</param>
    /// <param name="vapourPressure">vapour pressure of the liquid, Pa; at least 0, below that of the atmosphere</param>
    /// <param name="outside">the air outside</param>
    /// <param name="slope">dp/dQ, Pa·s/m³; at most 0; 0 where the pressure is null or any would do</param>
    public static double? SteadyPressure(
        VentedHeadspace headspace, double volumeOutflow, double vapourPressure, in Surroundings outside, out double slope)
    {
        ArgumentNullException.ThrowIfNull(headspace);
        double pvRoom = Require.Positive(outside.Pressure - vapourPressure, "atmospheric pressure above the vapour pressure", "Pa");
        double densityByPressure = IdealGas.Air.Density(1, outside.Temperature);
        Balance balance = new(headspace, volumeOutflow, outside.Pressure - pvRoom, densityByPressure, outside);
        slope = 0;
        if (balance.Bracket(out double low, out double high) is false)
            return null;
        double pressure = low < high ? balance.Root(low, high) : low;
        balance.Excess(pressure, out double excessSlope);
        if (excessSlope < 0)
            slope = densityByPressure * (pressure - vapourPressure) / excessSlope;
        return pressure;
    }

    /// <summary>Gas that comes in less gas that is wanted, as a function of the pressure.</summary>
    private readonly ref struct Balance(
        VentedHeadspace headspace, double outflow, double vapourPressure, double densityByPressure, in Surroundings outside)
    {
        private readonly Surroundings air = outside;

        public double Excess(double pressure, out double slope)
        {
            double flow = headspace.MassFlow(pressure, air, out slope);
            slope -= outflow * densityByPressure;
            return flow - outflow * densityByPressure * (pressure - vapourPressure);
        }

        // The excess is at least 0 at the low end and at most 0 at the high end.
        public bool Bracket(out double low, out double high)
        {
            low = high = air.Pressure;
            if (outflow > 0)
            {
                low = vapourPressure;
                return Excess(low, out _) > 0;
            }
            double over = 1e-4 * air.Pressure;
            while (outflow < 0 && high <= MostAtmospheres * air.Pressure)
            {
                low = high;
                high = air.Pressure + over;
                over *= 4;
                if (Excess(high, out _) < 0)
                    return true;
            }
            return outflow >= 0;
        }

        // Newton, halving where that leaves the bracket.
        public double Root(double low, double high)
        {
            double pressure = outflow > 0 ? high - 1e-6 * (high - low) : (low + high) / 2;
            for (int turn = 0; turn < MostTurns && high - low > 1e-15 * air.Pressure; turn++)
            {
                double excess = Excess(pressure, out double slope);
                if (excess > 0)
                    low = pressure;
                else
                    high = pressure;
                double step = excess / slope;
                // A step below the last bits may point out of the bracket; it is an end, not a reason to halve.
                if (Math.Abs(step) <= 1e-15 * air.Pressure)
                    break;
                double next = pressure - step;
                pressure = next > low && next < high ? next : (low + high) / 2;
            }
            return pressure;
        }
    }
}
