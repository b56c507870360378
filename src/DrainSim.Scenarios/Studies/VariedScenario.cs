using DrainSim.Studies;

namespace DrainSim.Scenarios.Studies;

/// <summary>A scenario of which some parameters change from case to case.</summary>
public sealed class VariedScenario
{
    private readonly ScenarioDocument document;

    private VariedScenario(ScenarioDocument document, Scenario scenario, IReadOnlyList<StudyParameter> parameters) =>
        (this.document, Base, Parameters) = (document, scenario, parameters);

    /// <summary>The scenario as it stands in the file.</summary>
    public Scenario Base { get; }

    /// <summary>The parameters, in the order in which their values are given.</summary>
    public IReadOnlyList<StudyParameter> Parameters { get; }

    /// <summary>Finds the parameters of a study in its scenario.</summary>
    /// <param name="document">the scenario</param>
    /// <param name="samples">the paths, each with texts of which one at least is a possible value</param>
    /// <param name="problems">takes what is wrong with the scenario or with the paths</param>
    /// <returns>null when anything is wrong</returns>
    public static VariedScenario? Find(
        ScenarioDocument document, IReadOnlyList<(string Path, IReadOnlyList<string> Samples)> samples, List<Problem> problems)
    {
        ArgumentNullException.ThrowIfNull(document);
        ArgumentNullException.ThrowIfNull(samples);
        ArgumentNullException.ThrowIfNull(problems);
        ScenarioDocument job = document.WithoutStudies();
        ScenarioReading reading = job.Read();
        problems.AddRange(reading.Problems);
        if (reading.IsRefused)
            return null;
        int before = problems.Count;
        var finder = new ParameterFinder(job, reading, problems);
        List<StudyParameter> parameters = [];
        foreach ((string path, IReadOnlyList<string> texts) in samples)
        {
            if (parameters.Any(other => other.Path == path))
                problems.Add(new Problem(0, 0, Quote.Plain(path), "is varied twice", "Give each parameter once"));
            else if (finder.Find(path, texts) is { } parameter)
                parameters.Add(parameter);
        }

        return problems.Count > before ? null : new VariedScenario(job, reading.Scenario, parameters);
    }

    /// <summary>Full paths of the files that the scenario names, such as a strapping table.</summary>
    public IReadOnlyList<string> InputFiles =>
    [
        .. Base.Understood.Where(value => value.Path.EndsWith(".file", StringComparison.Ordinal))
            .Select(value => Path.GetFullPath(value.Written, Path.GetFullPath(document.Folder))),
    ];

    /// <summary>Makes jobs of values; for one thread.</summary>
    public CaseReader NewReader() => new(document, Base.Job, Parameters);

    /// <summary>Makes jobs of numbers in SI, in the order of the parameters; for any thread.</summary>
    /// <remarks>The parameters are numbers, not words.</remarks>
    public Func<IReadOnlyList<double>, CaseJob> Maker()
    {
        var readers = new ThreadLocal<CaseReader>(NewReader);
        return values =>
        {
            var given = new ParameterValue[values.Count];
            for (int i = 0; i < given.Length; i++)
                given[i] = Parameters[i].Of(values[i]);
            CaseReading made = readers.Value!.Read(given);
            return made.Job is { } job ? CaseJob.Of(job) : CaseJob.Refused(made.Cause);
        };
    }
}
