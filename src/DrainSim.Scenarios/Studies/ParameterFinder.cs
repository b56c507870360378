using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Studies;

/// <summary>Finds out what a dotted path of a scenario stands for.</summary>
internal sealed class ParameterFinder
{
    /// <summary>Most nearest paths that a message names.</summary>
    private const int MostNamed = 3;

    private readonly ScenarioDocument document;
    private readonly List<Problem> problems;
    private readonly Dictionary<string, UnderstoodValue> known = [];

    /// <param name="document">the scenario</param>
    /// <param name="reading">its reading, not refused</param>
    /// <param name="problems">takes what is wrong with the paths</param>
    public ParameterFinder(ScenarioDocument document, ScenarioReading reading, List<Problem> problems)
    {
        (this.document, this.problems) = (document, problems);
        foreach (UnderstoodValue value in reading.Understood)
            known.TryAdd(value.Path, value);
    }

    /// <summary>The parameter of a path; null, with a problem, when there is none.</summary>
    /// <param name="path">dotted path</param>
    /// <param name="samples">texts that it is to be set to</param>
    public StudyParameter? Find(string path, IReadOnlyList<string> samples)
    {
        string whole = document.WholePath(path);
        UnderstoodValue? value = known.GetValueOrDefault(whole);
        for (int i = 0; i < samples.Count && value is null; i++)
        {
            ScenarioReading tried = document.With(path, samples[i]).Read();
            value = tried.Understood.FirstOrDefault(understood => understood.Path == whole && !understood.IsDefault);
            if (value is null && tried.Problems.FirstOrDefault(problem => IsOfPath(problem, whole)) is { } fault)
                return Refuse(path, fault);
        }

        if (value is null)
            return Refuse(path, new Problem(0, 0, path, ScenarioDocument.NoSuchParameter, ""));
        if (value.Unit is null)
            return new StudyParameter(path, null, null, null);
        Quantity quantity = Quantities.All.First(one => one.SiUnit == value.Unit);
        bool isOfFile = known.ContainsKey(whole);
        Unit unit = ValueList.UnitOf(samples.Count > 0 ? samples[0] : value.Written, quantity);
        return new StudyParameter(path, quantity, unit, isOfFile ? value.Value : null);
    }

    private static bool IsOfPath(Problem problem, string path) =>
        problem.Key.Length > 0 && (path.StartsWith(problem.Key, StringComparison.Ordinal) || problem.Key == Quote.Plain(path));

    private StudyParameter? Refuse(string path, Problem fault)
    {
        bool isUnknown = fault.Fault is ScenarioDocument.NoSuchParameter or ScenarioDocument.NoSuchKey;
        string[] near = [.. Nearest.Several(path, document.Parameters.Concat(known.Keys).Distinct(), MostNamed).Select(Quote.Of)];
        problems.Add(!isUnknown
            ? fault
            : new Problem(0, 0, Quote.Plain(path), ScenarioDocument.NoSuchParameter, near.Length == 0
                ? "'drainsim check' lists them"
                : $"The nearest are {string.Join(", ", near)}"));
        return null;
    }
}
