using System.Diagnostics.CodeAnalysis;

namespace DrainSim.Scenarios.Units;

/// <summary>What a text gives as a quantity: a value in SI, or what is wrong with it.</summary>
public readonly record struct QuantityReading
{
    /// <summary>Value in the quantity's SI unit; 0 when the text is refused.</summary>
    public double Value { get; private init; }

    /// <summary>What is wrong, for people; null when the text is read.</summary>
    public string? Fault { get; private init; }

    /// <summary>What would be read instead; null when the text is read.</summary>
    public string? Accepted { get; private init; }

    /// <summary>Whether there is no value.</summary>
    [MemberNotNullWhen(true, nameof(Fault), nameof(Accepted))]
    public bool IsRefused => Fault is not null;

    internal static QuantityReading Of(double value) => new() { Value = value };

    internal static QuantityReading Refused(string fault, string accepted) => new() { Fault = fault, Accepted = accepted };
}
