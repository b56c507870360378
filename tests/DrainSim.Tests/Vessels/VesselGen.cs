using CsCheck;
using DrainSim.Vessels;

namespace DrainSim.Tests.Vessels;

/// <summary>Random vessels of every shape, from a bucket to a reservoir.</summary>
internal static class VesselGen
{
    private static readonly Gen<double> Size = Gen.Double[-1.0, 2.0].Select(x => Math.Pow(10, x));

    private static readonly Gen<double> Proportion = Gen.Double[-1.0, 1.0].Select(x => Math.Pow(10, x));

    /// <summary>Heads as functions of the diameter of the shell that they are to fit.</summary>
    private static readonly Gen<Func<double, Head>> Heads =
        Gen.Select(Gen.Int[0, 8], Gen.Double[0.05, 1.5], Gen.Double[1, 5], Gen.Double[0.02, 0.6]).Select((kind, depth, crown, knuckle) =>
            (Func<double, Head>)(d => kind switch
            {
                0 => new Flat(),
                1 => new Hemisphere(),
                2 => new Ellipsoidal(),
                3 => new Ellipsoidal { Depth = depth * d / 2 },
                4 => ConeHead.OfDepth(depth * d / 2),
                5 => ConeHead.OfAngle(depth * 2),
                6 => Torispherical.Kloepper(d),
                7 => new Torispherical { CrownRadius = crown * d / 2, KnuckleRadius = 0 },
                _ => new Torispherical { CrownRadius = crown * d / 2, KnuckleRadius = knuckle * d / 2 },
            }));

    public static readonly Gen<Sphere> Sphere = Size.Select(d => new Sphere { Diameter = d });

    public static readonly Gen<Box> Box = Gen.Select(Size, Proportion, Proportion,
        (size, w, h) => new Box { Length = size, Width = size * w, WallHeight = size * h });

    public static readonly Gen<Cone> Cone = Gen.Select(Size, Gen.Double[0, 1], Gen.Bool, Gen.Bool, Proportion,
        (size, narrow, point, upwards, h) =>
        {
            double other = point ? 0 : size * narrow;
            return new Cone
            {
                BottomDiameter = upwards ? size : other,
                TopDiameter = upwards ? other : size,
                ConeHeight = size * h,
            };
        });

    public static readonly Gen<Basin> Basin = Gen.Select(Size, Gen.Double[0.001, 1], Gen.Double[0, 4], Gen.Double[0.01, 1],
        (size, w, m, depth) => new Basin { BottomLength = size, BottomWidth = size * w, SideSlope = m, Depth = size * depth });

    public static readonly Gen<VerticalCylinder> VerticalCylinder =
        Gen.Select(Size, Proportion, Heads, Heads, (d, h, bottom, top) => new VerticalCylinder
        {
            Diameter = d,
            ShellHeight = d * h,
            Bottom = bottom(d),
            Top = top(d),
        });

    public static readonly Gen<HorizontalCylinder> HorizontalCylinder =
        Gen.Select(Size, Proportion, Heads, Heads, (d, length, first, second) => new HorizontalCylinder
        {
            Diameter = d,
            Length = d * length,
            FirstHead = first(d),
            SecondHead = second(d),
        });

    public static readonly Gen<StrappingTable> StrappingTable =
        Gen.Select(Size, Gen.Double[0, 1], Gen.Select(Gen.Double[0.1, 1], Gen.Double[0.05, 1]).Array[1, 30], (size, bottoms, steps) =>
        {
            List<(double, double)> rows = [(0, bottoms * size)];
            foreach ((double rise, double area) in steps)
                rows.Add((rows[^1].Item1 + rise * size, rows[^1].Item2 + rise * area * size * size * size));
            return new StrappingTable { Rows = rows };
        });

    public static readonly Gen<Stack> Stack = Gen.Select(Cone, Size, Proportion, Proportion, (cone, d, h, w) =>
    {
        VerticalCylinder dished = new() { Diameter = d, ShellHeight = d * h, Bottom = new Ellipsoidal(), Top = new Flat() };
        Box box = new() { Length = d * w, Width = d, WallHeight = d * h };
        return new Stack { Sections = cone.TopDiameter > 0 ? [cone, box] : [dished, box, cone] };
    });

    public static readonly Gen<Vessel> Any = Gen.OneOf(
        Sphere.Select(v => (Vessel)v),
        Box.Select(v => (Vessel)v),
        Cone.Select(v => (Vessel)v),
        Basin.Select(v => (Vessel)v),
        VerticalCylinder.Select(v => (Vessel)v),
        HorizontalCylinder.Select(v => (Vessel)v),
        StrappingTable.Select(v => (Vessel)v),
        Stack.Select(v => (Vessel)v));
}
