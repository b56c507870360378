namespace DrainSim.Reports.Measures;

/// <summary>A unit for people: its sign and what one of it is in SI.</summary>
/// <param name="Sign">as it stands behind a number or on an axis</param>
/// <param name="Size">one of it in the SI unit of the quantity; greater than 0</param>
/// <remarks>
/// The US sizes are exact by definition: inch 25.4 mm, gallon 231 in³, pound-force 4.4482216152605 N
/// (NIST SP 811, appendix B.8).
/// </remarks>
public sealed record Unit(string Sign, double Size)
{
    internal static readonly Unit Millimetre = new("mm", 1e-3);
    internal static readonly Unit Metre = new("m", 1);
    internal static readonly Unit Inch = new("in", 0.0254);
    internal static readonly Unit Foot = new("ft", 0.3048);

    internal static readonly Unit Litre = new("L", 1e-3);
    internal static readonly Unit CubicMetre = new("m³", 1);
    internal static readonly Unit Gallon = new("gal", 231 * 0.0254 * 0.0254 * 0.0254);

    internal static readonly Unit LitrePerMinute = new("L/min", 1e-3 / 60);
    internal static readonly Unit LitrePerSecond = new("L/s", 1e-3);
    internal static readonly Unit CubicMetrePerHour = new("m³/h", 1.0 / 3600);
    internal static readonly Unit GallonPerMinute = new("gpm", 231 * 0.0254 * 0.0254 * 0.0254 / 60);

    internal static readonly Unit Pascal = new("Pa", 1);
    internal static readonly Unit Kilopascal = new("kPa", 1000);
    internal static readonly Unit PoundPerSquareInch = new("psi", 4.4482216152605 / (0.0254 * 0.0254));

    internal static readonly Unit MetrePerSecond = new("m/s", 1);
    internal static readonly Unit FootPerSecond = new("ft/s", 0.3048);

    internal static readonly Unit Second = new("s", 1);
    internal static readonly Unit Minute = new("min", 60);
    internal static readonly Unit Hour = new("h", 3600);
    internal static readonly Unit Day = new("d", 86400);

    /// <summary>An SI value in this unit.</summary>
    /// <param name="value">in the SI unit of the quantity</param>
    public double From(double value) => value / Size;
}
