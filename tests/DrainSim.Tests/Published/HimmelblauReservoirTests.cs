using DrainSim.Tests.Draining;

namespace DrainSim.Tests.Published;

/// <summary>
/// D. M. Himmelblau, J. B. Riggs, Basic Principles and Calculations in Chemical Engineering (2006), Example 32.2: a
/// reservoir of 16 m², 10 m deep, orifice of 5 cm² and coefficient 0.62. Printed: 73 700 s, three digits, hence 0.2 %.
/// </summary>
public sealed class HimmelblauReservoirTests
{
    [Fact]
    public void The_reservoir_empties_in_the_printed_time() =>
        BookDrains.AssertTime(73700, 2e-3,
            BookDrains.Of(Jobs.Prism(16, 10), 10, Jobs.Orifice(Math.Sqrt(4 * 0.0005 / Math.PI), 0.62)));
}
