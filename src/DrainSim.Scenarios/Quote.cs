using System.Text;

namespace DrainSim.Scenarios;

/// <summary>Shows text from a file within a message: short, and without signs that move a terminal's cursor.</summary>
internal static class Quote
{
    /// <summary>Longest text shown whole, characters.</summary>
    private const int Longest = 48;

    /// <summary>The text in quotation marks.</summary>
    public static string Of(string text) => $"'{Plain(text)}'";

    /// <summary>The text, cut and with control characters as question marks.</summary>
    public static string Plain(string text)
    {
        StringBuilder shown = new();
        foreach (Rune rune in text.EnumerateRunes())
        {
            if (shown.Length >= Longest)
                return shown.Append('…').ToString();
            shown.Append(IsShown(rune) ? rune.ToString() : "?");
        }
        return shown.ToString();
    }

    /// <summary>Whether a character is safe to print: no control, format or line separator.</summary>
    public static bool IsShown(Rune rune) => Rune.GetUnicodeCategory(rune) is not (
        System.Globalization.UnicodeCategory.Control
        or System.Globalization.UnicodeCategory.Format
        or System.Globalization.UnicodeCategory.LineSeparator
        or System.Globalization.UnicodeCategory.ParagraphSeparator
        or System.Globalization.UnicodeCategory.Surrogate
        or System.Globalization.UnicodeCategory.PrivateUse
        or System.Globalization.UnicodeCategory.OtherNotAssigned);
}
