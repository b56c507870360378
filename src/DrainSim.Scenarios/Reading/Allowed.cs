namespace DrainSim.Scenarios.Reading;

/// <summary>The range that a value must keep.</summary>
/// <param name="Least">least value in SI</param>
/// <param name="IsLeastIn">whether the least value itself is allowed</param>
/// <param name="Most">largest value in SI, itself allowed</param>
/// <param name="Rule">the range in words, behind "a length"</param>
internal readonly record struct Allowed(double Least, bool IsLeastIn, double Most, string Rule)
{
    /// <summary>Any finite value.</summary>
    public static Allowed Any { get; } = new(double.NegativeInfinity, true, double.PositiveInfinity, "");

    /// <summary>More than 0.</summary>
    public static Allowed Positive { get; } = new(0, false, double.PositiveInfinity, "greater than 0");

    /// <summary>0 or more.</summary>
    public static Allowed NotNegative { get; } = new(0, true, double.PositiveInfinity, "of at least 0");

    /// <summary>From nothing to all.</summary>
    public static Allowed Share { get; } = new(0, true, 1, "from 0 to 1, or 0 % to 100 %");

    /// <summary>A closed range.</summary>
    /// <param name="least">least value in SI</param>
    /// <param name="most">largest value in SI</param>
    /// <param name="rule">the range in words, behind "a length"</param>
    public static Allowed Within(double least, double most, string rule) => new(least, true, most, rule);

    /// <summary>Whether a value keeps the range.</summary>
    public bool Holds(double value) => (IsLeastIn ? value >= Least : value > Least) && value <= Most;
}
