namespace DrainSim.Gas;

/// <summary>The law that ties the pressure over a liquid to the mass and the volume of the gas there.</summary>
/// <remarks><code>
/// p = pv + pg,   pg · (V/m)^n = C
///
/// p   pressure on the liquid, pv vapour pressure of the liquid, pg partial pressure of the gas, Pa
/// V   volume of the headspace, m³;  m  mass of gas in it, kg
/// n   polytropic exponent, 1;  C = R·T at n = 1
/// </code>
/// The vapour is always saturated (Dalton's law). With n other than 1 and gas coming in, the newcomer is taken
/// to be at the state of the gas inside: exact for n = 1, a fair picture while n is near it.
/// </remarks>
public sealed record GasSpace
{
    private readonly double coefficient;

    /// <summary>Fixes the law by one known state.</summary>
    /// <param name="pressure">pressure on the liquid, Pa absolute; above the vapour pressure</param>
    /// <param name="temperature">temperature of the gas, K; greater than 0</param>
    /// <param name="vapourPressure">vapour pressure of the liquid, Pa; at least 0</param>
    /// <param name="exponent">polytropic exponent n, 1; at least 1</param>
    /// <param name="gas">the gas; null for air</param>
    /// <exception cref="ArgumentOutOfRangeException">a value is outside its range</exception>
    public GasSpace(double pressure, double temperature, double vapourPressure, double exponent = 1, IdealGas? gas = null)
    {
        VapourPressure = Require.NotNegative(vapourPressure, "vapour pressure", "Pa");
        Exponent = Require.Within(exponent, 1, 1.67, "polytropic exponent", "");
        double gasPressure = Require.Positive(pressure - vapourPressure, "headspace pressure above the vapour pressure", "Pa");
        double density = (gas ?? IdealGas.Air).Density(gasPressure, Require.Positive(temperature, "gas temperature", "K"));
        coefficient = gasPressure / Power(density, exponent);
    }

    /// <summary>Vapour pressure of the liquid pv, Pa.</summary>
    public double VapourPressure { get; }

    /// <summary>Polytropic exponent n, 1.</summary>
    public double Exponent { get; }

    /// <summary>Pressure on the liquid, Pa absolute.</summary>
    /// <param name="mass">mass of gas, kg; at least 0</param>
    /// <param name="volume">volume of the headspace, m³; greater than 0</param>
    public double Pressure(double mass, double volume) =>
        VapourPressure + coefficient * Power(mass / volume, Exponent);

    /// <summary>Density of the gas without the vapour, kg/m³; 0 at the vapour pressure and below.</summary>
    /// <param name="pressure">pressure on the liquid, Pa absolute</param>
    public double Density(double pressure) =>
        Power(Math.Max(pressure - VapourPressure, 0) / coefficient, 1 / Exponent);

    /// <summary>Mass of gas in a volume, kg.</summary>
    /// <param name="pressure">pressure on the liquid, Pa absolute</param>
    /// <param name="volume">volume of the headspace, m³; at least 0</param>
    public double Mass(double pressure, double volume) => Density(pressure) * volume;

    /// <summary>Volume that a mass of gas takes up, m³.</summary>
    /// <param name="pressure">pressure on the liquid, Pa absolute; above the vapour pressure</param>
    /// <param name="mass">mass of gas, kg; at least 0</param>
    public double Volume(double pressure, double mass) => mass / Density(pressure);

    /// <summary>How fast the pressure changes while gas comes in and the headspace grows: the law by time.</summary>
    /// <remarks><code>
    /// dp/dt = n/V · [ (pg/ρ)·W − pg·dV/dt ],   pg/ρ = C^(1/n) · pg^(1 − 1/n)
    ///
    /// W  mass flow in, kg/s;  ρ  density of the gas without the vapour, kg/m³
    /// </code>
    /// At the vapour pressure and below only what comes in counts, and for n other than 1 not even that.
    /// </remarks>
    /// <param name="pressure">pressure on the liquid, Pa absolute</param>
    /// <param name="volume">volume of the headspace, m³; greater than 0</param>
    /// <param name="massFlow">mass flow of gas into it, kg/s</param>
    /// <param name="massFlowSlope">its slope by the pressure, kg/(s·Pa)</param>
    /// <param name="growth">rate at which the volume grows, m³/s</param>
    public PressureRate Rate(double pressure, double volume, double massFlow, double massFlowSlope, double growth)
    {
        double gasPressure = pressure - VapourPressure;
        double perDensity = Exponent == 1 ? coefficient : Math.Pow(coefficient, 1 / Exponent) * Math.Pow(Math.Max(gasPressure, 0), 1 - 1 / Exponent);
        double perDensitySlope = gasPressure > 0 ? perDensity * (1 - 1 / Exponent) / gasPressure : 0;
        double share = Exponent / volume;
        double rate = share * (perDensity * massFlow - gasPressure * growth);
        return new PressureRate(
            rate,
            share * (perDensitySlope * massFlow + perDensity * massFlowSlope - growth),
            -rate / volume,
            -share * gasPressure);
    }

    private static double Power(double value, double exponent) =>
        exponent == 1 ? value : Math.Pow(value, exponent); // exactly 1 is the usual case and needs no power
}
