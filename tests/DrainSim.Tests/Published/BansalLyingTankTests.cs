using DrainSim.Tests.Draining;
using DrainSim.Vessels;

namespace DrainSim.Tests.Published;

/// <summary>
/// R. K. Bansal, A Textbook of Fluid Mechanics: time to empty a lying cylinder through a bottom orifice,
/// t = 4L[D^1.5 − (D − h₀)^1.5]/(3·Cd·a·√2g); formula from memory and derived again, numbers chosen here: not a
/// published value. 1434.3 s to five digits, hence 0.1 % with room.
/// </summary>
public sealed class BansalLyingTankTests
{
    [Fact]
    public void The_lying_cylinder_empties_in_the_time_of_the_formula() =>
        BookDrains.AssertTime(1434.3, 1e-3, BookDrains.Of(
            new HorizontalCylinder { Diameter = 2, Length = 6, FirstHead = new Flat(), SecondHead = new Flat() },
            1.5, Jobs.Orifice(0.08, 0.62)));
}
