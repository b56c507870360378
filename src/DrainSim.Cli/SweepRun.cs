using DrainSim.Cli.Terminal;
using DrainSim.Reports.Files;
using DrainSim.Reports.Series;
using DrainSim.Reports.Studies;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies;

namespace DrainSim.Cli;

/// <summary>Runs the cases of a sweep into its table.</summary>
/// <param name="cases">the cases</param>
/// <param name="shard">which part of them</param>
/// <param name="path">where the table goes</param>
internal sealed class SweepRun(SweepCases cases, Shard shard, string path)
{
    /// <summary>Runs what is not yet in the table and moves the table in.</summary>
    /// <param name="goesOn">whether finished rows are kept</param>
    /// <param name="threads">number of threads</param>
    /// <param name="terminal">where the progress is shown; null for nowhere</param>
    /// <param name="cancellation">ends the sweep; finished rows are kept</param>
    /// <exception cref="IOException">another process writes the table, or the disk refuses</exception>
    /// <exception cref="InvalidDataException">the rows that stand there are of another study</exception>
    public void Run(bool goesOn, int threads, TextWriter? terminal, CancellationToken cancellation)
    {
        (long first, long end) = shard.CasesOf(cases.Count);
        string header = shard.Number == 1 ? SweepTable.Header([.. cases.Scenario.Parameters.Select(parameter => parameter.Column)]) : "";
        string origin = $"drainsim {ResultDocument.Version} sweep{shard.Suffix} {cases.Fingerprint()}";
        using RowFile file = RowFile.Open(path, header, end - first, origin, goesOn);
        long begin = first + file.Finished;
        using (var progress = new ProgressLine(terminal, end - first, file.Finished))
        {
            new OrderedRuns { Threads = threads }.Run(begin, end, () => new Worker(cases), (worker, number) => worker.Row(number, cancellation),
                (number, row) =>
                {
                    file.Append(row);
                    progress.Show(number + 1 - first);
                },
                cancellation);
        }

        file.Complete();
    }

    /// <summary>What a thread keeps for itself.</summary>
    private sealed class Worker(SweepCases cases) : IDisposable
    {
        private readonly CaseReader reader = cases.Scenario.NewReader();
        private readonly SweepTable table = new();
        private readonly ParameterValue[] values = new ParameterValue[cases.Scenario.Parameters.Count];
        private readonly ParameterCell[] cells = new ParameterCell[cases.Scenario.Parameters.Count];

        public string Row(long number, CancellationToken cancellation)
        {
            cases.Read(number, values);
            for (int i = 0; i < values.Length; i++)
                cells[i] = values[i].IsNumber ? new ParameterCell(values[i].Si, null) : new ParameterCell(double.NaN, values[i].Text);
            return table.Row(number + 1, cells, reader.Run(values, cancellation));
        }

        public void Dispose() => table.Dispose();
    }
}
