namespace DrainSim.Draining;

/// <summary>A stretch of a run in which the plant and the ways its lines work stay the same.</summary>
internal sealed class Epoch
{
    private readonly double inflowBefore;

    /// <param name="from">when it begins, s</param>
    /// <param name="plant">the plant</param>
    /// <param name="modes">how each line works; kept, not copied</param>
    /// <param name="inflowBefore">volume that had run in until then, m³</param>
    public Epoch(double from, Plant plant, LineMode[] modes, double inflowBefore)
    {
        (From, Plant, Modes, this.inflowBefore) = (from, plant, modes, inflowBefore);
        foreach (LineMode mode in modes)
            LinesAtWork += mode.IsAtWork ? 1 : 0;
    }

    /// <summary>When it begins, s.</summary>
    public double From { get; }

    /// <summary>The plant.</summary>
    public Plant Plant { get; }

    /// <summary>How each line works.</summary>
    public LineMode[] Modes { get; }

    /// <summary>Number of lines at work.</summary>
    public int LinesAtWork { get; }

    /// <summary>Volume that has run in since the start of the run, m³.</summary>
    /// <param name="t">time, s; at least <see cref="From"/></param>
    public double InflowVolume(double t) =>
        Plant.Job.Inflow is { } inflow ? inflowBefore + inflow.Volume(From, t) : inflowBefore;

    /// <summary>Flow into the tank, m³/s.</summary>
    /// <param name="t">time, s</param>
    public double Inflow(double t) => Plant.Job.Inflow?.Flow(t) ?? 0;

    /// <summary>How fast that flow changes, m³/s².</summary>
    /// <param name="t">time, s</param>
    public double InflowSlope(double t) => Plant.Job.Inflow?.Slope(t) ?? 0;

    /// <summary>The next epoch, with one line working in another way.</summary>
    public Epoch With(double from, int line, LineMode mode)
    {
        LineMode[] modes = [.. Modes];
        modes[line] = mode;
        return new Epoch(from, Plant, modes, InflowVolume(from));
    }

    /// <summary>The next epoch, with all lines working in other ways.</summary>
    public Epoch With(double from, LineMode[] modes) => new(from, Plant, modes, InflowVolume(from));

    /// <summary>The next epoch, with another plant.</summary>
    public Epoch With(double from, Plant plant) => new(from, plant, Modes, InflowVolume(from));
}
