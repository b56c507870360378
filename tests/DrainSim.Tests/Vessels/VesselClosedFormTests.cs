using DrainSim.Vessels;

namespace DrainSim.Tests.Vessels;

/// <summary>Whole volumes, depths and areas known in closed form; 1e-14 is a few roundings.</summary>
public sealed class VesselClosedFormTests
{
    private static void AssertSame(double expected, double actual) => Assert.Equal(1, actual / expected, 1e-14);

    [Fact]
    public void A_sphere_is_pi_over_6_of_its_cube()
    {
        Sphere sphere = new() { Diameter = 3 };
        AssertSame(Math.PI * 27 / 6, sphere.Capacity);
        AssertSame(Math.PI * 27 / 12, sphere.Volume(1.5));
        AssertSame(Math.PI * 9 / 4, sphere.Area(1.5));
        AssertSame(1.5, sphere.Level(sphere.Capacity / 2));
    }

    [Fact]
    public void A_cone_on_its_tip_holds_a_third_and_half_of_it_stands_at_the_cube_root_of_a_half()
    {
        Cone cone = new() { BottomDiameter = 0, TopDiameter = 2, ConeHeight = 1.5 };
        AssertSame(Math.PI * 1.5 / 3, cone.Capacity);
        AssertSame(1.5 * Math.Cbrt(0.5), cone.Level(cone.Capacity / 2));
    }

    [Fact]
    public void A_cone_with_equal_ends_is_a_cylinder()
    {
        Cone cone = new() { BottomDiameter = 2, TopDiameter = 2, ConeHeight = 1.5 };
        AssertSame(Math.PI * 0.3, cone.Volume(0.3));
        AssertSame(0.3, cone.Level(Math.PI * 0.3));
    }

    [Fact]
    public void A_cone_turned_over_holds_the_rest()
    {
        Cone tipDown = new() { BottomDiameter = 0.2, TopDiameter = 2, ConeHeight = 1.5 };
        Cone tipUp = new() { BottomDiameter = 2, TopDiameter = 0.2, ConeHeight = 1.5 };
        AssertSame(tipDown.Capacity - tipDown.Volume(0.9), tipUp.Volume(0.6));
    }

    [Fact]
    public void A_basin_with_upright_banks_is_a_box()
    {
        Basin basin = new() { BottomLength = 4, BottomWidth = 3, SideSlope = 0, Depth = 2 };
        AssertSame(24, basin.Capacity);
        AssertSame(0.5, basin.Level(6));
    }

    [Fact]
    public void A_basin_is_the_prismoid_of_its_three_areas()
    {
        Basin basin = new() { BottomLength = 40, BottomWidth = 25, SideSlope = 2.5, Depth = 3 };
        double middle = basin.Area(1.5);
        AssertSame(3.0 / 6 * (40 * 25 + 4 * middle + 55 * 40), basin.Capacity);
    }

    [Fact]
    public void The_heads_have_their_standard_depths()
    {
        Assert.Equal(0.5, new Ellipsoidal().DepthOn(2));
        Assert.Equal(1, new Hemisphere().DepthOn(2));
        AssertSame(1, ConeHead.OfAngle(Math.PI / 2).DepthOn(2));
        // DIN 28011 and DIN 28013 print h2 = 0.1935·D and 0.255·D for a thin wall, rounded: a thousandth of D.
        Assert.Equal(0.1935, Torispherical.Kloepper(1).DepthOn(1), 0.001);
        Assert.Equal(0.255, Torispherical.Korbbogen(1).DepthOn(1), 0.001);
    }

    [Fact]
    public void Two_hemispheres_and_a_shell_hold_a_sphere_and_a_cylinder_standing_or_lying()
    {
        double expected = Math.PI * 8 / 6 + Math.PI * 5;
        VerticalCylinder standing = new() { Diameter = 2, ShellHeight = 5, Bottom = new Hemisphere(), Top = new Hemisphere() };
        HorizontalCylinder lying = new() { Diameter = 2, Length = 5, FirstHead = new Hemisphere(), SecondHead = new Hemisphere() };
        AssertSame(expected, standing.Capacity);
        AssertSame(expected, lying.Capacity);
    }

    [Fact]
    public void Cone_heads_hold_as_much_lying_as_standing()
    {
        Head cone = ConeHead.OfDepth(0.7);
        VerticalCylinder standing = new() { Diameter = 2, ShellHeight = 5, Bottom = cone, Top = cone };
        HorizontalCylinder lying = new() { Diameter = 2, Length = 5, FirstHead = cone, SecondHead = cone };
        AssertSame(standing.Capacity, lying.Capacity);
    }

    [Fact]
    public void A_crown_as_round_as_the_shell_is_a_hemisphere()
    {
        Torispherical round = new() { CrownRadius = 1, KnuckleRadius = 0.2 };
        HorizontalCylinder dished = new() { Diameter = 2, Length = 5, FirstHead = round, SecondHead = round };
        HorizontalCylinder hemispherical = dished with { FirstHead = new Hemisphere(), SecondHead = new Hemisphere() };
        AssertSame(hemispherical.Volume(0.3), dished.Volume(0.3));
        AssertSame(1, round.DepthOn(2));
    }

    [Fact]
    public void The_section_levels_are_the_tangent_lines_and_the_knuckle_circles()
    {
        VerticalCylinder tank = new() { Diameter = 2, ShellHeight = 3, Bottom = ConeHead.OfDepth(1), Top = new Flat() };
        Assert.Equal([1.0], tank.SectionLevels);
        VerticalCylinder dished = tank with { Bottom = Torispherical.Kloepper(2), Top = Torispherical.Kloepper(2) };
        Assert.Equal(4, dished.SectionLevels.Count);
        Assert.Equal(dished.Height, dished.SectionLevels[0] + dished.SectionLevels[3], 1e-14);
    }
}
