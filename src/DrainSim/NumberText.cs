using System.Globalization;

namespace DrainSim;

/// <summary>The one way in which text becomes a number.</summary>
public static class NumberText
{
    /// <summary>
    /// Reads a finite number: sign, digits, decimal point, exponent; no thousands sign, whatever the
    /// machine's language.
    /// </summary>
    /// <param name="text">the digits; blanks at either end are allowed</param>
    /// <param name="value">the number, or 0 when the text is refused</param>
    /// <returns>false for anything else, NaN, the infinities and an overflow among them</returns>
    public static bool TryRead(ReadOnlySpan<char> text, out double value)
    {
        if (double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out value) && double.IsFinite(value))
            return true;
        value = 0;
        return false;
    }
}
