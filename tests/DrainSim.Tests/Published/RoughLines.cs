using DrainSim.Lines;
using DrainSim.Liquids;

namespace DrainSim.Tests.Published;

/// <summary>Lines of books, in which the friction factor is a given number or left out.</summary>
internal static class RoughLines
{
    /// <summary>The books' gravity, m/s².</summary>
    public const double Gravity = 9.81;

    /// <summary>Wall whose fully rough Darcy factor is the book's.</summary>
    public static double RelativeRoughness(double darcy) => 3.7 * Math.Pow(10, -1 / (2 * Math.Sqrt(darcy)));

    /// <summary>A rise without friction: the run is too short to have any, only its rise counts.</summary>
    public static StraightRun Rise(double rise) => new() { Length = 1e-9, Rise = rise };

    /// <summary>Compiled for a liquid of next to no viscosity.</summary>
    public static LineHydraulics Compile(Line line, double density) => new(
        line, new Liquid { Name = "thin", Density = density, Viscosity = 1e-12, VapourPressure = 0 }, Gravity);
}
