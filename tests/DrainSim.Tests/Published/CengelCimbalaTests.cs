using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Tests.Draining;

namespace DrainSim.Tests.Published;

/// <summary>
/// Y. A. Çengel, J. M. Cimbala, Fluid Mechanics: Example 5-7 (petrol siphoned from a fuel tank: bore 5 mm, surface
/// 0.75 m above the outlet, crest 2.75 m above it, 750 kg/m³, 101.3 kPa) and Problems 5-48 to 5-51 (a pool, 3 cm
/// pipe, 3 m of head). No friction; g = 9.81 m/s². Answers to three digits, hence 0.2 %.
/// </summary>
public sealed class CengelCimbalaTests
{
    private static readonly LineHydraulics PetrolSiphon = RoughLines.Compile(new Line
    {
        Bore = 0.005,
        Roughness = 0,
        Inlet = new() { Elevation = 0.5, EdgeLoss = 0 },
        Path = [RoughLines.Rise(2.25), RoughLines.Rise(-2.75)],
    }, density: 750);

    [Fact]
    public void The_petrol_runs_at_the_printed_velocity_and_flow()
    {
        double flow = PetrolSiphon.Flow(0.75, 0);
        Assert.Equal(3.84, PetrolSiphon.Velocity(flow), 3.84 * 0.002);
        Assert.Equal(0.0753e-3, flow, 0.0753e-3 * 0.002);
    }

    [Fact]
    public void The_petrol_stands_at_the_printed_pressure_at_the_crest()
    {
        double crest = PetrolSiphon.LowPointPressure(PetrolSiphon.Flow(0.75, 0), 0.75, 101.3e3, out _);
        Assert.Equal(81.1e3, crest, 81.1e3 * 0.002);
    }

    [Fact]
    public void The_pool_empties_at_most_as_fast_as_printed()
    {
        LineHydraulics pipe = RoughLines.Compile(
            new Line { Bore = 0.03, Roughness = 0, Inlet = new() { Elevation = 0, EdgeLoss = 0 }, Path = [] }, density: 1000);
        Assert.Equal(5.42e-3, pipe.Flow(3, 0), 5.42e-3 * 0.002);
    }

    /// <remarks>15.4 h is from memory; the pool is 8 m wide.</remarks>
    [Fact]
    public void The_pool_is_empty_no_sooner_than_printed() => BookDrains.AssertTime(15.45 * 3600, 2e-3,
        BookDrains.Of(Jobs.Cylinder(8, 3), 3, Jobs.Orifice(0.03, 1)));

    /// <remarks>53.1 s is from memory. The level is constant in the book: our tank is as wide as a field.</remarks>
    [Fact]
    public void Four_litres_of_petrol_are_over_in_the_printed_time()
    {
        Line hose = new()
        {
            Bore = 0.005,
            Roughness = 0,
            Inlet = new() { Elevation = 0.5, EdgeLoss = 0 },
            Path = [RoughLines.Rise(2.25), RoughLines.Rise(-2.75)],
        };
        Job job = BookDrains.Of(Jobs.Prism(1000, 1), 0.75, hose);
        BookDrains.AssertTime(53.1, 2e-3, job with
        {
            Liquid = BookDrains.Thin with { Density = 750, VapourPressure = 0 },
            Run = new RunSettings { StopAtVolume = 750 - 0.004 },
        });
    }
}
