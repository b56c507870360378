using DrainSim.Reports;
using DrainSim.Reports.Files;
using DrainSim.Scenarios;

namespace DrainSim.Cli;

/// <summary>A run that is over, with what became of its files.</summary>
/// <param name="Reading">the scenario as it was read</param>
/// <param name="Report">the run and how it is told</param>
/// <param name="Files">the files written; empty when they could not be</param>
/// <param name="WriteFault">why they could not be written; null when they were</param>
internal sealed record FinishedRun(
    ScenarioReading Reading, RunReport Report, IReadOnlyList<string> Files, string? WriteFault)
{
    /// <summary>Writes the files of a run, all of them or none.</summary>
    /// <exception cref="OperationCanceledException">the cancellation asked for it; nothing is left half written</exception>
    public static FinishedRun Written(
        ScenarioReading reading, RunReport report, string folder, CancellationToken cancellation)
    {
        try
        {
            return new FinishedRun(reading, report, RunFiles.Write(folder, report, cancellation), null);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            return new FinishedRun(reading, report, [], fault.Message);
        }
    }
}
