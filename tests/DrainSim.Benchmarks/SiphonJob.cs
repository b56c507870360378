using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Liquids;
using DrainSim.Vessels;

namespace DrainSim.Benchmarks;

/// <summary>The plain siphon that costs are measured on: a 1.8 m tank, a 32 mm hose over its rim, free discharge.</summary>
internal static class SiphonJob
{
    /// <summary>The shortest hose, m.</summary>
    public const double ShortestHose = 9.7;

    /// <summary>The longest hose of the sweep, m.</summary>
    public const double LongestHose = 49.7;

    private const double InnerLeg = 2.7;

    /// <summary>The job with a hose of some length.</summary>
    /// <param name="hoseLength">total developed length, m; more than the inner leg of 2.7 m</param>
    public static Job Of(double hoseLength) => new()
    {
        Liquid = new Liquid { Name = "water", Density = 998.2, Viscosity = 1.002e-3, VapourPressure = 2339 },
        Vessel = new VerticalCylinder { Diameter = 1.8, ShellHeight = 2.6, Bottom = new Flat(), Top = new Flat() },
        Level = 2.2,
        DrawOffs = [new DrawOff { Line = Hose(hoseLength) }],
        Run = new RunSettings { Until = 43200, Tolerance = 1e-8 },
    };

    /// <summary>Jobs whose hoses cover the sweep evenly.</summary>
    /// <param name="count">how many; at least 1</param>
    public static Job[] Sweep(int count) =>
    [
        .. Enumerable.Range(0, count)
            .Select(i => Of(ShortestHose + (LongestHose - ShortestHose) * i / Math.Max(1, count - 1))),
    ];

    private static Line Hose(double length) => new()
    {
        Bore = 0.032,
        Roughness = 1e-5,
        Inlet = new Inlet { Elevation = 0.12, EdgeLoss = 0.78 },
        Path =
        [
            new StraightRun { Name = "inner_leg", Length = InnerLeg, Rise = 2.63 },
            new PlainLoss { Coefficient = 0.6 },
            new StraightRun { Name = "outer_leg", Length = length - InnerLeg, Rise = -4.55 },
        ],
    };
}
