using CsCheck;
using DrainSim.Integration;

namespace DrainSim.Tests.Integration;

/// <summary>The root search alone, on functions that defeat plain interpolation.</summary>
public sealed class CrossingBracketTests
{
    public static TheoryData<string, Func<double, double>, double, double> Functions() => new()
    {
        { "straight", x => x - 1.0 / 3, 0, 1 },
        { "exponential", x => Math.Exp(20 * x) - 2, 0, 1 },
        { "flat root", x => Math.Pow(x - 0.7, 9), 0, 1 },
        { "step", x => x < 0.123 ? -1 : 1, 0, 1 },
        { "square root end", x => Math.Sqrt(x) - 1e-8, 0, 1 },
        { "far from zero", x => x - 86_400.000_1, 86_000, 87_000 },
        { "tiny values", x => 1e-300 * (x * x - 0.5), 0, 1 },
        { "huge values", x => 1e300 * (x * x * x - 0.5), 0, 1 },
        { "infinite at an end", x => x == 0 ? double.NegativeInfinity : x - 0.3, 0, 1 },
        { "unknown at an end", x => x == 0 ? double.NaN : x - 0.3, 0, 1 },
    };

    [Theory, MemberData(nameof(Functions))]
    public void The_search_ends_on_two_neighbours_with_no_more_turns_than_bisection_and_one(
        string name, Func<double, double> function, double low, double high)
    {
        (double near, double far, int turns) = Search(function, low, high);
        Assert.True(function(far) >= 0, name);
        Assert.False(function(near) >= 0, name);
        Assert.InRange(far - near, 0, Resolution(far, high - low));
        Assert.InRange(turns, 1, Math.Ceiling(Math.Log2((high - low) / Resolution(far, high - low))) + 1);
    }

    [Fact]
    public void A_smooth_function_takes_about_a_dozen_turns() =>
        Assert.InRange(Search(x => Math.Exp(3 * x) - 2, 0, 1).Turns, 1, 14);

    [Fact]
    public void Every_cubic_with_a_change_of_sign_is_solved_to_neighbouring_doubles() =>
        Gen.Select(Gen.Double[-10, 10], Gen.Double[-10, 10], Gen.Double[-10, 10], Gen.Double[-50, 50])
            .Sample((a, b, c, shift) =>
            {
                double Value(double x) => ((a * (x - shift) + b) * (x - shift) + c) * (x - shift) - 0.3;
                double end = Value(shift + 2);
                if (end == 0 || double.Sign(end) == double.Sign(Value(shift)))
                    return true;
                (double near, double far, int turns) = Search(x => double.Sign(end) * Value(x), shift, shift + 2);
                return double.Sign(end) * Value(far) >= 0 && double.Sign(end) * Value(near) < 0
                    && far - near <= Resolution(Math.Max(Math.Abs(far), Math.Abs(near)), 2) && turns <= 66;
            }, iter: 20_000);

    [Fact]
    public void A_root_at_time_zero_within_a_bracket_around_it_ends_by_its_width() =>
        Assert.InRange(Search(x => x > 0 ? 1 : -1, -1, 1).Turns, 60, 66);

    /// <summary>Spacing of doubles at x, or 2^−64 of the first width where that is larger.</summary>
    private static double Resolution(double x, double width) => Math.Max(x - Math.BitDecrement(x), Math.ScaleB(width, -64));

    private static (double Near, double Far, int Turns) Search(Func<double, double> function, double low, double high)
    {
        CrossingBracket bracket = new(low, function(low), high, function(high), isRising: true);
        (double near, int turns) = (low, 0);
        while (bracket.TryNext(out double x))
        {
            turns++;
            double value = function(x);
            bracket.Narrow(x, value);
            near = value >= 0 ? near : x;
        }
        return (near, bracket.Far, turns);
    }
}
