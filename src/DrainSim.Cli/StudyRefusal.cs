using System.Globalization;
using DrainSim.Scenarios;

namespace DrainSim.Cli;

/// <summary>Why a study is not run.</summary>
internal static class StudyRefusal
{
    /// <summary>Tells all problems of a scenario, its study or the command line.</summary>
    /// <returns>the exit code</returns>
    public static int Tell(TextWriter error, string scenario, IReadOnlyList<Problem> problems)
    {
        error.Write(ProblemReport.Entries(scenario, problems));
        string count = problems.Count == 1 ? "1 problem" : problems.Count.ToString(CultureInfo.InvariantCulture) + " problems";
        error.WriteLine($"{count}. Nothing was run and nothing was written.");
        return ExitCode.Refused;
    }
}
