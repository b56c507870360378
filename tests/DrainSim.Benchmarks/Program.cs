using BenchmarkDotNet.Running;
using DrainSim.Benchmarks;

switch (args)
{
    case ["counts"]:
        CounterTable.Write(Console.Out);
        break;
    case ["anchors", .. string[] beside]:
        AnchorRuns.Write(Console.Out, beside);
        break;
    case ["sweep", .. string[] beside]:
        SweepRuns.Write(Console.Out, beside);
        break;
    default:
        BenchmarkSwitcher.FromAssembly(typeof(RunBenchmarks).Assembly).Run(args);
        break;
}
