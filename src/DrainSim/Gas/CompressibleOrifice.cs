namespace DrainSim.Gas;

/// <summary>Flow of an ideal gas through an orifice, either way, choked beyond the critical ratio.</summary>
/// <remarks><code>
/// W = Cd · A · p1 · √{ 2k/((k−1)·R·T) · [ r^(2/k) − r^((k+1)/k) ] },   r = p2/p1,
/// r held at (2/(k+1))^(k/(k−1)) when it is lower
///
/// W   mass flow, kg/s;  Cd  discharge coefficient, 1;  A  area, m²
/// p1  upstream, p2 downstream absolute pressure, Pa;  T  upstream temperature, K
/// R   gas constant of the gas, J/(kg·K);  k  its heat capacity ratio, 1
/// </code>
/// Isentropic flow of an ideal gas with negligible approach velocity; one Cd for all ratios, which a sharp edge does
/// not quite have (it rises towards 0.8 when choked). Both sides have one temperature, so that the flow is odd: to
/// swap the pressures changes the sign alone.
/// <para>
/// The root has an infinite slope at p1 = p2. Where the difference is less than <see cref="LinearBand"/> of the upstream
/// pressure, √x is replaced by the odd cubic that has its value and slope at the end of the band. The flow there is
/// low by at most 0.204 of the flow at the end of the band; the pressure difference that goes with a flow is off by at most
/// 0.17 of the band, 0.017 Pa at one atmosphere.
/// </para>
/// Source: any text on gas dynamics, such as A. H. Shapiro, The Dynamics and Thermodynamics of Compressible
/// Fluid Flow (1953), chapter 4 (from memory).
/// </remarks>
public static class CompressibleOrifice
{
    /// <summary>Share of the upstream pressure below which the root is replaced by a cubic, 1.</summary>
    public const double LinearBand = 1e-6;

    // Below this drop r^(1/k) − r is a difference of near equals and its series is used.
    private const double SeriesLimit = 1e-3;

    /// <summary>Mass flow of air from the first side to the second, kg/s; negative the other way.</summary>
    /// <param name="p1">absolute pressure on the first side, Pa</param>
    /// <param name="p2">absolute pressure on the second side, Pa</param>
    /// <param name="temperature">temperature of the air on both sides, K; greater than 0</param>
    /// <param name="area">area of the opening, m²; at least 0</param>
    /// <param name="dischargeCoefficient">Cd, 1; at least 0</param>
    public static double MassFlow(double p1, double p2, double temperature, double area, double dischargeCoefficient) =>
        Flow(p1, p2, temperature, area, dischargeCoefficient, IdealGas.Air).MassFlow;

    /// <summary>Mass flow and its slopes; none where neither side has a pressure.</summary>
    /// <param name="p1">absolute pressure on the first side, Pa</param>
    /// <param name="p2">absolute pressure on the second side, Pa</param>
    /// <param name="temperature">temperature of the gas on both sides, K; greater than 0</param>
    /// <param name="area">area of the opening, m²; at least 0</param>
    /// <param name="dischargeCoefficient">Cd, 1; at least 0</param>
    /// <param name="gas">the gas on both sides</param>
    public static GasFlow Flow(
        double p1, double p2, double temperature, double area, double dischargeCoefficient, IdealGas gas)
    {
        ArgumentNullException.ThrowIfNull(gas);
        double up = Math.Max(p1, p2);
        if (up <= 0)
            return default;
        double x = Math.Abs(p1 - p2) / up;
        double scale = dischargeCoefficient * area / Math.Sqrt(gas.SpecificGasConstant * temperature);
        double psi = FlowFunction(x, gas, out double slope);
        // W = scale·p_up·ψ(x) with x = 1 − p_down/p_up.
        double byUp = scale * (psi + (1 - x) * slope);
        double byDown = -scale * slope;
        double flow = scale * up * psi;
        return p1 >= p2 ? new GasFlow(flow, byUp, byDown) : new GasFlow(-flow, -byDown, -byUp);
    }

    private static double FlowFunction(double x, IdealGas gas, out double slope)
    {
        double choked = 1 - gas.CriticalPressureRatio;
        if (x >= choked)
        {
            double most = Root(choked, gas.HeatCapacityRatio, out _);
            slope = 0;
            return most;
        }
        if (x >= LinearBand)
            return Root(x, gas.HeatCapacityRatio, out slope);
        double end = Root(LinearBand, gas.HeatCapacityRatio, out double endSlope);
        double first = (3 * end - LinearBand * endSlope) / 2;
        double third = (LinearBand * endSlope - end) / 2;
        double u = x / LinearBand;
        slope = (first + 3 * third * u * u) / LinearBand;
        return u * (first + third * u * u);
    }

    // ψ² = 2k/(k−1)·(q² − q·r) with q = r^(1/k), one power instead of two.
    private static double Root(double x, double k, out double slope)
    {
        double r = 1 - x;
        double q = Math.Pow(r, 1 / k);
        double square = x < SeriesLimit ? 2 * q * q * Series(x, (k - 1) / k) : 2 * k / (k - 1) * q * (q - r);
        double psi = Math.Sqrt(square);
        slope = q * (k + 1 - 2 * q / r) / ((k - 1) * psi);
        return psi;
    }

    // [1 − (1−x)^m]/m
    private static double Series(double x, double m) =>
        x * (1 + (1 - m) / 2 * x * (1 + (2 - m) / 3 * x * (1 + (3 - m) / 4 * x)));
}
