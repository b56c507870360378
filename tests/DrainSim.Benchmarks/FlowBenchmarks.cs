using BenchmarkDotNet.Attributes;
using DrainSim.Draining;
using DrainSim.Lines;

namespace DrainSim.Benchmarks;

/// <summary>The flow of one line under one head.</summary>
[MemoryDiagnoser]
public class FlowBenchmarks
{
    private const double Head = 4.0;

    private readonly LineHydraulics line;
    private readonly double near;

    /// <summary>Compiles the line.</summary>
    public FlowBenchmarks()
    {
        Job job = SiphonJob.Of(SiphonJob.ShortestHose);
        line = new LineHydraulics(job.Line, job.Liquid, job.Site.Gravity);
        near = line.Flow(Head * 1.01, 0);
    }

    /// <summary>Solved from nothing, m³/s.</summary>
    [Benchmark]
    public double Cold() => line.Flow(Head, 0);

    /// <summary>Solved from the flow of a head 1 % away, as within a run, m³/s.</summary>
    [Benchmark]
    public double Warm() => line.Flow(Head, near);
}
