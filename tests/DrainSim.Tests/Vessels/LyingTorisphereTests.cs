using DrainSim.Vessels;
using MathNet.Numerics.Integration;

namespace DrainSim.Tests.Vessels;

/// <summary>The fitted torispherical head of a lying tank against slices made the other way, across the axis.</summary>
public sealed class LyingTorisphereTests
{
    /// <summary>Crown and knuckle radius over the shell radius: the three standards, plain caps, and extremes.</summary>
    public static TheoryData<double, double> Proportions => new()
    {
        { 2, 0.2 }, { 1.6, 0.308 }, { 2, 0.12 }, { 1.6, 0.2 }, { 2, 0 }, { 1.2, 0 }, { 1.05, 0.3 }, { 3, 0.9 }, { 2, 0.01 }, { 100, 0.5 },
    };

    [Theory]
    [MemberData(nameof(Proportions))]
    public void The_full_volume_is_that_of_the_standing_head(double crown, double knuckle)
    {
        DishProfile dish = new(1, crown, knuckle);
        double standing = new StandingTorisphere(dish).Capacity;
        double lying = 2 * new LyingTorisphere(dish).Volume(1, Math.PI / 2);
        // 1e-14: a few roundings over the closed form.
        Assert.Equal(1, lying / standing, 1e-14);
    }

    [Theory]
    [MemberData(nameof(Proportions))]
    public void The_volume_below_a_level_is_the_sum_of_its_slices(double crown, double knuckle)
    {
        DishProfile dish = new(1, crown, knuckle);
        LyingTorisphere head = new(dish);
        foreach (double h in new[] { 0.01, 0.05, 0.1, 0.2, 0.4, 0.7, 0.95, 1 })
        {
            double expected = Sliced(dish, h);
            // The slices are good to about 1e-12 where they begin at the level; the fit is better.
            Assert.Equal(1, head.Volume(h, Math.Acos(1 - h)) / expected, 1e-11);
        }
    }

    [Fact]
    public void Touching_the_crown_neither_the_volume_nor_the_area_steps()
    {
        LyingTorisphere head = new(new DishProfile(1, 2, 0.2));
        double kink = head.Kink!.Value;
        double below = kink * (1 - 1e-15), above = kink * (1 + 1e-15);
        Assert.Equal(1, head.Volume(above, 0) / head.Volume(below, 0), 1e-14);
        Assert.Equal(1, head.Area(above) / head.Area(below), 1e-14);
    }

    private static double Sliced(DishProfile dish, double h)
    {
        double y = 1 - h;
        double centre = dish.CentreDistance - dish.KnuckleRise;
        double depthAtLevel = y <= dish.KnuckleCircle
            ? Math.Sqrt(dish.Crown * dish.Crown - y * y) - centre
            : Math.Sqrt(dish.Knuckle * dish.Knuckle - Math.Pow(y - 1 + dish.Knuckle, 2));
        double knuckleEnd = Math.Min(dish.KnuckleRise, depthAtLevel);
        return Slices(0, knuckleEnd, z => Segment(1 - dish.Knuckle + Root(dish.Knuckle, z), y))
            + Slices(knuckleEnd, depthAtLevel, z => Segment(Root(dish.Crown, centre + z), y));
    }

    private static double Root(double radius, double z) => Math.Sqrt(Math.Max(radius * radius - z * z, 0));

    private static double Segment(double r, double y)
    {
        if (y >= r)
            return 0;
        double angle = Math.Acos(y / r);
        return r * r * (angle - Math.Sin(angle) * Math.Cos(angle));
    }

    // A quintic step of s crowds the points at both ends, where the slices have roots.
    private static double Slices(double from, double to, Func<double, double> area) =>
        to <= from
            ? 0
            : GaussLegendreRule.Integrate(
                s => area(from + (to - from) * s * s * s * (10 - 15 * s + 6 * s * s)) * (to - from) * 30 * s * s * (1 - s) * (1 - s),
                0, 1, 512);
}
