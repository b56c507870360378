using System.Collections.Immutable;

namespace DrainSim.Integration;

/// <summary>How an integration ended, where, and what happened on the way.</summary>
public sealed record IntegrationResult
{
    /// <summary>Why the run ended.</summary>
    public required EndingReason Reason { get; init; }

    /// <summary>The event function that ended the run; null unless <see cref="EndingReason.Stopped"/>.</summary>
    public required int? StoppedBy { get; init; }

    /// <summary>Time at which the run ended.</summary>
    public required double EndTime { get; init; }

    /// <summary>State at that time, after what a restart at that same time changed.</summary>
    public required ImmutableArray<double> EndState { get; init; }

    /// <summary>All events that fired, in time order.</summary>
    public required ImmutableArray<LocatedEvent> Events { get; init; }

    /// <summary>What the run cost.</summary>
    public required IntegrationCounters Counters { get; init; }
}
