using DrainSim.Draining;

namespace DrainSim.Reports.Pictures;

/// <summary>The course of a run in as many points as a picture can show.</summary>
internal sealed class Course
{
    private const int EvenPoints = 400;
    private const int MostKnots = 1000;

    /// <summary>Samples a run at even times, at the integrator's knots and at its events.</summary>
    public Course(DrainResult result)
    {
        Trace trace = result.Trace;
        double end = trace.End;
        int stride = 1 + trace.Knots.Count / MostKnots;
        IEnumerable<double> times = Enumerable.Range(0, EvenPoints + 1)
            .Select(i => Math.Min(end, end * i / EvenPoints))
            .Concat(trace.Knots.Where((_, i) => i % stride == 0))
            .Concat(result.Events.Select(moment => Math.Clamp(moment.Time, 0, end)));
        Instants = end > 0 ? [.. times.Distinct().Order().Select(trace.At)] : [trace.At(0), trace.At(0)];
        End = end;
    }

    /// <summary>The points in time order, at least two; a run of no length has its only point twice.</summary>
    public IReadOnlyList<Instant> Instants { get; }

    /// <summary>When the run stopped, s.</summary>
    public double End { get; }

    /// <summary>One quantity in a unit of one axis.</summary>
    /// <param name="quantity">takes the quantity from a point</param>
    /// <param name="size">one of the unit in SI</param>
    public double[] Values(Func<Instant, double> quantity, double size) =>
        [.. Instants.Select(now => quantity(now) / size)];
}
