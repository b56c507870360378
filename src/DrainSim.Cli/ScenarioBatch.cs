using System.Globalization;
using DrainSim.Scenarios;

namespace DrainSim.Cli;

/// <summary>The scenarios of one call, all read before any is run.</summary>
/// <param name="Readings">what each file gave, in the order of the call; none refused</param>
internal sealed record ScenarioBatch(IReadOnlyList<ScenarioReading> Readings)
{
    /// <summary>Reads every file; when any is refused, tells all problems of all files.</summary>
    /// <param name="files">as the user named them</param>
    /// <param name="error">takes the problems</param>
    /// <returns>the scenarios; null when one is refused</returns>
    public static ScenarioBatch? Read(IReadOnlyList<string> files, TextWriter error)
    {
        ScenarioReading[] readings = [.. files.Select(ScenarioReader.Read)];
        int problems = 0;
        foreach (ScenarioReading reading in readings.Where(reading => reading.IsRefused))
        {
            error.Write(ProblemReport.Entries(reading.FileName, reading.Problems));
            problems += reading.Problems.Count + reading.Untold;
        }
        if (problems == 0)
            return new ScenarioBatch(readings);
        string count = problems == 1 ? "1 problem" : problems.ToString(CultureInfo.InvariantCulture) + " problems";
        error.WriteLine($"{count}. Nothing was run and nothing was written.");
        return null;
    }

    /// <summary>Full paths of all files that were read, strapping tables included.</summary>
    public IReadOnlySet<string> InputFiles
    {
        get
        {
            var files = new HashSet<string>(StringComparer.Ordinal);
            foreach (ScenarioReading reading in Readings)
            {
                string scenario = Path.GetFullPath(reading.FileName);
                files.Add(scenario);
                foreach (UnderstoodValue value in reading.Scenario!.Understood.Where(value => value.Path.EndsWith(".file", StringComparison.Ordinal)))
                    files.Add(Path.GetFullPath(value.Written, Path.GetDirectoryName(scenario)!));
            }
            return files;
        }
    }
}
