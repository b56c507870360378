using System.Globalization;
using DrainSim.Draining;

namespace DrainSim.Benchmarks;

/// <summary>What runs cost in counts, which no load of the machine changes.</summary>
internal static class CounterTable
{
    private static readonly double[] HoseLengths = [9.7, 19.7, 29.7, 39.7, 49.7];
    private static readonly double[] Tolerances = [1e-6, 1e-8, 1e-11];

    /// <summary>Writes a row per hose length and tolerance.</summary>
    /// <param name="output">takes the rows</param>
    public static void Write(TextWriter output)
    {
        output.WriteLine("hose_m,tolerance,stopped_at_s,steps,rejected,derivatives,flow_solutions,event_evaluations");
        foreach (double length in HoseLengths)
        {
            foreach (double tolerance in Tolerances)
                output.WriteLine(Row(length, tolerance));
        }
    }

    private static string Row(double length, double tolerance)
    {
        Job job = SiphonJob.Of(length);
        DrainResult result = Simulation.Run(job with { Run = job.Run with { Tolerance = tolerance } });
        Counters c = result.Counters;
        return string.Create(
            CultureInfo.InvariantCulture,
            $"{length},{tolerance},{result.StoppedAt:F6},{c.Steps},{c.Rejected},{c.Derivatives},{c.FlowSolutions},{c.EventEvaluations}");
    }
}
