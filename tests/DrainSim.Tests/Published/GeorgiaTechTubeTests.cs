using DrainSim.Tests.Draining;

namespace DrainSim.Tests.Published;

/// <summary>
/// Measured: Torricelli's Law and Fluid Dynamics, research project of MATH 2413, Georgia Institute of Technology, 2002: standing tubes
/// with a hole in the wall near the bottom. The hole counts as a sharp orifice of Cd 0.62; the holes' own coefficients lay
/// between 0.57 and 0.70, hence 15 %.
/// </summary>
public sealed class GeorgiaTechTubeTests
{
    private const double Inch = 0.0254;

    [Theory]
    [InlineData(1, 0.25, 55.25, 13.3)]
    [InlineData(1, 0.125, 58.6, 50.4)]
    [InlineData(0.5, 0.25, 57.4, 3.8)]
    [InlineData(0.5, 0.125, 55.7, 13.1)]
    public void A_tube_drains_to_its_hole_in_the_measured_time(double tubeRadius, double holeRadius, double head, double seconds) =>
        Assert.Equal(seconds, Time(tubeRadius, holeRadius, head), 0.15 * seconds);

    [Fact]
    public void The_tubes_come_in_the_measured_order()
    {
        double wide = Time(1, 0.25, 55.25), widePinhole = Time(1, 0.125, 58.6);
        double narrow = Time(0.5, 0.25, 57.4), narrowPinhole = Time(0.5, 0.125, 55.7);
        Assert.True(narrow < narrowPinhole && narrow < wide && wide < widePinhole && narrowPinhole < widePinhole);
        Assert.Equal(wide, narrowPinhole, 0.05 * wide);
    }

    private static double Time(double tubeRadius, double holeRadius, double head) => BookDrains.Time(
        BookDrains.Of(Jobs.Cylinder(2 * tubeRadius * Inch, 60 * Inch), head * Inch, Jobs.Orifice(2 * holeRadius * Inch, 0.62)));
}
