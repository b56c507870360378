using DrainSim.Draining;
using DrainSim.Lines;

namespace DrainSim.Reports.Pictures;

/// <summary>The pressure along the line of a run, at the start and at the worst moment.</summary>
internal sealed class LinePressures
{
    private readonly DrainResult result;
    private readonly LineHydraulics line;
    private readonly Job job;
    private readonly int index;

    /// <summary>Compiles the line with the least margin and takes both moments from a run.</summary>
    public LinePressures(DrainResult result)
    {
        this.result = result;
        index = WorstLine(result);
        double? full = result.Lines.ElementAtOrDefault(index)?.RanFullAt;
        Start = result.Trace.At(full is { } time ? Math.Min(Math.BitIncrement(time), result.Trace.End) : 0);
        StartName = full is null ? "at the start" : "once full";
        Worst = result.Trace.At(Math.Clamp(result.LeastMargin.Time, 0, result.Trace.End));
        job = result.JobAt(Worst.Time);
        line = Compiled(job);
        Distances = Along(node => node.Distance);
        Elevations = Along(node => node.Elevation);
        CrestIndex = line.CrestIndex;
    }

    /// <summary>The first moment at which the line is full.</summary>
    public Instant Start { get; }

    /// <summary>That moment in words.</summary>
    public string StartName { get; }

    /// <summary>The moment of the least margin.</summary>
    public Instant Worst { get; }

    /// <summary>Developed lengths of the nodes from the inlet, m.</summary>
    public double[] Distances { get; }

    /// <summary>Elevations of the nodes above the tank's lowest inside point, m.</summary>
    public double[] Elevations { get; }

    /// <summary>The highest node.</summary>
    public int CrestIndex { get; }

    /// <summary>The line, where it is one of several; else null.</summary>
    public Line? Named => job.DrawOffs.Count > 1 ? job.DrawOffs[index].Line : null;

    /// <summary>Pressures at the nodes at a moment, Pa absolute, through the line as acts have made it by then.</summary>
    public double[] Pressures(Instant now)
    {
        Job then = result.JobAt(now.Time);
        LineHydraulics through = then == job ? line : Compiled(then);
        double[] pressures = new double[line.NodeCount];
        // An act may have given the line other parts: its nodes are then not those of the picture.
        if (through.NodeCount != line.NodeCount)
        {
            through = line;
        }
        through.Pressures(Math.Max(0, now.LineFlows?[index] ?? now.Flow), now.Level, now.HeadspacePressure ?? job.Site.AtmosphericPressure, pressures);
        return pressures;
    }

    /// <summary>
    /// Elevations to which the liquid would stand in an open riser at each node, z + (p − p_atm)/(ρ·g), m.
    /// </summary>
    /// <param name="pressures">pressures at the nodes, Pa absolute</param>
    public double[] Heads(double[] pressures)
    {
        double weight = job.Liquid.Density * job.Site.Gravity;
        return [.. pressures.Zip(Elevations, (p, z) => z + (p - job.Site.AtmosphericPressure) / weight)];
    }

    private LineHydraulics Compiled(Job then) => new(then.DrawOffs[index].Line, then.Liquid, then.Site.Gravity);

    private static int WorstLine(DrainResult result)
    {
        int worst = 0;
        for (int line = 1; line < result.Lines.Count; line++)
        {
            worst = result.Lines[line].LeastMargin.Value < result.Lines[worst].LeastMargin.Value ? line : worst;
        }
        return worst;
    }

    private double[] Along(Func<LineNode, double> value) =>
        [.. Enumerable.Range(0, line.NodeCount).Select(index => value(line.Node(index)))];
}
