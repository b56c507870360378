namespace DrainSim.Scenarios.Units;

/// <summary>A kind of quantity that a scenario gives, with the units it may be given in.</summary>
public sealed record Quantity
{
    /// <summary>Name within a sentence, <c>length</c>.</summary>
    public required string Name { get; init; }

    /// <summary>The SI unit of a value once read.</summary>
    public required string SiUnit { get; init; }

    /// <summary>How values look, for messages: <c>38 mm, 1.5 in or 0.038 m</c>.</summary>
    public required string Examples { get; init; }

    /// <summary>All units, the SI unit first.</summary>
    public required IReadOnlyList<Unit> Units { get; init; }

    /// <summary>Whether a number without a unit is read; true for ratios alone.</summary>
    public bool IsBareNumberRead { get; init; }

    /// <summary>The name with its article, <c>a length</c>.</summary>
    public string WithArticle => ("aeiou".Contains(Name[0], StringComparison.Ordinal) ? "an " : "a ") + Name;

    /// <summary>One sentence telling how a value is written.</summary>
    public string HowToWrite => $"{char.ToUpperInvariant(WithArticle[0])}{WithArticle[1..]} reads {Examples}";

    /// <summary>The unit of a spelling in exact case; null when the quantity has none.</summary>
    /// <param name="spelling">the text behind the number</param>
    public Unit? Find(string spelling) => Units.FirstOrDefault(unit => unit.IsSpelled(spelling));

    /// <summary>The spelling that differs in case alone; null when there is none.</summary>
    /// <param name="spelling">the text behind the number</param>
    public string? FindIgnoringCase(string spelling) => Units
        .SelectMany(unit => unit.OtherSpellings.Prepend(unit.Spelling))
        .FirstOrDefault(known => known.Equals(spelling, StringComparison.OrdinalIgnoreCase));
}
