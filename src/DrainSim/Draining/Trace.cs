namespace DrainSim.Draining;

/// <summary>The course of a run, continuous in time.</summary>
public abstract class Trace
{
    /// <summary>When the run stopped, s.</summary>
    public abstract double End { get; }

    /// <summary>Times of the integrator's steps and of the events, rising, the first 0 and the last <see cref="End"/>, s.</summary>
    public abstract IReadOnlyList<double> Knots { get; }

    /// <summary>The state at a time; the flow is solved anew for it.</summary>
    /// <param name="time">since the start, s; from 0 to <see cref="End"/></param>
    public abstract Instant At(double time);

    /// <summary>When the volume had fallen to a value, s; null when it never did.</summary>
    /// <param name="volume">volume in the tank, m³</param>
    public abstract double? TimeAtVolume(double volume);
}
