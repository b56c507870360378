namespace DrainSim.Gas;

/// <summary>Air pressure and temperature by altitude, in the lowest layer of the standard atmosphere.</summary>
/// <remarks><code>
/// H = r·z / (r + z)
/// T = Tb + β·H
/// p = pb · [1 + (β/Tb)·H]^(−gn/(β·R))
///
/// z   geometric altitude above mean sea level, m;  H  geopotential altitude, m
/// r   nominal radius of the earth, 6 356 766 m
/// T   air temperature, K;  Tb = 288.15 K;  β = −0.0065 K/m
/// p   air pressure, Pa;  pb = 101 325 Pa
/// gn  standard gravity, 9.80665 m/s²;  R  gas constant of air, 287.05287 J/(kg·K)
/// </code>
/// Used here for −500 ≤ z ≤ 11 000 m; the layer ends at H = 11 000 m. The weather moves the real pressure by
/// about 3 % either way. Source: ISO 2533:1975, the same as ICAO Doc 7488.
/// </remarks>
public static class StandardAtmosphere
{
    /// <summary>Lowest altitude, m.</summary>
    public const double LeastAltitude = -500;

    /// <summary>Highest altitude, m.</summary>
    public const double MostAltitude = 11_000;

    private const double EarthRadius = 6_356_766;
    private const double SeaLevelPressure = 101_325;
    private const double SeaLevelTemperature = 288.15;
    private const double Lapse = -0.0065;
    private const double StandardGravity = 9.80665;
    private const double GasConstant = 287.05287;

    /// <summary>Air pressure, Pa absolute.</summary>
    /// <param name="altitude">geometric altitude above mean sea level, m; −500 to 11 000</param>
    /// <exception cref="ArgumentOutOfRangeException">the altitude is outside that range</exception>
    public static double Pressure(double altitude) =>
        SeaLevelPressure * Math.Pow(Temperature(altitude) / SeaLevelTemperature, -StandardGravity / (Lapse * GasConstant));

    /// <summary>Air temperature, K.</summary>
    /// <param name="altitude">geometric altitude above mean sea level, m; −500 to 11 000</param>
    /// <exception cref="ArgumentOutOfRangeException">the altitude is outside that range</exception>
    public static double Temperature(double altitude)
    {
        double z = Require.Within(altitude, LeastAltitude, MostAltitude, "altitude", "m");
        return SeaLevelTemperature + Lapse * EarthRadius * z / (EarthRadius + z);
    }
}
