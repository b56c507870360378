using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Liquids;
using DrainSim.Vessels;

namespace DrainSim.Tests.Studies;

/// <summary>Jobs of which a closed form is known.</summary>
internal static class StudyJobs
{
    /// <summary>Gravity of the jobs, m/s².</summary>
    public const double Gravity = 9.80665;

    /// <summary>Area of the tank, m².</summary>
    public const double Area = 2.0;

    /// <summary>Level at the start, m.</summary>
    public const double Level = 1.5;

    /// <summary>
    /// A box through an opening in its floor of a plain loss K: t = (A/a)·√(2(1 + K)/g)·(√h₀ − √h₁) from
    /// A·dh/dt = −a·√(2·g·h/(1 + K)); α = 1 in a liquid of next to no viscosity.
    /// </summary>
    /// <param name="bore">bore, m</param>
    /// <param name="loss">loss coefficient K, 1</param>
    /// <param name="level">level at the start, m</param>
    /// <param name="stop">level at which the job is done, m</param>
    public static Job Drain(double bore, double loss, double level = Level, double stop = 0.2) => new()
    {
        Liquid = new Liquid { Name = "thin", Density = 1000, Viscosity = 1e-9, VapourPressure = 0 },
        Site = new Site { AtmosphericPressure = 101325, Gravity = Gravity },
        Vessel = new Box { Length = 2, Width = 1, WallHeight = 3 },
        Level = level,
        DrawOffs =
        [
            new DrawOff
            {
                Line = new Line
                {
                    Bore = bore,
                    Roughness = 0,
                    Inlet = new Inlet { Elevation = 0, Facing = InletFacing.Up, EdgeLoss = 0 },
                    Path = [new PlainLoss { Coefficient = loss }],
                },
            },
        ],
        Run = new RunSettings { StopAtLevel = stop, Tolerance = 1e-10 },
    };

    /// <summary>The drain time of that job by its closed form, s.</summary>
    public static double Time(double bore, double loss, double level = Level, double stop = 0.2) =>
        Area / (Math.PI / 4 * bore * bore) * Math.Sqrt(2 * (1 + loss) / Gravity) * (Math.Sqrt(level) - Math.Sqrt(stop));
}
