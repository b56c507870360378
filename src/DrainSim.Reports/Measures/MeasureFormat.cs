using System.Globalization;

namespace DrainSim.Reports.Measures;

/// <summary>Writes quantities for people: a number of three figures or so, a space, a unit.</summary>
/// <remarks>
/// Culture-invariant; the minus is the sign U+2212. Lengths below 0.1 m are told in mm, volumes below
/// 1 m³ in L, flows below 1 L/s in L/min and from 100 L/s on in m³/h; in US units lengths below 1 ft in in.
/// </remarks>
/// <param name="system">the family of units</param>
public sealed class MeasureFormat(UnitSystem system)
{
    /// <summary>The family of units.</summary>
    public UnitSystem System { get; } = system;

    private bool IsUs => System == UnitSystem.Us;

    /// <summary>A length, a level or an elevation.</summary>
    /// <param name="metres">m</param>
    public string Length(double metres) => Text(metres, LengthUnit(metres));

    /// <summary>A volume of liquid.</summary>
    /// <param name="cubicMetres">m³</param>
    public string Volume(double cubicMetres) => Text(cubicMetres, VolumeUnit(cubicMetres));

    /// <summary>A volume flow.</summary>
    /// <param name="cubicMetresPerSecond">m³/s</param>
    public string Flow(double cubicMetresPerSecond) => Text(cubicMetresPerSecond, FlowUnit(cubicMetresPerSecond));

    /// <summary>A pressure or a difference of pressures.</summary>
    /// <param name="pascals">Pa</param>
    public string Pressure(double pascals)
    {
        Unit unit = PressureUnit(pascals);
        double value = unit.From(pascals);
        return Signed(Math.Abs(value) >= 100 ? Trimmed(value, 1) : Figures(value)) + " " + unit.Sign;
    }

    /// <summary>A velocity.</summary>
    /// <param name="metresPerSecond">m/s</param>
    public string Velocity(double metresPerSecond) =>
        Text(metresPerSecond, IsUs ? Unit.FootPerSecond : Unit.MetrePerSecond);

    /// <summary>A temperature, to a tenth of a degree.</summary>
    /// <param name="kelvin">K</param>
    public string Temperature(double kelvin) => IsUs
        ? Signed(Trimmed(kelvin * 1.8 - 459.67, 1)) + " °F"
        : Signed(Trimmed(kelvin - 273.15, 1)) + " °C";

    /// <summary>The unit in which a length of this size reads well.</summary>
    /// <param name="metres">m; the largest of them for an axis</param>
    public Unit LengthUnit(double metres) => IsUs
        ? metres != 0 && Math.Abs(metres) < 0.9995 * 0.3048 ? Unit.Inch : Unit.Foot
        : metres != 0 && Math.Abs(metres) < 0.09995 ? Unit.Millimetre : Unit.Metre;

    /// <summary>The unit in which a volume of this size reads well.</summary>
    /// <param name="cubicMetres">m³</param>
    public Unit VolumeUnit(double cubicMetres) =>
        IsUs ? Unit.Gallon : Math.Abs(cubicMetres) < 0.9995 ? Unit.Litre : Unit.CubicMetre;

    /// <summary>The unit in which a flow of this size reads well.</summary>
    /// <param name="cubicMetresPerSecond">m³/s; the largest of them for an axis</param>
    public Unit FlowUnit(double cubicMetresPerSecond) => IsUs
        ? Unit.GallonPerMinute
        : Math.Abs(cubicMetresPerSecond) switch
        {
            < 0.9995e-3 => Unit.LitrePerMinute,
            < 0.09995 => Unit.LitrePerSecond,
            _ => Unit.CubicMetrePerHour,
        };

    /// <summary>The unit in which a pressure of this size reads well.</summary>
    /// <param name="pascals">Pa; the largest of them for an axis</param>
    public Unit PressureUnit(double pascals) => IsUs
        ? Unit.PoundPerSquareInch
        : Math.Abs(pascals) < 99.95 ? Unit.Pascal : Unit.Kilopascal;

    /// <summary>A pure number to three figures.</summary>
    /// <param name="value">the number, 1</param>
    public static string Number(double value) => Signed(Figures(value));

    /// <summary>A ratio in percent to three figures.</summary>
    /// <param name="ratio">the ratio, 1</param>
    public static string Percent(double ratio) => Signed(Figures(100 * ratio)) + " %";

    /// <summary>A duration in people's words: '12.3 s', '47 min 5 s', '3 h 12 min', '2 d 4 h'.</summary>
    /// <param name="seconds">s; at least 0</param>
    public static string Duration(double seconds)
    {
        if (Math.Round(seconds, 1) < 60)
        {
            return seconds < 10 ? Figures(seconds) + " s" : Trimmed(seconds, 1) + " s";
        }
        return Math.Round(seconds) < 3600 ? Pair(seconds, Unit.Minute, Unit.Second)
            : Math.Round(seconds / 60) < 24 * 60 ? Pair(seconds, Unit.Hour, Unit.Minute)
            : Pair(seconds, Unit.Day, Unit.Hour);
    }

    /// <summary>The unit of a time axis of this length.</summary>
    /// <param name="seconds">the longest time on the axis, s</param>
    public static Unit TimeUnit(double seconds) => seconds switch
    {
        <= 180 => Unit.Second,
        <= 3 * 3600 => Unit.Minute,
        <= 4 * 86400 => Unit.Hour,
        _ => Unit.Day,
    };

    private static string Text(double value, Unit unit) => Signed(Figures(unit.From(value))) + " " + unit.Sign;

    private static string Pair(double seconds, Unit large, Unit small)
    {
        long whole = (long)Math.Round(seconds / small.Size);
        long perLarge = (long)(large.Size / small.Size);
        (long count, long rest) = Math.DivRem(whole, perLarge);
        return rest == 0
            ? string.Create(CultureInfo.InvariantCulture, $"{count} {large.Sign}")
            : string.Create(CultureInfo.InvariantCulture, $"{count} {large.Sign} {rest} {small.Sign}");
    }

    private static string Figures(double value)
    {
        if (value == 0 || !double.IsFinite(value))
        {
            return Trimmed(value, 0);
        }
        int magnitude = (int)Math.Floor(Math.Log10(Math.Abs(value)));
        return Trimmed(value, Math.Clamp(2 - magnitude, 0, 4));
    }

    private static string Trimmed(double value, int decimals)
    {
        double rounded = Math.Round(value, decimals, MidpointRounding.AwayFromZero);
        return (rounded == 0 ? 0 : rounded).ToString("0.####", CultureInfo.InvariantCulture);
    }

    private static string Signed(string number) => number.Replace('-', '−');
}
