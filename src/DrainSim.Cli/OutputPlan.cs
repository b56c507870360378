namespace DrainSim.Cli;

/// <summary>Which files a call will write, and whether any two of them are one.</summary>
internal static class OutputPlan
{
    /// <summary>What the files of a scenario end in, behind its name.</summary>
    private static readonly string[] Endings = [".csv", ".events.csv", ".json", ".png", ".line.png"];

    /// <summary>Name of a scenario's files: that of the scenario's file without its ending.</summary>
    public static string NameOf(string scenarioFile) => Path.GetFileNameWithoutExtension(scenarioFile);

    /// <summary>Why the scenarios cannot be written into one folder; null when they can.</summary>
    /// <param name="scenarioFiles">as the user named them</param>
    /// <param name="inputs">full paths of the files that the scenarios were read from</param>
    /// <param name="folder">where their files go</param>
    public static string? Clash(IReadOnlyList<string> scenarioFiles, IReadOnlyCollection<string> inputs, string folder)
    {
        var writers = new Dictionary<string, string>(StringComparer.OrdinalIgnoreCase);
        foreach (string scenario in scenarioFiles)
        {
            foreach (string ending in Endings)
            {
                string path = Path.Combine(folder, NameOf(scenario) + ending);
                if (!writers.TryAdd(path, scenario))
                    return SharedBy(writers[path], scenario, path);
                if (inputs.Contains(Path.GetFullPath(path), StringComparer.Ordinal))
                    return $"'{path}' is read by '{scenario}' and would be overwritten by its results; name another folder with --out.";
            }
        }
        return null;
    }

    private static string SharedBy(string first, string second, string path) =>
        Path.GetFullPath(first) == Path.GetFullPath(second)
            ? $"'{second}' is named twice."
            : $"'{first}' and '{second}' would both write '{path}'; run them one at a time with --out, or rename one.";
}
