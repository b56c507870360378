using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Reading;

/// <summary>What a reading gathers: problems, warnings and the values understood.</summary>
internal sealed class Findings(SourceText source)
{
    /// <summary>Most problems that are kept; the rest is counted.</summary>
    public const int MostKept = 100;

    private readonly List<(Position At, Problem Problem)> problems = [];
    private readonly List<(Position At, Problem Problem)> warnings = [];
    private readonly List<UnderstoodValue> understood = [];

    /// <summary>The values understood, in the order of reading.</summary>
    public IReadOnlyList<UnderstoodValue> Understood => understood;

    /// <summary>The refusals in file order.</summary>
    public IReadOnlyList<Problem> Problems => InFileOrder(problems);

    /// <summary>The warnings in file order.</summary>
    public IReadOnlyList<Problem> Warnings => InFileOrder(warnings);

    /// <summary>How many refusals are not among <see cref="Problems"/>.</summary>
    public int Untold { get; private set; }

    /// <summary>Whether the scenario is refused.</summary>
    public bool IsRefused => problems.Count > 0;

    /// <summary>Whether a further refusal would only be counted.</summary>
    public bool IsFull => problems.Count >= MostKept;

    /// <summary>Findings of another reading of the same file.</summary>
    public Findings Fresh() => new(source);

    /// <summary>Adds a refusal.</summary>
    /// <param name="at">its place</param>
    /// <param name="key">dotted path of the key</param>
    /// <param name="fault">what was found</param>
    /// <param name="accepted">what would be accepted</param>
    /// <param name="isShown">whether the line of the place tells anything</param>
    public void Refuse(Position at, string key, string fault, string accepted, bool isShown = true)
    {
        Problem problem = new(at.Line, at.Column, key, fault, accepted);
        Add(at, isShown ? source.Show(problem) : problem);
    }

    /// <summary>Adds a refusal in another file, placed in the order by the key that names the file.</summary>
    public void Add(Position at, Problem problem)
    {
        if (IsFull)
            Untold++;
        else
            problems.Add((at, problem));
    }

    /// <summary>Adds a warning.</summary>
    public void Warn(Position at, string key, string fault, string accepted) =>
        warnings.Add((at, source.Show(new Problem(at.Line, at.Column, key, fault, accepted) { Severity = Severity.Warning })));

    /// <summary>Keeps a value for the echo.</summary>
    public void Note(UnderstoodValue value) => understood.Add(value);

    /// <summary>Makes a part of the plant; what the library refuses becomes a problem of the place.</summary>
    public T? Build<T>(Position at, string key, Func<T> part)
        where T : class
    {
        try
        {
            return part();
        }
        catch (ArgumentException e)
        {
            Refuse(at, key, e.Message.TrimEnd('.'), "");
            return null;
        }
    }

    private static List<Problem> InFileOrder(List<(Position At, Problem Problem)> found) =>
        [.. found.OrderBy(item => item.At.Line).ThenBy(item => item.At.Column).Select(item => item.Problem)];
}
