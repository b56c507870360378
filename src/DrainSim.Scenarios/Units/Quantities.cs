namespace DrainSim.Scenarios.Units;

/// <summary>The table of units: every quantity that a scenario may give.</summary>
/// <remarks>
/// All factors follow from definitions: the international yard and pound agreement of 1959 (1 yd =
/// 0.9144 m, 1 lb = 0.45359237 kg), the US gallon of 231 in³, the imperial gallon of 4.54609 L, the
/// conventional densities of mercury (13 595.1 kg/m³) and water (1000 kg/m³) under 9.80665 m/s².
/// Spellings hold in exact case: mPa is not MPa.
/// </remarks>
public static class Quantities
{
    private const double Inch = 0.0254;
    private const double Foot = 12 * Inch;
    private const double CubicFoot = Foot * Foot * Foot;
    private const double Gallon = 231 * Inch * Inch * Inch;
    private const double ImperialGallon = 4.54609e-3;
    private const double Barrel = 42 * Gallon;
    private const double Pound = 0.45359237;
    private const double StandardGravity = 9.80665;
    private const double Mercury = 13595.1;
    private const double Minute = 60;
    private const double Hour = 3600;
    private const double Day = 86400;

    /// <summary>Lengths and elevations, m.</summary>
    public static Quantity Length { get; } = new()
    {
        Name = "length",
        SiUnit = "m",
        Examples = "38 mm, 1.5 in or 0.038 m",
        Units =
        [
            Row("m", 1, "SI base unit"),
            Row("km", 1e3, "1000 m"),
            Row("dm", 0.1, "0.1 m"),
            Row("cm", 1e-2, "0.01 m"),
            Row("mm", 1e-3, "0.001 m"),
            Row("um", 1e-6, "1e-6 m", "µm", "μm"),
            Row("in", Inch, "0.0254 m exactly", "inch", "inches"),
            Row("ft", Foot, "12 in, 0.3048 m exactly", "foot", "feet"),
            Row("yd", 3 * Foot, "3 ft, 0.9144 m exactly"),
            Row("mil", 1e-3 * Inch, "0.001 in", "thou"),
        ],
    };

    /// <summary>Areas, m².</summary>
    public static Quantity Area { get; } = new()
    {
        Name = "area",
        SiUnit = "m2",
        Examples = "4.5 m2, 20 cm2 or 48 ft2",
        Units =
        [
            Row("m2", 1, "1 m · 1 m", "m²", "m^2"),
            Row("cm2", 1e-4, "1 cm · 1 cm", "cm²", "cm^2"),
            Row("mm2", 1e-6, "1 mm · 1 mm", "mm²", "mm^2"),
            Row("ha", 1e4, "10 000 m2"),
            Row("in2", Inch * Inch, "1 in · 1 in", "in²", "in^2"),
            Row("ft2", Foot * Foot, "1 ft · 1 ft", "ft²", "ft^2"),
            Row("acre", 43560 * Foot * Foot, "43 560 ft2"),
        ],
    };

    /// <summary>Volumes, m³.</summary>
    public static Quantity Volume { get; } = new()
    {
        Name = "volume",
        SiUnit = "m3",
        Examples = "11.5 m3, 800 L or 250 gal",
        Units =
        [
            Row("m3", 1, "1 m · 1 m · 1 m", "m³", "m^3"),
            Row("L", 1e-3, "1 dm · 1 dm · 1 dm", "l", "dm3", "dm³"),
            Row("hL", 0.1, "100 L", "hl"),
            Row("mL", 1e-6, "0.001 L", "ml", "cm3", "cm³", "cm^3"),
            Row("in3", Inch * Inch * Inch, "1 in · 1 in · 1 in", "in³", "in^3"),
            Row("ft3", CubicFoot, "1 ft · 1 ft · 1 ft", "ft³", "ft^3"),
            Row("yd3", 27 * CubicFoot, "27 ft3", "yd³", "yd^3"),
            Row("gal", Gallon, "US gallon, 231 in3", "US gal", "gal (US)"),
            Row("imp gal", ImperialGallon, "imperial gallon, 4.54609 L", "gal (imp)"),
            Row("bbl", Barrel, "42 US gal"),
            Row("acre ft", 43560 * CubicFoot, "1 acre · 1 ft", "acre-ft"),
        ],
    };

    /// <summary>Volume flows, m³/s.</summary>
    public static Quantity Flow { get; } = new()
    {
        Name = "flow",
        SiUnit = "m3/s",
        Examples = "40 L/min, 2.4 m3/h or 10 gpm",
        Units =
        [
            Row("m3/s", 1, "1 m3 in 1 s", "m³/s", "m^3/s"),
            Row("m3/min", 1 / Minute, "1 m3 in 60 s", "m³/min", "m^3/min"),
            Row("m3/h", 1 / Hour, "1 m3 in 3600 s", "m³/h", "m^3/h", "m3/hr"),
            Row("m3/d", 1 / Day, "1 m3 in 86 400 s", "m³/d", "m^3/d", "m3/day"),
            Row("L/s", 1e-3, "1 L in 1 s", "l/s"),
            Row("L/min", 1e-3 / Minute, "1 L in 60 s", "l/min", "lpm"),
            Row("L/h", 1e-3 / Hour, "1 L in 3600 s", "l/h", "L/hr"),
            Row("mL/s", 1e-6, "1 mL in 1 s", "ml/s"),
            Row("mL/min", 1e-6 / Minute, "1 mL in 60 s", "ml/min"),
            Row("hL/h", 0.1 / Hour, "1 hL in 3600 s", "hl/h"),
            Row("gpm", Gallon / Minute, "1 US gal in 60 s", "gal/min", "US gpm"),
            Row("gal/h", Gallon / Hour, "1 US gal in 3600 s", "gph", "gal/hr"),
            Row("cfs", CubicFoot, "1 ft3 in 1 s", "ft3/s", "ft³/s", "ft^3/s"),
            Row("cfm", CubicFoot / Minute, "1 ft3 in 60 s", "ft3/min", "ft³/min"),
            Row("bbl/h", Barrel / Hour, "1 bbl in 3600 s", "bbl/hr"),
            Row("bbl/d", Barrel / Day, "1 bbl in 86 400 s", "bbl/day"),
        ],
    };

    /// <summary>Durations, s.</summary>
    public static Quantity Time { get; } = new()
    {
        Name = "time",
        SiUnit = "s",
        Examples = "90 s, 12 h or 1 h 30 min",
        Units =
        [
            Row("s", 1, "SI base unit", "sec"),
            Row("min", Minute, "60 s", "mins"),
            Row("h", Hour, "60 min", "hr", "hrs", "hour", "hours"),
            Row("d", Day, "24 h", "day", "days"),
            Row("week", 7 * Day, "7 d", "weeks"),
        ],
    };

    /// <summary>Pressures, Pa.</summary>
    public static Quantity Pressure { get; } = new()
    {
        Name = "pressure",
        SiUnit = "Pa",
        Examples = "101.3 kPa, 1013 mbar or 14.7 psi",
        Units =
        [
            Row("Pa", 1, "1 N/m2"),
            Row("hPa", 1e2, "100 Pa"),
            Row("kPa", 1e3, "1000 Pa"),
            Row("MPa", 1e6, "1e6 Pa"),
            Row("bar", 1e5, "100 000 Pa", "bara"),
            Row("mbar", 1e2, "100 Pa", "mbara"),
            Row("atm", 101325, "101 325 Pa exactly"),
            Row("torr", 101325.0 / 760, "1/760 atm", "Torr"),
            Row("mmHg", Mercury * StandardGravity * 1e-3, "1 mm of mercury of 13 595.1 kg/m3 at 9.80665 m/s2"),
            Row("inHg", Mercury * StandardGravity * Inch, "1 in of mercury of 13 595.1 kg/m3 at 9.80665 m/s2"),
            Row("mmH2O", 1e3 * StandardGravity * 1e-3, "1 mm of water of 1000 kg/m3 at 9.80665 m/s2"),
            Row("mH2O", 1e3 * StandardGravity, "1 m of water of 1000 kg/m3 at 9.80665 m/s2"),
            Row("inH2O", 1e3 * StandardGravity * Inch, "1 in of water of 1000 kg/m3 at 9.80665 m/s2"),
            Row("ftH2O", 1e3 * StandardGravity * Foot, "1 ft of water of 1000 kg/m3 at 9.80665 m/s2"),
            Row("psi", Pound * StandardGravity / (Inch * Inch), "1 lb under 9.80665 m/s2 on 1 in2", "psia"),
            Row("kgf/cm2", StandardGravity * 1e4, "1 kg under 9.80665 m/s2 on 1 cm2", "kgf/cm²"),
        ],
    };

    /// <summary>Densities, kg/m³.</summary>
    public static Quantity Density { get; } = new()
    {
        Name = "density",
        SiUnit = "kg/m3",
        Examples = "998 kg/m3, 0.998 g/cm3 or 62.3 lb/ft3",
        Units =
        [
            Row("kg/m3", 1, "1 kg in 1 m3", "kg/m³", "kg/m^3", "g/L", "g/l"),
            Row("g/cm3", 1e3, "1 g in 1 cm3", "g/cm³", "g/cm^3", "g/mL", "g/ml", "g/cc", "kg/L", "kg/l", "t/m3", "t/m³"),
            Row("lb/ft3", Pound / CubicFoot, "1 lb in 1 ft3", "lb/ft³", "lb/ft^3", "pcf"),
            Row("lb/gal", Pound / Gallon, "1 lb in 1 US gal", "ppg"),
        ],
    };

    /// <summary>Dynamic viscosities, Pa·s.</summary>
    public static Quantity Viscosity { get; } = new()
    {
        Name = "viscosity",
        SiUnit = "Pa.s",
        Examples = "35 mPa.s, 35 cP or 0.035 Pa.s",
        Units =
        [
            Row("Pa.s", 1, "1 N·s/m2", "Pa·s", "Pa*s", "Pa s"),
            Row("mPa.s", 1e-3, "0.001 Pa.s", "mPa·s", "mPa*s", "mPa s"),
            Row("P", 0.1, "0.1 Pa.s"),
            Row("cP", 1e-3, "0.01 P"),
        ],
    };

    /// <summary>Consistencies of liquids whose stress follows a power n of the shear rate, Pa·s^n.</summary>
    public static Quantity Consistency { get; } = new()
    {
        Name = "consistency",
        SiUnit = "Pa.s^n",
        Examples = "2.5 Pa.s^n or 400 mPa.s^n",
        Units =
        [
            Row("Pa.s^n", 1, "1 Pa at 1/s, n the flow index", "Pa·s^n", "Pa*s^n", "Pa s^n"),
            Row("mPa.s^n", 1e-3, "0.001 Pa.s^n", "mPa·s^n", "mPa*s^n", "mPa s^n"),
        ],
    };

    /// <summary>Yield stresses, Pa.</summary>
    public static Quantity Stress { get; } = new()
    {
        Name = "stress",
        SiUnit = "Pa",
        Examples = "12 Pa, 500 mPa or 120 dyn/cm2",
        Units =
        [
            Row("Pa", 1, "1 N/m2"),
            Row("mPa", 1e-3, "0.001 Pa"),
            Row("kPa", 1e3, "1000 Pa"),
            Row("dyn/cm2", 0.1, "1e-5 N on 1 cm2", "dyn/cm²"),
            Row("lbf/100ft2", Pound * StandardGravity / (100 * Foot * Foot), "1 lb under 9.80665 m/s2 on 100 ft2", "lb/100ft2"),
        ],
    };

    /// <summary>Kinematic viscosities, m²/s.</summary>
    public static Quantity KinematicViscosity { get; } = new()
    {
        Name = "kinematic viscosity",
        SiUnit = "m2/s",
        Examples = "46 mm2/s, 46 cSt or 4.6e-5 m2/s",
        Units =
        [
            Row("m2/s", 1, "1 m2 in 1 s", "m²/s", "m^2/s"),
            Row("mm2/s", 1e-6, "1 mm2 in 1 s", "mm²/s", "mm^2/s"),
            Row("St", 1e-4, "1 cm2 in 1 s"),
            Row("cSt", 1e-6, "0.01 St"),
            Row("ft2/s", Foot * Foot, "1 ft2 in 1 s", "ft²/s", "ft^2/s"),
        ],
    };

    /// <summary>Temperatures, K.</summary>
    public static Quantity Temperature { get; } = new()
    {
        Name = "temperature",
        SiUnit = "K",
        Examples = "18 degC, 64 degF or 291.15 K",
        Units =
        [
            Row("K", 1, "SI base unit"),
            Row("degC", 1, "number of kelvins above 273.15 K", "°C", "C") with { Offset = 273.15 },
            Row("degF", 5.0 / 9, "9/5 of the degree Celsius, 32 at 0 degC", "°F", "F") with { Offset = 459.67 },
        ],
    };

    /// <summary>Angles, rad.</summary>
    public static Quantity Angle { get; } = new()
    {
        Name = "angle",
        SiUnit = "rad",
        Examples = "30 deg or 0.52 rad",
        Units =
        [
            Row("rad", 1, "arc of one radius"),
            Row("deg", Math.PI / 180, "π/180 rad", "°"),
        ],
    };

    /// <summary>Velocities, m/s.</summary>
    public static Quantity Velocity { get; } = new()
    {
        Name = "velocity",
        SiUnit = "m/s",
        Examples = "1.5 m/s or 5 ft/s",
        Units =
        [
            Row("m/s", 1, "1 m in 1 s"),
            Row("mm/s", 1e-3, "1 mm in 1 s"),
            Row("m/h", 1 / Hour, "1 m in 3600 s"),
            Row("mm/h", 1e-3 / Hour, "1 mm in 3600 s"),
            Row("m/d", 1 / Day, "1 m in 86 400 s", "m/day"),
            Row("ft/s", Foot, "1 ft in 1 s"),
            Row("ft/d", Foot / Day, "1 ft in 86 400 s", "ft/day"),
            Row("in/h", Inch / Hour, "1 in in 3600 s", "in/hr"),
        ],
    };

    /// <summary>Accelerations, m/s².</summary>
    public static Quantity Acceleration { get; } = new()
    {
        Name = "acceleration",
        SiUnit = "m/s2",
        Examples = "9.81 m/s2 or 32.2 ft/s2",
        Units =
        [
            Row("m/s2", 1, "1 m/s in 1 s", "m/s²", "m/s^2"),
            Row("ft/s2", Foot, "1 ft/s in 1 s", "ft/s²", "ft/s^2"),
        ],
    };

    /// <summary>Ratios, shares and loss coefficients, 1.</summary>
    public static Quantity Ratio { get; } = new()
    {
        Name = "ratio",
        SiUnit = "1",
        Examples = "0.8 or 80 %",
        IsBareNumberRead = true,
        Units = [Row("1", 1, "the number itself"), Row("%", 1e-2, "1/100")],
    };

    /// <summary>Flow coefficients of valves: bare numbers, the units being those of Kv or Cv.</summary>
    public static Quantity FlowCoefficient { get; } = new()
    {
        Name = "flow coefficient",
        SiUnit = "1",
        Examples = "12 or 3.5",
        IsBareNumberRead = true,
        Units = [Row("1", 1, "the number itself: Kv in m3/h at 1 bar, Cv in US gal/min at 1 psi")],
    };

    /// <summary>All quantities with units, in the order of the table.</summary>
    public static IReadOnlyList<Quantity> All { get; } =
    [
        Length, Area, Volume, Flow, Time, Pressure, Density, Viscosity, Consistency,
        KinematicViscosity, Temperature, Angle, Velocity, Acceleration, Ratio,
    ];

    private static Unit Row(string spelling, double factor, string definition, params string[] others) =>
        new() { Spelling = spelling, Factor = factor, Definition = definition, OtherSpellings = others };
}
