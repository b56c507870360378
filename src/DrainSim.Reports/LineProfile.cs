using DrainSim.Draining;
using DrainSim.Lines;

namespace DrainSim.Reports;

/// <summary>Where a line runs: the ends of its straight runs, by developed length and elevation.</summary>
internal sealed class LineProfile
{
    /// <summary>Reads a line from its inlet to its outlet.</summary>
    public LineProfile(Line line)
    {
        var points = new List<(double Along, double Elevation)> { (0, line.Inlet.Elevation) };
        foreach (StraightRun run in line.Path.OfType<StraightRun>())
        {
            (double along, double elevation) = points[^1];
            points.Add((along + run.Length, elevation + run.Rise));
        }
        Points = points;
    }

    /// <summary>Developed length from the inlet and elevation above the tank's lowest inside point, m.</summary>
    public IReadOnlyList<(double Along, double Elevation)> Points { get; }

    /// <summary>Elevation of the inlet, m.</summary>
    public double Inlet => Points[0].Elevation;

    /// <summary>Elevation of the outlet, m.</summary>
    public double Outlet => Points[^1].Elevation;

    /// <summary>Elevation of the highest point, m.</summary>
    public double Crest => Points.Max(point => point.Elevation);

    /// <summary>Whether the line climbs above its inlet on the way, so that it has to be primed.</summary>
    public bool IsSiphon => Crest > Inlet + 1e-9;

    /// <summary>Least pressure allowed in the line of a job, Pa absolute: the stricter of the two limits.</summary>
    public static double PressureLimit(Job job) =>
        Math.Max(job.Liquid.VapourPressure, job.Line.LeastPressure ?? 0);

    /// <summary>Whether the least pressure given is stricter than the vapour pressure.</summary>
    public static bool IsLimitGiven(Job job) => job.Line.LeastPressure > job.Liquid.VapourPressure;
}
