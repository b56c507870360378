using System.Globalization;

namespace DrainSim;

/// <summary>Checks on quantities that no caller may pass; each returns the value it was given.</summary>
public static class Require
{
    /// <summary>Refuses a value that is not finite and greater than 0.</summary>
    /// <exception cref="ArgumentOutOfRangeException">names the quantity and its unit</exception>
    public static double Positive(double value, string quantity, string unit) =>
        double.IsFinite(value) && value > 0 ? value : throw Refused(value, quantity, unit, "greater than 0");

    /// <summary>Refuses a value that is not finite and at least 0.</summary>
    /// <exception cref="ArgumentOutOfRangeException">names the quantity and its unit</exception>
    public static double NotNegative(double value, string quantity, string unit) =>
        double.IsFinite(value) && value >= 0 ? value : throw Refused(value, quantity, unit, "at least 0");

    /// <summary>Refuses NaN and the infinities.</summary>
    /// <exception cref="ArgumentOutOfRangeException">names the quantity and its unit</exception>
    public static double Finite(double value, string quantity, string unit) =>
        double.IsFinite(value) ? value : throw Refused(value, quantity, unit, "a finite number of");

    /// <summary>Refuses a value outside the closed range.</summary>
    /// <exception cref="ArgumentOutOfRangeException">names the quantity and its unit</exception>
    public static double Within(double value, double least, double most, string quantity, string unit) =>
        value >= least && value <= most
            ? value
            : throw Refused(value, quantity, unit,
                string.Create(CultureInfo.InvariantCulture, $"from {least} to {most}"));

    private static ArgumentOutOfRangeException Refused(double value, string quantity, string unit, string rule)
    {
        string behind = unit.Length > 0 ? " " + unit : "";
        return new(null, string.Create(CultureInfo.InvariantCulture, $"{quantity} must be {rule}{behind}, got {value}{behind}"));
    }
}
