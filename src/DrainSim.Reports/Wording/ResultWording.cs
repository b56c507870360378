using System.Diagnostics;
using DrainSim.Reports.Measures;
using DrainSim.Studies;

namespace DrainSim.Reports.Wording;

/// <summary>The results that studies size for and spread, in words.</summary>
public static class ResultWording
{
    /// <summary>A value of a result for people.</summary>
    /// <param name="quantity">the result</param>
    /// <param name="value">the value, in its SI unit</param>
    /// <param name="format">writes the measures</param>
    public static string Text(ResultQuantity quantity, double value, MeasureFormat format)
    {
        ArgumentNullException.ThrowIfNull(quantity);
        ArgumentNullException.ThrowIfNull(format);
        return quantity.SiUnit switch
        {
            "s" => (value < 0 ? "−" : "") + MeasureFormat.Duration(Math.Abs(value)),
            "m" => format.Length(value),
            "m3" => format.Volume(value),
            "Pa" => format.Pressure(value),
            "m3/s" => format.Flow(value),
            "m/s" => format.Velocity(value),
            _ => throw new UnreachableException(quantity.SiUnit),
        };
    }
}
