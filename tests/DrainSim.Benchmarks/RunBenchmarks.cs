using BenchmarkDotNet.Attributes;
using DrainSim.Draining;

namespace DrainSim.Benchmarks;

/// <summary>One run of the plain siphon, and a sweep of its hose on one core.</summary>
[MemoryDiagnoser]
public class RunBenchmarks
{
    private const int SweepRuns = 100;

    private readonly Job siphon = SiphonJob.Of(SiphonJob.ShortestHose);
    private readonly Job[] sweep = SiphonJob.Sweep(SweepRuns);

    /// <summary>One run, to the time at which air reaches the inlet, s.</summary>
    [Benchmark]
    public double PlainSiphon() => Simulation.Run(siphon).StoppedAt;

    /// <summary>A run of each hose length; the figure is for one.</summary>
    [Benchmark(OperationsPerInvoke = SweepRuns)]
    public double HoseSweep()
    {
        double sum = 0;
        foreach (Job job in sweep)
            sum += Simulation.Run(job).StoppedAt;
        return sum;
    }
}
