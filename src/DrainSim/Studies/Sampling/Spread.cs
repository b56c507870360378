using System.Globalization;

namespace DrainSim.Studies.Sampling;

/// <summary>How a quantity that is not known to the last digit may lie.</summary>
/// <remarks>A closed set: the cases live beside this file. Values are in the SI unit of the quantity.</remarks>
public abstract record Spread
{
    private protected Spread()
    {
    }

    /// <summary>The value that a share of all possible values does not pass: the inverse of the distribution function.</summary>
    /// <param name="share">the share, strictly between 0 and 1</param>
    public abstract double At(double share);

    /// <summary>The distribution and its numbers, as a scenario would write them, in SI.</summary>
    /// <param name="unit">SI unit of the quantity; empty for a pure number</param>
    public abstract string Text(string unit);

    /// <summary>A value with its unit, as a scenario would write it.</summary>
    private protected static string Measure(double value, string unit) =>
        (value.ToString("G6", CultureInfo.InvariantCulture) + " " + unit).TrimEnd();
}
