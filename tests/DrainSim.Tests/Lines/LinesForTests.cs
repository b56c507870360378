using CsCheck;
using DrainSim.Lines;
using DrainSim.Liquids;

namespace DrainSim.Tests.Lines;

/// <summary>Lines and liquids at hand, and random ones.</summary>
internal static class LinesForTests
{
    public const double Gravity = 9.80665;

    public static readonly Liquid Water =
        new() { Name = "water", Density = 998.2, Viscosity = 1.002e-3, VapourPressure = 2339 };

    /// <summary>A hose over a rim: up 3.1 m, two bends, down to 1.5 m below the tank's bottom, a ball valve.</summary>
    public static readonly Line Siphon = new()
    {
        Bore = 0.038,
        Roughness = 5e-6,
        Inlet = new() { Elevation = 0.05 },
        Path =
        [
            new StraightRun { Length = 3.2, Rise = 3.1 },
            new Fitting { Kind = FittingTable.Find("bend_90")!, Count = 2 },
            new StraightRun { Length = 6, Rise = -4.65 },
            new Valve { Kind = ValveTable.Find("ball")! },
        ],
    };

    /// <summary>A liquid between thin as petrol and thick as cold oil.</summary>
    public static readonly Gen<Liquid> AnyLiquid =
        Gen.Select(Gen.Double[600, 1900], Gen.Double[-9, 1]).Select((density, logViscosity) => new Liquid
        {
            Name = "any",
            Density = density,
            Viscosity = Math.Exp(logViscosity),
            VapourPressure = 0,
        });

    private static readonly Gen<double> Bore = Gen.Double[-5, -0.7].Select(Math.Exp);

    private static readonly Gen<double?> BoreOrNone = Gen.Select(Bore, Gen.Int[0, 3]).Select((bore, n) => n == 0 ? bore : (double?)null);

    private static readonly Gen<PathItem> AnyItem = Gen.Frequency(
        (4, Gen.Select(BoreOrNone, Gen.Double[0.1, 50], Gen.Double[-1, 1], Gen.Double[0, 1e-3]).Select((bore, length, slope, roughness) =>
            (PathItem)new StraightRun { Bore = bore, Length = length, Rise = slope * length, Roughness = roughness })),
        (2, Gen.Select(BoreOrNone, Gen.Int[0, FittingTable.All.Count - 1], Gen.Int[1, 4]).Select((bore, row, count) =>
            (PathItem)new Fitting { Bore = bore, Kind = FittingTable.All[row], Count = count })),
        (1, Gen.Select(BoreOrNone, Gen.Int[0, ValveTable.All.Count - 1], Gen.Double[0.1, 1]).Select((bore, row, opening) =>
            (PathItem)new Valve { Bore = bore, Kind = ValveTable.All[row], Opening = opening })),
        (1, Gen.Select(BoreOrNone, Gen.Double[0, 20]).Select((bore, k) => (PathItem)new PlainLoss { Bore = bore, Coefficient = k })),
        (1, Gen.Select(BoreOrNone, Gen.Double[0.1, 3]).Select((bore, angle) => (PathItem)new Reducer { Bore = bore, Angle = angle })));

    /// <summary>A line of no to eight items and one to four in parallel.</summary>
    public static readonly Gen<Line> AnyLine =
        Gen.Select(Bore, Gen.Double[0, 1e-3], AnyItem.Array[0, 8], Gen.Int[1, 4], Gen.Double[0.04, 1])
            .Select((bore, roughness, path, parallel, edge) => new Line
            {
                Bore = bore,
                Roughness = roughness,
                Parallel = parallel,
                Inlet = new() { Elevation = 1, EdgeLoss = edge },
                Path = new PrintedPath(path),
            });

    /// <summary>A flow over ten decades of Reynolds number in the line's own bore, its factor drawn at random.</summary>
    public static double FlowAt(LineHydraulics line, double logReynolds) => Math.Exp(logReynolds) / line.Reynolds(1);

    public static LineHydraulics Compile(this Line line, Liquid? liquid = null) => new(line, liquid ?? Water, Gravity);

    /// <summary>A path that shows its items when a random case is printed.</summary>
    private sealed class PrintedPath(IEnumerable<PathItem> items) : List<PathItem>(items)
    {
        public override string ToString() => string.Join(", ", this);
    }
}
