using DrainSim.Vessels;

namespace DrainSim.Tests.Vessels;

public sealed class StackTests
{
    private static readonly Cone Hopper = new() { BottomDiameter = 0.2, TopDiameter = 2, ConeHeight = 1 };
    private static readonly Box Tower = new() { Length = 3, Width = 2, WallHeight = 4 };
    private static readonly Stack Silo = new() { Sections = [Hopper, Tower] };

    [Fact]
    public void It_is_as_high_and_holds_as_much_as_its_sections()
    {
        Assert.Equal(5, Silo.Height);
        Assert.Equal(Hopper.Capacity + 24, Silo.Capacity);
    }

    [Fact]
    public void Below_the_joint_it_is_the_lower_section_and_above_it_the_upper_one()
    {
        Assert.Equal(Hopper.Volume(0.4), Silo.Volume(0.4));
        Assert.Equal(Hopper.Capacity + 6 * 0.5, Silo.Volume(1.5), 1e-14);
        Assert.Equal(Hopper.Level(0.1), Silo.Level(0.1));
        Assert.Equal(2.25, Silo.Level(Hopper.Capacity + 7.5), 1e-14);
    }

    [Fact]
    public void At_the_joint_the_area_is_that_of_the_upper_section()
    {
        Assert.Equal(6, Silo.Area(1));
        Assert.Equal(Math.PI, Silo.Area(1 - 1e-12), 1e-10);
    }

    [Fact]
    public void The_joints_are_section_levels() => Assert.Equal([1.0], Silo.SectionLevels);

    [Fact]
    public void A_dished_bottom_a_shell_and_a_roof_are_the_vertical_cylinder_of_those_parts()
    {
        VerticalCylinder whole = new() { Diameter = 2, ShellHeight = 3, Bottom = new Ellipsoidal(), Top = new Flat() };
        Stack cut = new() { Sections = [whole with { ShellHeight = 1 }, new Cone { BottomDiameter = 2, TopDiameter = 2, ConeHeight = 2 }] };
        foreach (double level in new[] { 0.1, 0.5, 1.2, 2.9, 3.5 })
            Assert.Equal(whole.Volume(level), cut.Volume(level), 1e-14 * whole.Capacity);
    }
}
