using System.Diagnostics.CodeAnalysis;
using System.Globalization;
using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Studies;

/// <summary>The values that a parameter takes, as they are written: a list, or a range by its ends and its count.</summary>
/// <remarks>
/// <c>25 mm, 32 mm, 38 mm</c> is a list; <c>5 m..50 m in 10</c> ten values at even steps, the ends among them;
/// <c>1 mm..1 m in 4 log</c> four values at even ratios.
/// </remarks>
public sealed record ValueList
{
    /// <summary>Most values of one range.</summary>
    public const int MostValues = 100_000_000;

    /// <summary>How values are written, for messages.</summary>
    internal const string Help = "Values read '25 mm, 32 mm', '5 m..50 m in 10' or '1 mm..1 m in 4 log'";

    private readonly Unit? unit;
    private readonly Quantity? quantity;
    private readonly double from, to;

    private ValueList(IReadOnlyList<string> texts, int count, bool isLogarithmic) =>
        (Texts, Count, IsLogarithmic) = (texts, count, isLogarithmic);

    private ValueList(ValueList written, Quantity? quantity, Unit? unit, double from, double to)
        : this(written.Texts, written.Count, written.IsLogarithmic) =>
        (IsRange, this.quantity, this.unit, this.from, this.to) = (written.IsRange, quantity, unit, from, to);

    /// <summary>The texts of the list, or the two ends of the range.</summary>
    public IReadOnlyList<string> Texts { get; }

    /// <summary>Number of values; at least 1.</summary>
    public int Count { get; }

    /// <summary>Whether it is a range.</summary>
    public bool IsRange { get; private init; }

    /// <summary>Whether the steps of the range are even ratios.</summary>
    public bool IsLogarithmic { get; }

    /// <summary>A list of texts.</summary>
    public static ValueList Of(IReadOnlyList<string> texts) => new(texts, texts.Count, false);

    /// <summary>Reads a list or a range; what the values are is not yet known.</summary>
    /// <param name="text">as written</param>
    /// <param name="list">the values; null when the text is refused</param>
    /// <param name="fault">why it is refused, with what would do; empty otherwise</param>
    public static bool TryRead(string text, [NotNullWhen(true)] out ValueList? list, out string fault)
    {
        ArgumentNullException.ThrowIfNull(text);
        list = null;
        fault = "";
        int dots = text.IndexOf("..", StringComparison.Ordinal);
        if (dots >= 0)
            return TryRange(text, dots, out list, out fault);
        string[] texts = text.Split(',', StringSplitOptions.TrimEntries);
        if (texts.Any(value => value.Length == 0))
            fault = $"{Quote.Of(text)} has an empty value. {Help}";
        else
            list = Of(texts);
        return list is not null;
    }

    /// <summary>The same values once it is known what they are.</summary>
    /// <param name="quantity">what the parameter is; null for words</param>
    /// <param name="list">the values; null when one of them is refused</param>
    /// <param name="fault">why it is refused, with what would do; empty otherwise</param>
    public bool TryResolve(Quantity? quantity, [NotNullWhen(true)] out ValueList? list, out string fault)
    {
        list = null;
        fault = "";
        if (!IsRange)
        {
            QuantityReading wrong = quantity is null ? default : Texts.Select(text => QuantityText.Read(text, quantity))
                .FirstOrDefault(reading => reading.IsRefused);
            fault = wrong.IsRefused ? $"{wrong.Fault}. {wrong.Accepted}" : "";
            list = wrong.IsRefused ? null : new ValueList(this, quantity, null, 0, 0);
            return list is not null;
        }

        if (quantity is null)
        {
            fault = "a range needs numbers; give the values one by one";
            return false;
        }

        QuantityReading first = QuantityText.Read(Texts[0], quantity), last = QuantityText.Read(Texts[1], quantity);
        if (first.IsRefused || last.IsRefused)
            fault = $"{(first.IsRefused ? first.Fault : last.Fault)}. {quantity.HowToWrite}";
        Unit shown = UnitOf(Texts[0], quantity);
        (double a, double b) = (shown.FromSi(first.Value), shown.FromSi(last.Value));
        if (fault.Length == 0 && IsLogarithmic && !(a > 0 && b > 0))
            fault = "a logarithmic range needs both ends above 0";
        if (fault.Length == 0)
            list = new ValueList(this, quantity, shown, a, b);
        return list is not null;
    }

    /// <summary>One of the values, once they are resolved.</summary>
    /// <param name="index">from 0</param>
    public ParameterValue At(int index)
    {
        if (!IsRange)
            return ParameterValue.Written(Texts[index], quantity);
        if (index == 0 || index == Count - 1)
            return ParameterValue.Written(Texts[index == 0 ? 0 : 1], quantity);
        double share = (double)index / (Count - 1);
        double number = IsLogarithmic ? from * Math.Pow(to / from, share) : from + (to - from) * share;
        return ParameterValue.Of(Rounded(number), unit!);
    }

    /// <summary>The unit in which a text is written: that of its first number.</summary>
    internal static Unit UnitOf(string text, Quantity quantity)
    {
        QuantityScanner scanner = new(text);
        return scanner.TryNumber(out _) && quantity.Find(scanner.Unit()) is { } found ? found : quantity.Units[0];
    }

    /// <summary>To twelve figures, so that 5 m..50 m holds 20 m and not 20.000000000000004 m.</summary>
    private static double Rounded(double number) =>
        double.Parse(number.ToString("G12", CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);

    private static bool TryRange(string text, int dots, [NotNullWhen(true)] out ValueList? list, out string fault)
    {
        list = null;
        string rest = text[(dots + 2)..];
        int behind = rest.LastIndexOf(" in ", StringComparison.Ordinal);
        string first = text[..dots].Trim();
        string[] words = behind < 0 ? [] : rest[(behind + 4)..].Split(' ', StringSplitOptions.RemoveEmptyEntries);
        string last = behind < 0 ? rest.Trim() : rest[..behind].Trim();
        bool isLogarithmic = words.Length == 2 && words[1] == "log";
        bool isWhole = words.Length == 1 || isLogarithmic;
        if (first.Length == 0 || last.Length == 0 || !isWhole)
            fault = $"{Quote.Of(text)} is no range. {Help}";
        else if (!int.TryParse(words[0], NumberStyles.None, CultureInfo.InvariantCulture, out int count) || count is < 2 or > MostValues)
            fault = $"{Quote.Of(words[0])} is no count of values. A range has from 2 to {MostValues} of them";
        else
        {
            list = new ValueList([first, last], count, isLogarithmic) { IsRange = true };
            fault = "";
        }

        return list is not null;
    }
}
