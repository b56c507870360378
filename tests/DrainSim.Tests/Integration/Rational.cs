using System.Numerics;
using DrainSim.Integration;

namespace DrainSim.Tests.Integration;

/// <summary>An exact ratio, in lowest terms, so that tableau identities hold or do not.</summary>
internal readonly record struct Rational
{
    private readonly BigInteger numerator;
    private readonly BigInteger denominator;

    public Rational(BigInteger numerator, BigInteger denominator)
    {
        BigInteger divisor = BigInteger.GreatestCommonDivisor(numerator, denominator) * denominator.Sign;
        (this.numerator, this.denominator) = (numerator / divisor, denominator / divisor);
    }

    public static implicit operator Rational(int whole) => new(whole, 1);

    public static implicit operator Rational(Fraction fraction) => new(fraction.Numerator, fraction.Denominator);

    public static Rational operator +(Rational a, Rational b) =>
        new(a.numerator * b.denominator + b.numerator * a.denominator, a.denominator * b.denominator);

    public static Rational operator *(Rational a, Rational b) =>
        new(a.numerator * b.numerator, a.denominator * b.denominator);

    public static Rational operator -(Rational a, Rational b) => a + -1 * b;

    public override string ToString() => $"{numerator}/{denominator}";
}
