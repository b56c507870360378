using DrainSim.Tests.Draining;
using DrainSim.Vessels;

namespace DrainSim.Tests.Published;

/// <summary>
/// S. C. Chapra, R. P. Canale, Numerical Methods for Engineers, 6th ed., Problem 25.20: a spherical tank of 3 m, filled to
/// 2.75 m, orifice of 3 cm and C = 0.55. The answer is not shown; 7487.7 s is its closed form,
/// t = π(2/3·D·h^1.5 − 2/5·h^2.5)/(C·a·√2g), computed here to five digits, hence 0.1 % with room.
/// </summary>
public sealed class ChapraSphereTests
{
    [Fact]
    public void The_sphere_empties_in_the_time_of_its_closed_form() =>
        BookDrains.AssertTime(7487.7, 1e-3, BookDrains.Of(new Sphere { Diameter = 3 }, 2.75, Jobs.Orifice(0.03, 0.55)));
}
