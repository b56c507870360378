using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Liquids;
using DrainSim.Vessels;

namespace DrainSim.Tests.Draining;

/// <summary>Jobs of which the tests know the answer, or that they vary.</summary>
internal static class Jobs
{
    /// <summary>Water at 20 °C; density, viscosity and vapour pressure rounded as handbooks print them.</summary>
    public static Liquid Water { get; } = new()
    {
        Name = "water",
        Density = 998.2,
        Viscosity = 1.002e-3,
        VapourPressure = 2339,
    };

    /// <summary>A water that no loss depends on: its viscosity makes every flow fully turbulent.</summary>
    public static Liquid Inviscid { get; } = Water with { Viscosity = 1e-12 };

    /// <summary>An orifice in the floor whose losses and jet add up to 1/Cd².</summary>
    /// <param name="bore">bore, m</param>
    /// <param name="dischargeCoefficient">Cd, 1</param>
    public static Line Orifice(double bore, double dischargeCoefficient) => new()
    {
        Bore = bore,
        Roughness = 0,
        Inlet = new Inlet
        {
            Elevation = 0,
            Facing = InletFacing.Down,
            EdgeLoss = 1 / (dischargeCoefficient * dischargeCoefficient) - 1,
        },
        Path = [],
    };

    /// <summary>A tank of one cross-section.</summary>
    /// <param name="area">area, m²</param>
    /// <param name="height">height, m</param>
    public static Box Prism(double area, double height) => new() { Length = area, Width = 1, WallHeight = height };

    /// <summary>The siphon of the cost anchors: 1.8 m tank, 32 mm hose, crest 2.75 m, outlet −1.8 m.</summary>
    /// <param name="hoseLength">total developed length, m</param>
    public static Job Siphon(double hoseLength = 9.7) => new()
    {
        Liquid = Water,
        Vessel = Cylinder(1.8, 2.6),
        Level = 2.2,
        DrawOffs = Only(SiphonLine(hoseLength)),
        Run = new RunSettings { Until = 43200 },
    };

    /// <summary>The hose of that siphon.</summary>
    /// <param name="hoseLength">total developed length, m</param>
    public static Line SiphonLine(double hoseLength = 9.7) => new()
    {
        Bore = 0.032,
        Roughness = 1e-5,
        Inlet = new Inlet { Elevation = 0.12, EdgeLoss = 0.78 },
        Path =
        [
            new StraightRun { Name = "inner_leg", Length = 2.7, Rise = 2.63 },
            new PlainLoss { Coefficient = 0.6 },
            new StraightRun { Name = "outer_leg", Length = hoseLength - 2.7, Rise = -4.55 },
        ],
    };

    /// <summary>One line, into the open air or to a fixed surface.</summary>
    /// <param name="line">the line</param>
    /// <param name="surface">elevation of the receiving surface, m; null for the open air</param>
    public static IReadOnlyList<DrawOff> Only(Line line, double? surface = null) =>
        [new DrawOff { Line = line, Receiver = surface is { } z ? new FixedSurface { Elevation = z } : null }];

    /// <summary>A prism that an orifice in its floor empties into the open air.</summary>
    /// <param name="area">area of the prism, m²</param>
    /// <param name="height">its height, m</param>
    /// <param name="level">level at the start, m</param>
    /// <param name="bore">bore of the orifice, m</param>
    /// <param name="dischargeCoefficient">Cd, 1</param>
    public static Job OrificeDrain(
        double area = 2, double height = 4, double level = 3, double bore = 0.05, double dischargeCoefficient = 0.6) => new()
        {
            Liquid = Inviscid,
            Vessel = Prism(area, height),
            Level = level,
            DrawOffs = Only(Orifice(bore, dischargeCoefficient)),
        };

    /// <summary>The factor K = Cd·a·√2g of an orifice, so that its flow is K·√h, m^2.5/s.</summary>
    /// <param name="bore">bore of the orifice, m</param>
    /// <param name="dischargeCoefficient">Cd, 1</param>
    public static double OrificeFactor(double bore = 0.05, double dischargeCoefficient = 0.6) =>
        dischargeCoefficient * Math.PI / 4 * bore * bore * Math.Sqrt(2 * Site.StandardGravity);

    /// <summary>A standing cylinder with flat ends.</summary>
    /// <param name="diameter">diameter, m</param>
    /// <param name="height">height, m</param>
    public static VerticalCylinder Cylinder(double diameter, double height) =>
        new() { Diameter = diameter, ShellHeight = height, Bottom = new Flat(), Top = new Flat() };

    /// <summary>Runs a job; ends with the test.</summary>
    /// <param name="job">the job</param>
    public static DrainResult Run(Job job) => Simulation.Run(job, TestContext.Current.CancellationToken);
}
