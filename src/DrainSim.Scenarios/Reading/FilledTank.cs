using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Vessels;

namespace DrainSim.Scenarios.Reading;

/// <summary>A tank as it stands at the start.</summary>
/// <param name="Vessel">the inside of the tank</param>
/// <param name="Level">level at the start, m</param>
internal sealed record FilledTank(Vessel Vessel, double Level)
{
    /// <summary>The gas over the liquid.</summary>
    public Headspace Headspace { get; init; } = new OpenHeadspace();

    /// <summary>What runs in meanwhile; null for nothing.</summary>
    public Inflow? Inflow { get; init; }

    /// <summary>Vacuum that the tank stands, Pa below the atmosphere; null where it is not known.</summary>
    public double? VacuumRating { get; init; }

    /// <summary>Overpressure that the tank stands, Pa above the atmosphere; null where it is not known.</summary>
    public double? PressureRating { get; init; }
}
