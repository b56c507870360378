using System.Collections.Immutable;

namespace DrainSim.Integration;

/// <summary>An event that fired.</summary>
/// <param name="Time">when; to the last bits of the dense output</param>
/// <param name="Index">which event function</param>
/// <param name="Direction">how it passed through zero; never <see cref="EventDirection.Either"/></param>
/// <param name="State">the state at that time, on the far side of the crossing, before any restart</param>
public readonly record struct LocatedEvent(
    double Time, int Index, EventDirection Direction, ImmutableArray<double> State);
