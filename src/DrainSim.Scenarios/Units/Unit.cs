namespace DrainSim.Scenarios.Units;

/// <summary>One unit of a quantity: how it is spelled and what it is in SI.</summary>
public sealed record Unit
{
    /// <summary>The spelling that messages and tables show, in exact case.</summary>
    public required string Spelling { get; init; }

    /// <summary>Other spellings that are read, in exact case.</summary>
    public IReadOnlyList<string> OtherSpellings { get; init; } = [];

    /// <summary>SI units in one of this unit.</summary>
    public required double Factor { get; init; }

    /// <summary>What is added to the number before the factor, in this unit; 0 for all but temperatures.</summary>
    public double Offset { get; init; }

    /// <summary>The definition that the factor follows from.</summary>
    public required string Definition { get; init; }

    /// <summary>A number of this unit in SI.</summary>
    /// <param name="number">the number as written</param>
    public double ToSi(double number) => (number + Offset) * Factor;

    /// <summary>An SI value as a number of this unit.</summary>
    /// <param name="value">value in SI</param>
    public double FromSi(double value) => value / Factor - Offset;

    /// <summary>Whether the unit is spelled so, case and all.</summary>
    /// <param name="spelling">the text behind the number</param>
    public bool IsSpelled(string spelling) => Spelling == spelling || OtherSpellings.Contains(spelling);
}
