namespace DrainSim.Draining;

/// <summary>Runs a job from its start to its end.</summary>
public static class Simulation
{
    /// <summary>Follows the falling level until the job is done or can go no further.</summary>
    /// <param name="job">the job</param>
    /// <param name="cancellation">ends the run early with an <see cref="OperationCanceledException"/></param>
    public static DrainResult Run(Job job, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(job);
        cancellation.ThrowIfCancellationRequested();
        throw new NotSupportedException("the balance is not yet stepped");
    }
}
