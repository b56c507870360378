namespace DrainSim.Scenarios.Units;

/// <summary>Walks through a text of numbers and units.</summary>
internal ref struct QuantityScanner(string text)
{
    private readonly string text = text.Trim();
    private int at;

    /// <summary>Whether the whole text is read.</summary>
    public readonly bool IsAtEnd => at >= text.Length;

    /// <summary>Whether the last number had a sign.</summary>
    public bool HasSign { get; private set; }

    /// <summary>Reads the number that stands here, with its sign and its fraction.</summary>
    public bool TryNumber(out double number)
    {
        int start = at;
        HasSign = at < text.Length && text[at] is '+' or '-';
        if (HasSign)
            at++;
        int digits = at;
        SkipDecimal();
        bool isWhole = at > digits && !text.AsSpan(digits, at - digits).ContainsAnyExceptInRange('0', '9');
        if (!NumberText.TryRead(text.AsSpan(start, at - start), out number))
            return false;
        return !isWhole || TryFraction(digits, ref number);
    }

    /// <summary>Reads the unit that stands here: up to the next number or the end.</summary>
    public string Unit()
    {
        SkipBlanks();
        int start = at;
        while (at < text.Length && !IsNextNumber(start))
            at++;
        string unit = text[start..at].TrimEnd();
        SkipBlanks();
        return unit;
    }

    private readonly bool IsNextNumber(int start) =>
        at > start && char.IsWhiteSpace(text[at - 1])
        && (char.IsAsciiDigit(text[at]) || text[at] is '.' or '+' or '-');

    private void SkipDecimal()
    {
        SkipDigits();
        if (at < text.Length && text[at] == '.')
        {
            at++;
            SkipDigits();
        }
        int exponent = at;
        if (at < text.Length && text[at] is 'e' or 'E')
        {
            at++;
            if (at < text.Length && text[at] is '+' or '-')
                at++;
            int digits = at;
            SkipDigits();
            if (at == digits)
                at = exponent;
        }
    }

    /// <summary>Reads <c>/2</c> behind a whole number, or <c> 1/2</c> behind it; leaves anything else alone.</summary>
    private bool TryFraction(int digits, ref double number)
    {
        int back = at;
        bool isMixed = at + 1 < text.Length && text[at] is ' ' or '-' && char.IsAsciiDigit(text[at + 1]);
        double whole = isMixed ? Math.Abs(number) : 0;
        int numerator = isMixed ? at + 1 : digits;
        at = numerator;
        SkipDigits();
        int slash = at;
        if (slash + 1 >= text.Length || text[slash] != '/' || !char.IsAsciiDigit(text[slash + 1]))
        {
            at = back;
            return true;
        }
        at++;
        SkipDigits();
        number = NumberText.TryRead(text.AsSpan(numerator, slash - numerator), out double above)
            && NumberText.TryRead(text.AsSpan(slash + 1, at - slash - 1), out double below)
                ? double.CopySign(whole + above / below, number)
                : double.NaN;
        return double.IsFinite(number);
    }

    private void SkipDigits()
    {
        while (at < text.Length && char.IsAsciiDigit(text[at]))
            at++;
    }

    private void SkipBlanks()
    {
        while (at < text.Length && char.IsWhiteSpace(text[at]))
            at++;
    }
}
