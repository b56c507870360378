using System.Diagnostics;
using System.Globalization;
using DrainSim.Reports.Studies;
using DrainSim.Scenarios;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies;

namespace DrainSim.Benchmarks;

/// <summary>
/// Times a sweep as the program does it, from a value to the text of its row, over hose lengths of the plain siphon, on
/// one thread and on two in turn; a program given beside is run in turn with them.
/// </summary>
internal static class SweepRuns
{
    private const int Runs = 4000;
    private const int WarmUps = 20;
    private const int Repeats = 15;

    private const string Siphon = """
        liquid: {density: 998.2 kg/m3, viscosity: 1.002 mPa.s, vapour_pressure: 2339 Pa}
        site: {atmospheric_pressure: 101325 Pa}
        tank: {shape: vertical_cylinder, diameter: 1.8 m, height: 2.6 m, level: 2.2 m}
        line:
          bore: 32 mm
          roughness: 0.01 mm
          inlet: {elevation: 120 mm, facing: down, loss: 0.78}
          path:
            - {name: inner_leg, length: 2.7 m, to: 2.75 m}
            - {loss: 0.6}
            - {name: outer_leg, length: 7 m, to: -1.8 m}
        run: {until: 12 h, tolerance: TOLERANCE}

        """;

    /// <summary>
    /// The tolerance of the main job, and one whose error is about that of the program beside: 1.2e-5 s of 2558.6 s at 9.7 m of hose,
    /// which the program of the anchors times 2.5e-5 s off at its own 1e-8.
    /// </summary>
    private static readonly string[] Tolerances = ["1e-8", "1e-6"];

    /// <summary>Writes the medians and the least times of a case, their ratio, and what a case costs without its run.</summary>
    /// <param name="output">takes the lines</param>
    /// <param name="beside">the program and its arguments; empty for none</param>
    public static void Write(TextWriter output, ReadOnlySpan<string> beside)
    {
        foreach (string tolerance in Tolerances)
            Write(output, beside, tolerance);
    }

    private static void Write(TextWriter output, ReadOnlySpan<string> beside, string tolerance)
    {
        List<Problem> problems = [];
        var request = new StudyRequest { Vary = [string.Create(CultureInfo.InvariantCulture, $"line.path.outer_leg.length=7 m..47 m in {Runs}")] };
        SweepCases cases = SweepPlan.Read(ScenarioDocument.FromText(Siphon.Replace("TOLERANCE", tolerance, StringComparison.Ordinal), "siphon.yaml", "."), request, problems)
            ?? throw new InvalidOperationException(problems[0].Text("siphon.yaml"));
        for (int i = 0; i < WarmUps; i++)
            Time(cases, 2, Row);
        double[] one = new double[Repeats], two = new double[Repeats], bare = new double[Repeats];
        for (int i = 0; i < Repeats; i++)
        {
            one[i] = Time(cases, 1, Row);
            two[i] = Time(cases, 2, Row);
            bare[i] = Time(cases, 1, Reading);
            if (!beside.IsEmpty)
                output.WriteLine("beside: " + AnchorRuns.Said(beside));
        }

        double[] ratios = [.. one.Zip(two, (slow, quick) => slow / quick)];
        foreach (double[] times in (double[][])[one, two, bare, ratios])
            Array.Sort(times);
        output.WriteLine(string.Create(CultureInfo.InvariantCulture,
            $"tolerance={tolerance} runs={Runs} us_per_run: one_thread={one[Repeats / 2]:F2} (least {one[0]:F2}) two_threads={two[Repeats / 2]:F2} (least {two[0]:F2}) reading_alone={bare[Repeats / 2]:F2} two_over_one={ratios[Repeats / 2]:F2}"));
    }

    /// <summary>Time of a case, µs.</summary>
    private static double Time(SweepCases cases, int threads, Func<Worker, long, int> work)
    {
        long start = Stopwatch.GetTimestamp(), sum = 0;
        new OrderedRuns { Threads = threads }.Run(0, cases.Count, () => new Worker(cases), work, (_, length) => sum += length);
        return Stopwatch.GetElapsedTime(start).TotalMicroseconds / cases.Count;
    }

    private static int Row(Worker worker, long number)
    {
        worker.Cases.Read(number, worker.Values);
        CaseResult result = worker.Reader.Run(worker.Values);
        return worker.Table.Row(number + 1, [new ParameterCell(worker.Values[0].Si, null)], result).Length;
    }

    private static int Reading(Worker worker, long number)
    {
        worker.Cases.Read(number, worker.Values);
        return worker.Reader.Read(worker.Values).Job is null ? 0 : 1;
    }

    /// <summary>What a thread keeps for itself.</summary>
    private sealed class Worker(SweepCases cases) : IDisposable
    {
        public SweepCases Cases => cases;

        public CaseReader Reader { get; } = cases.Scenario.NewReader();

        public SweepTable Table { get; } = new();

        public ParameterValue[] Values { get; } = new ParameterValue[1];

        public void Dispose() => Table.Dispose();
    }
}
