using MathNet.Numerics.RootFinding;

namespace DrainSim.Draining;

/// <summary>The course of a run, continuous in time.</summary>
public sealed class Trace
{
    private readonly Func<double, Instant> at;
    private readonly Func<double, double> volumeAt;
    private readonly double[] volumes;

    /// <param name="knots">times that bound smooth pieces, rising, the first 0, the last the end of the run, s</param>
    /// <param name="at">the state at a time between them</param>
    /// <param name="volumeAt">the volume in the tank, m³, at a time between them; cheaper than the whole state</param>
    /// <param name="volumes">the volumes at the knots, m³; null to have them asked for</param>
    public Trace(
        IReadOnlyList<double> knots, Func<double, Instant> at, Func<double, double> volumeAt, double[]? volumes = null)
    {
        ArgumentNullException.ThrowIfNull(knots);
        ArgumentOutOfRangeException.ThrowIfZero(knots.Count, nameof(knots));
        (Knots, this.at, this.volumeAt) = (knots, at, volumeAt);
        this.volumes = volumes ?? [.. knots.Select(volumeAt)];
    }

    /// <summary>When the run stopped, s.</summary>
    public double End => Knots[^1];

    /// <summary>Times of the integrator's steps and of the events, rising, the first 0 and the last <see cref="End"/>, s.</summary>
    public IReadOnlyList<double> Knots { get; }

    /// <summary>The state at a time; the flow is solved anew for it.</summary>
    /// <param name="time">since the start, s; from 0 to <see cref="End"/></param>
    /// <exception cref="ArgumentOutOfRangeException">the time lies outside the run</exception>
    public Instant At(double time) => at(Require.Within(time, 0, End, "time", "s"));

    /// <summary>The volume in the tank at a time, m³; no flow is solved for it.</summary>
    /// <param name="time">since the start, s; from 0 to <see cref="End"/></param>
    /// <exception cref="ArgumentOutOfRangeException">the time lies outside the run</exception>
    public double VolumeAt(double time) => volumeAt(Require.Within(time, 0, End, "time", "s"));

    /// <summary>When the volume first fell to a value, s; null when it never did.</summary>
    /// <param name="volume">volume in the tank, m³</param>
    public double? TimeAtVolume(double volume)
    {
        if (volumes[0] <= volume)
            return volumes[0] == volume ? 0 : null;
        int i = Array.FindIndex(volumes, knot => knot <= volume);
        if (i < 0)
            return null;
        return volumes[i] == volume ? Knots[i] : TimeWithin(Knots[i - 1], Knots[i], volume, volumes[i - 1] - volumes[i]);
    }

    private double TimeWithin(double from, double to, double volume, double scale)
    {
        return Brent.TryFindRoot(t => (volumeAt(t) - volume) / scale, from, to, 1e-14, 100, out double root) ? root : to;
    }
}
