using System.Diagnostics.CodeAnalysis;
using DrainSim.Draining;

namespace DrainSim.Studies;

/// <summary>What a set of values makes of a scenario: a job, or the reason why there is none.</summary>
public readonly record struct CaseJob
{
    /// <summary>The job; null when the values make none.</summary>
    public Job? Job { get; private init; }

    /// <summary>Why the values make no job, in a few words; null when they do.</summary>
    public string? Fault { get; private init; }

    /// <summary>Whether there is no job.</summary>
    [MemberNotNullWhen(false, nameof(Job))]
    [MemberNotNullWhen(true, nameof(Fault))]
    public bool IsRefused => Job is null;

    /// <summary>A job that can be run.</summary>
    public static CaseJob Of(Job job) => new() { Job = job };

    /// <summary>Values that make no job.</summary>
    public static CaseJob Refused(string fault) => new() { Fault = fault };

    /// <summary>Makes a job in C#; what the library refuses becomes the reason.</summary>
    public static CaseJob Of(Func<Job> make)
    {
        ArgumentNullException.ThrowIfNull(make);
        try
        {
            return Of(make());
        }
        catch (ArgumentException e)
        {
            return Refused(e.Message);
        }
    }

    /// <summary>Runs the job; null, with the reason, when there is none or the library refuses it.</summary>
    internal DrainResult? Run(out string fault, CancellationToken cancellation)
    {
        fault = Fault ?? "";
        if (Job is null)
            return null;
        try
        {
            return Simulation.Run(Job, cancellation);
        }
        catch (ArgumentException refusal)
        {
            fault = refusal.Message;
            return null;
        }
    }
}
