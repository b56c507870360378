using DrainSim.Vessels;

namespace DrainSim.Tests.Vessels;

public sealed class VesselCopyTests
{
    private static readonly VerticalCylinder Upright = new()
    {
        Diameter = 2,
        ShellHeight = 3,
        Bottom = Torispherical.Kloepper(2),
        Top = new Flat(),
    };

    private static readonly HorizontalCylinder Lying = new()
    {
        Diameter = 2,
        Length = 5,
        FirstHead = Torispherical.Korbbogen(2),
        SecondHead = new Flat(),
    };

    [Fact]
    public void A_copy_with_another_part_is_a_new_vessel_of_those_parts()
    {
        VerticalCylinder fresh = new() { Diameter = 1.5, ShellHeight = 3, Bottom = Torispherical.Kloepper(1.5), Top = new Flat() };
        VerticalCylinder copy = Upright with { Diameter = 1.5, Bottom = Torispherical.Kloepper(1.5) };
        Assert.Equal(fresh.Volume(0.7), copy.Volume(0.7));
        Assert.Equal(fresh.Height, copy.Height);
        Assert.Equal(fresh.SectionLevels, copy.SectionLevels);
        Assert.Equal(fresh, copy);
    }

    [Fact]
    public void A_copy_may_pass_through_parts_that_do_not_fit_each_other()
    {
        VerticalCylinder larger = Upright with { Diameter = 9, Bottom = Torispherical.Kloepper(9) };
        Assert.Equal(Torispherical.Kloepper(9).DepthOn(9) + 3, larger.Height);
    }

    [Fact]
    public void The_original_keeps_its_numbers_when_a_copy_changes()
    {
        double before = Lying.Volume(0.7);
        HorizontalCylinder longer = Lying with { Length = 10 };
        Assert.True(longer.Volume(0.7) > before);
        Assert.Equal(before, Lying.Volume(0.7));
    }

    [Fact]
    public void Turning_a_cone_over_by_a_copy_is_allowed()
    {
        Cone cone = new() { BottomDiameter = 1, TopDiameter = 0, ConeHeight = 1 };
        Cone turned = cone with { BottomDiameter = 0, TopDiameter = 1 };
        Assert.Equal(cone.Capacity, turned.Capacity);
        Assert.True(turned.Volume(0.5) < cone.Volume(0.5));
    }

    [Fact]
    public void Vessels_of_equal_parts_are_equal_whether_used_or_not()
    {
        HorizontalCylinder copy = Lying with { Length = 5 };
        Assert.Equal(Lying, copy);
        Assert.Equal(Lying.GetHashCode(), copy.GetHashCode());
        Assert.NotEqual(Lying, Lying with { Length = 6 });
    }

    [Fact]
    public void A_table_and_a_stack_are_copied_from_the_list_they_were_given()
    {
        List<(double, double)> rows = [(0, 0), (1, 1), (2, 3)];
        StrappingTable table = new() { Rows = rows };
        List<Vessel> sections = [table, new Box { Length = 1, Width = 1, WallHeight = 1 }];
        Stack stack = new() { Sections = sections };
        Assert.Equal(new StrappingTable { Rows = [.. rows] }, table);
        Assert.Equal(new Stack { Sections = [.. sections] }, stack);
        rows[2] = (2, -7);
        sections.Clear();
        Assert.Equal(3, table.Volume(2));
        Assert.Equal(4, stack.Capacity);
        Assert.Equal(6, (table with { Rows = [(0, 0), (2, 6)] }).Capacity);
    }
}
