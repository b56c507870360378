using DrainSim.Draining;

namespace DrainSim.Studies;

/// <summary>What became of one case of a study: a run, or why there was none.</summary>
/// <param name="Run">the run; null when the case is impossible</param>
/// <param name="Cause">why the case is impossible, one line for people; empty when it is not</param>
public readonly record struct CaseResult(RunSummary? Run, string Cause)
{
    /// <summary>Runs a job; one that the library refuses is an impossible case.</summary>
    /// <param name="job">the job</param>
    /// <param name="cancellation">ends the run early</param>
    /// <exception cref="OperationCanceledException">the run was cancelled</exception>
    public static CaseResult Of(Job job, CancellationToken cancellation = default)
    {
        try
        {
            return new CaseResult(RunSummary.Of(Simulation.Run(job, cancellation)), "");
        }
        catch (ArgumentException refusal)
        {
            return Impossible(refusal.Message);
        }
    }

    /// <summary>A case that cannot be run.</summary>
    /// <param name="cause">why, one line for people</param>
    public static CaseResult Impossible(string cause) => new(null, cause);
}
