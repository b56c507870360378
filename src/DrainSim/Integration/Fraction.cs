namespace DrainSim.Integration;

/// <summary>A ratio of two whole numbers, so that a tableau can be written and checked exactly.</summary>
/// <param name="Numerator">number above the line; below 2^53 in size, so that <see cref="Value"/> rounds once</param>
/// <param name="Denominator">number below the line; greater than 0 and below 2^53</param>
internal readonly record struct Fraction(long Numerator, long Denominator)
{
    /// <summary>The nearest double.</summary>
    public double Value => (double)Numerator / Denominator;

    public static implicit operator Fraction(int whole) => new(whole, 1);

    public static Fraction operator -(Fraction a, Fraction b) => checked(new(
        a.Numerator * b.Denominator - b.Numerator * a.Denominator,
        a.Denominator * b.Denominator));
}
