namespace DrainSim.Draining;

/// <summary>Something done during the job: from then on the plant is another one.</summary>
/// <remarks>
/// The contents stay where they are. What the act changes is the difference between <see cref="Before"/> and
/// <see cref="After"/>; see <see cref="ChangeOf"/>. Acts at times and at levels may thus come in any order.
/// </remarks>
public sealed record Act
{
    /// <summary>When, s since the start; null where a level calls for it.</summary>
    public double? Time { get; init => field = value is { } time ? Require.NotNegative(time, "act time", "s") : null; }

    /// <summary>Level to which the tank has to fall, m; null where a time calls for the act.</summary>
    public double? Level { get; init => field = value is { } level ? Require.NotNegative(level, "act level", "m") : null; }

    /// <summary>The job as it is without the act; null for the job that the act belongs to.</summary>
    public Job? Before { get; init; }

    /// <summary>The job as it is with the act; it has as many lines as before, and its own timeline does not count.</summary>
    public required Job After { get; init; }

    /// <summary>What is done, for people.</summary>
    public required string Text { get; init; }

    /// <summary>A job with the act done: its plant with what differs between the two jobs of the act.</summary>
    /// <param name="job">the job as it has become so far</param>
    /// <param name="start">the job that the act belongs to</param>
    public Job ChangeOf(Job job, Job start)
    {
        ArgumentNullException.ThrowIfNull(job);
        Job before = Before ?? start;
        return job with
        {
            Headspace = PlantChange.OfHeadspace(job.Headspace, before.Headspace, After.Headspace),
            Inflow = PlantChange.OfInflow(job.Inflow, before.Inflow, After.Inflow),
            DrawOffs =
            [
                .. job.DrawOffs.Select((drawOff, i) =>
                    PlantChange.OfDrawOff(drawOff, before.DrawOffs[i], After.DrawOffs[i])),
            ],
        };
    }

    /// <summary>Whether the act is done before the first instant.</summary>
    /// <param name="level">level at the start, m</param>
    internal bool IsDueAtStart(double level) => Time <= 0 || Level >= level;
}
