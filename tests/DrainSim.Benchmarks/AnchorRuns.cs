using System.Diagnostics;
using System.Globalization;
using DrainSim.Draining;

namespace DrainSim.Benchmarks;

/// <summary>
/// Times runs over hose lengths from 9.7 m to 49.7 m in one process; a program given beside is run in turn with it, so
/// that both meet the same load.
/// </summary>
internal static class AnchorRuns
{
    private const int Runs = 1000;
    private const int WarmUps = 3;
    private const int Repeats = 11;

    /// <summary>Writes the median time of a run, and what the program beside says each time.</summary>
    /// <param name="output">takes the lines</param>
    /// <param name="beside">the program and its arguments; empty for none</param>
    public static void Write(TextWriter output, ReadOnlySpan<string> beside)
    {
        Job[] jobs = SiphonJob.Sweep(Runs);
        for (int i = 0; i < WarmUps; i++)
            Time(jobs, out _);
        double[] times = new double[Repeats];
        double mean = 0;
        for (int i = 0; i < Repeats; i++)
        {
            times[i] = Time(jobs, out mean);
            if (!beside.IsEmpty)
                output.WriteLine("beside: " + Said(beside));
        }

        Array.Sort(times);
        output.WriteLine(string.Create(
            CultureInfo.InvariantCulture,
            $"runs={Runs} repeats={Repeats} us_per_run: median={times[Repeats / 2]:F2} least={times[0]:F2} most={times[^1]:F2} mean_t={mean:F9}"));
    }

    /// <summary>Time of one run, µs.</summary>
    private static double Time(Job[] jobs, out double meanTime)
    {
        double sum = 0;
        long start = Stopwatch.GetTimestamp();
        foreach (Job job in jobs)
            sum += Simulation.Run(job).StoppedAt;
        TimeSpan elapsed = Stopwatch.GetElapsedTime(start);
        meanTime = sum / jobs.Length;
        return elapsed.TotalMicroseconds / jobs.Length;
    }

    /// <summary>What a program says, in one line.</summary>
    /// <param name="command">the program and its arguments</param>
    public static string Said(ReadOnlySpan<string> command)
    {
        using Process process = Process.Start(new ProcessStartInfo(command[0], command[1..].ToArray())
        {
            RedirectStandardOutput = true,
        })!;
        string output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return output.Trim().ReplaceLineEndings(" | ");
    }
}
