namespace DrainSim.Liquids;

/// <summary>How much of the dissolved substance a solution holds.</summary>
/// <param name="Fraction">share of the whole, 1: 0.20 for 20 %</param>
/// <param name="Basis">what the share is counted by, for people: <c>by mass</c>, <c>by volume of ethanol</c></param>
public sealed record Strength(double Fraction, string Basis);
