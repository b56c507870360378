namespace DrainSim.Cli;

/// <summary>A commented scenario to start from.</summary>
/// <param name="Name">as it is named on the command line</param>
/// <param name="Summary">what it is for, in one sentence</param>
internal sealed record ScenarioTemplate(string Name, string Summary)
{
    /// <summary>The template that is taken unless another is named.</summary>
    public const string Usual = "over-the-rim";

    /// <summary>Every template.</summary>
    public static IReadOnlyList<ScenarioTemplate> All { get; } =
    [
        new(Usual, "A tank emptied by a hose over its rim: a siphon."),
        new("bottom-drain", "A tank with a dished bottom, emptied through the nozzle at its lowest point."),
        new("side-outlet", "A box emptied through a nozzle in its wall; a heel stays."),
        new("pond-siphon", "A pond drawn down over its bank by several pipes."),
        new("boiling-crest", "Hot water over a high crest, where the column may boil and part."),
        new("strapping-table", "A tank known by its strapping table, with a table to fill in."),
        new("us-units", "A tank over its rim, in feet, inches and gallons."),
    ];

    /// <summary>The template of that name; null when there is none.</summary>
    public static ScenarioTemplate? Find(string name) => All.FirstOrDefault(template => template.Name == name);

    /// <summary>The files that it gives under a new name: the scenario, and a strapping table where it has one.</summary>
    /// <param name="stem">name of the new scenario, without its ending</param>
    public IReadOnlyList<(string Path, string Text)> Files(string stem)
    {
        string scenario = Embedded(Name + ".yaml")!.Replace("NAME", stem, StringComparison.Ordinal);
        return Embedded(Name + ".csv") is { } table
            ? [(stem + ".yaml", scenario), (stem + ".strapping.csv", table)]
            : [(stem + ".yaml", scenario)];
    }

    private static string? Embedded(string file)
    {
        using Stream? stream = typeof(ScenarioTemplate).Assembly.GetManifestResourceStream("Templates/" + file);
        if (stream is null)
            return null;
        using var reader = new StreamReader(stream);
        return reader.ReadToEnd();
    }
}
