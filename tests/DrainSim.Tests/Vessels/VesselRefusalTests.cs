using DrainSim.Vessels;

namespace DrainSim.Tests.Vessels;

public sealed class VesselRefusalTests
{
    private static readonly VerticalCylinder Tank =
        new() { Diameter = 2, ShellHeight = 3, Bottom = new Flat(), Top = new Flat() };

    public static TheoryData<string, Func<object>> Refused => new()
    {
        { "sphere diameter must be greater than 0 m, got 0 m", () => new Sphere { Diameter = 0 } },
        { "sphere diameter must be greater than 0 m, got NaN m", () => new Sphere { Diameter = double.NaN } },
        { "box width must be greater than 0 m, got -1 m", () => new Box { Length = 1, Width = -1, WallHeight = 1 } },
        { "cone top diameter must be at least 0 m, got -1 m", () => new Cone { BottomDiameter = 0, TopDiameter = -1, ConeHeight = 1 } },
        { "the larger diameter of a cone must be greater than 0 m, got 0 m", () => new Cone { BottomDiameter = 0, TopDiameter = 0, ConeHeight = 1 } },
        { "the larger diameter of a cone must be greater than 0 m, got 0 m", () => new Cone { ConeHeight = 1, TopDiameter = 0, BottomDiameter = 0 } },
        { "basin side slope must be at least 0 m per m, got -2 m per m", () => new Basin { BottomLength = 1, BottomWidth = 1, SideSlope = -2, Depth = 1 } },
        { "tank diameter must be greater than 0 m, got -2 m", () => Tank with { Diameter = -2 } },
        { "shell height must be greater than 0 m, got 0 m", () => Tank with { ShellHeight = 0 } },
        { "depth of the ellipsoidal head must be greater than 0 m, got 0 m", () => new Ellipsoidal { Depth = 0 } },
        { "depth of the cone head must be greater than 0 m, got 0 m", () => ConeHead.OfDepth(0) },
        { "included angle of the cone head must be from 0.01 to 3.14 rad, got 4 rad", () => ConeHead.OfAngle(4) },
        { "crown radius must be greater than 0 m, got 0 m", () => new Torispherical { CrownRadius = 0, KnuckleRadius = 0 } },
        { "crown radius of a torispherical head on this shell must be from 1 to 1000 m, got 0.9 m", () => Dished(crown: 0.9, knuckle: 0.1) },
        { "knuckle radius of a torispherical head on this shell must be from 0 to 0.9 m, got 1.2 m", () => Dished(crown: 2, knuckle: 1.2) },
        { "height of a stack must be from 1 to 1000 sections, got 0 sections", () => new Stack { Sections = [] } },
        { "area at the top of section 1 of a stack must be greater than 0 m², got 0 m²", () => new Stack { Sections = [new Sphere { Diameter = 1 }, Tank] } },
        { "area at the bottom of section 2 of a stack must be greater than 0 m², got 0 m²", () => new Stack { Sections = [Tank, new Sphere { Diameter = 1 }] } },
        { "length of the strapping table must be from 2 to 100000 rows, got 1 rows", () => new StrappingTable { Rows = [(0, 0)] } },
        { "level in row 1 of the strapping table must be from 0 to 0 m, got 0.1 m", () => new StrappingTable { Rows = [(0.1, 0), (1, 1)] } },
        { "volume in row 1 of the strapping table must be at least 0 m³, got -1 m³", () => new StrappingTable { Rows = [(0, -1), (1, 1)] } },
        { "rise of the volume from row 2 to row 3 of the strapping table must be greater than 0 m³, got -0.5 m³", () => new StrappingTable { Rows = [(0, 0), (1, 1), (2, 0.5)] } },
        { "rise of the level from row 1 to row 2 of the strapping table must be greater than 0 m, got 0 m", () => new StrappingTable { Rows = [(0, 0), (0, 1)] } },
        { "rise of the volume from row 1 to row 2 of the strapping table must be greater than 0 m³, got NaN m³", () => new StrappingTable { Rows = [(0, 0), (1, double.NaN)] } },
    };

    [Theory]
    [MemberData(nameof(Refused))]
    public void An_impossible_shape_is_refused_by_quantity_and_unit(string message, Func<object> make) =>
        Assert.Equal(message, Assert.Throws<ArgumentOutOfRangeException>(make).Message);

    [Fact]
    public void A_head_that_does_not_fit_is_refused_in_whatever_order_the_parts_are_set()
    {
        Torispherical small = Torispherical.Kloepper(1);
        Assert.Throws<ArgumentOutOfRangeException>(() =>
            new VerticalCylinder { Top = small, Bottom = new Flat(), ShellHeight = 1, Diameter = 3 });
        Assert.Throws<ArgumentOutOfRangeException>(() =>
            new HorizontalCylinder { FirstHead = new Flat(), Diameter = 3, SecondHead = small, Length = 1 });
    }

    [Fact]
    public void A_copy_with_a_head_that_does_not_fit_gives_no_number()
    {
        VerticalCylinder copy = Tank with { Bottom = Torispherical.Kloepper(0.9) };
        Assert.Throws<ArgumentOutOfRangeException>(() => copy.Volume(1));
        Assert.Throws<ArgumentOutOfRangeException>(() => copy.Height);
        Assert.Throws<ArgumentOutOfRangeException>(() => (copy with { ShellHeight = 4 }).Level(1));
    }

    private static HorizontalCylinder Dished(double crown, double knuckle) => new()
    {
        Diameter = 2,
        Length = 3,
        FirstHead = new Flat(),
        SecondHead = new Torispherical { CrownRadius = crown, KnuckleRadius = knuckle },
    };
}
