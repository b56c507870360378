using System.Globalization;

namespace DrainSim.Scenarios.Units;

/// <summary>Reads a number with its unit: <c>2.4 m</c>, <c>5 ft 3 in</c>, <c>1 1/2 in</c>, <c>80 %</c>.</summary>
/// <remarks>
/// A text is one or more pairs of number and unit. Of several pairs the units must get smaller from
/// pair to pair, only the first may have a sign, and the sign is that of the whole. A number is
/// digits with a decimal point and an exponent, or a whole number, a fraction or both.
/// </remarks>
public static class QuantityText
{
    /// <summary>Spellings of pressures above the atmosphere, which a scenario does not read.</summary>
    private static readonly string[] GaugeSpellings = ["psig", "barg", "bar(g)", "mbarg", "kPag", "kPa(g)", "psi(g)"];

    /// <summary>The value of a text, or what is wrong with it.</summary>
    /// <param name="text">the text as written</param>
    /// <param name="quantity">what it has to be</param>
    public static QuantityReading Read(string text, Quantity quantity)
    {
        ArgumentNullException.ThrowIfNull(text);
        ArgumentNullException.ThrowIfNull(quantity);
        QuantityScanner scanner = new(text);
        double total = 0;
        bool isNegative = text.AsSpan().TrimStart().StartsWith('-');
        Unit? before = null;
        do
        {
            if (!scanner.TryNumber(out double number))
                return NotANumber(text, quantity);
            if (before is not null && scanner.HasSign)
                return Refused(text, "has a sign inside", quantity);
            string spelling = scanner.Unit();
            if (spelling.StartsWith(','))
                return QuantityReading.Refused($"{Quote.Of(text)} has a comma", "Write a decimal point and no thousands sign");
            if (spelling.Length == 0 && !(quantity.IsBareNumberRead && before is null))
                return Refused(text, "has no unit", quantity);
            Unit? unit = spelling.Length == 0 ? quantity.Units[0] : quantity.Find(spelling);
            if (unit is null)
                return UnknownUnit(text, spelling, quantity);
            if (before is not null && (before.Offset != 0 || unit.Factor >= before.Factor))
                return Refused(text, "has units that do not get smaller", quantity);
            double part = before is not null && isNegative ? -number : number;
            total += unit.ToSi(part);
            before = unit;
        }
        while (!scanner.IsAtEnd);
        return double.IsFinite(total) ? QuantityReading.Of(total) : NotANumber(text, quantity);
    }

    private static QuantityReading NotANumber(string text, Quantity quantity) =>
        Refused(text, quantity.IsBareNumberRead ? "is not a finite number" : "is not a finite number with a unit", quantity);

    private static QuantityReading UnknownUnit(string text, string spelling, Quantity quantity)
    {
        if (quantity.FindIgnoringCase(spelling) is { } other)
            return QuantityReading.Refused(
                $"{Quote.Of(text)} has a unit {Quote.Of(spelling)} that is not known", $"did you mean {Quote.Of(other)}?");
        if (ReferenceEquals(quantity, Quantities.Pressure) && GaugeSpellings.Contains(spelling))
            return QuantityReading.Refused($"{Quote.Of(text)} is a gauge pressure",
                $"Pressures are absolute here: add the atmosphere's. {quantity.HowToWrite}");
        if (Quantities.All.FirstOrDefault(q => q.Find(spelling) is not null) is { } found)
            return Refused(text, $"is {found.WithArticle}", quantity);
        return Refused(text, $"has a unit {Quote.Of(spelling)} that is not known", quantity);
    }

    private static QuantityReading Refused(string text, string fault, Quantity quantity) =>
        QuantityReading.Refused(string.Create(CultureInfo.InvariantCulture, $"{Quote.Of(text)} {fault}"), quantity.HowToWrite);
}
