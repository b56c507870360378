using DrainSim.Vessels;

namespace DrainSim.Draining;

/// <summary>A job compiled: the tank, its lines and its gas, as they are between two acts; immutable.</summary>
internal sealed class Plant
{
    /// <param name="job">the job</param>
    public Plant(Job job)
    {
        Job = job;
        Lines = [.. job.DrawOffs.Select(drawOff => new CompiledLine(drawOff, job))];
        Gas = new GasLaw(job);
    }

    /// <summary>The job.</summary>
    public Job Job { get; }

    /// <summary>The tank.</summary>
    public Vessel Vessel => Job.Vessel;

    /// <summary>The lines.</summary>
    public CompiledLine[] Lines { get; }

    /// <summary>The gas over the liquid.</summary>
    public GasLaw Gas { get; }
}
