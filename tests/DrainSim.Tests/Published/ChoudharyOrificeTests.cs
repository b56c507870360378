using DrainSim.Tests.Draining;

namespace DrainSim.Tests.Published;

/// <summary>
/// A. K. Choudhary, Om Prakash, Fluid Mechanics, Examples 6.17 to 6.19 (inputs and formulas from the companion files of
/// the textbook; the printed answers are not shown there, the times are the formulas'): a bottom orifice of Cd 0.6,
/// t = 2A(√H₁ − √H₂)/(Cd·a·√2g). Times to the second, hence 0.1 %.
/// </summary>
public sealed class ChoudharyOrificeTests
{
    [Fact]
    public void The_cylinder_of_example_6_17_is_empty_after_12_min_31_s() =>
        BookDrains.AssertTime(750.8, 1e-3, BookDrains.Of(Jobs.Cylinder(1.2, 3), 3, Jobs.Orifice(0.05, 0.6)));

    [Theory]
    [InlineData(2.5, 1577.2)]
    [InlineData(0, 5384.7)]
    public void The_tank_of_examples_6_18_and_6_19_falls_in_the_time_of_their_formula(double to, double seconds) =>
        BookDrains.AssertTime(seconds, 1e-3,
            BookDrains.Of(Jobs.Prism(3.2, 5), 5, Jobs.Orifice(Math.Sqrt(4 * 0.001 / Math.PI), 0.6), to));
}
