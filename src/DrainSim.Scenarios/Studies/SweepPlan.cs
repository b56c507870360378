using DrainSim.Scenarios.Reading;

namespace DrainSim.Scenarios.Studies;

/// <summary>Reads what a sweep has to run.</summary>
public static class SweepPlan
{
    /// <summary>Most cases of one sweep.</summary>
    public const long MostCases = 1_000_000_000;

    /// <summary>The cases of a scenario's block <c>sweep</c> and of what a caller adds to it.</summary>
    /// <param name="document">the scenario</param>
    /// <param name="request">what the caller adds</param>
    /// <param name="problems">takes everything that is wrong with the scenario, the block or the request</param>
    /// <returns>null when anything is wrong</returns>
    public static SweepCases? Read(ScenarioDocument document, StudyRequest request, List<Problem> problems)
    {
        ArgumentNullException.ThrowIfNull(document);
        ArgumentNullException.ThrowIfNull(request);
        ArgumentNullException.ThrowIfNull(problems);
        StudyBlock block = document.StudyBlock("sweep", problems);
        List<(string Path, ValueList Values)> vary = Varied(block, request, problems);
        ScenarioDocument set = StudyTexts.Set(document, block, request, problems);
        string? cases = request.Cases ?? (request.Vary.Count > 0 ? null : block.Cases);
        if (problems.Count > 0)
            return null;
        if (vary.Count > 0 && cases is not null)
        {
            problems.Add(new Problem(0, 0, "sweep", "has values to vary beside a file of cases", "Give either"));
            return null;
        }

        return cases is not null ? Table(set, cases, request.Cases is null, problems)
            : vary.Count > 0 ? Grid(set, vary, problems)
            : Nothing(set, problems);
    }

    private static List<(string Path, ValueList Values)> Varied(StudyBlock block, StudyRequest request, List<Problem> problems)
    {
        List<(string Path, ValueList Values)> vary = request.Cases is null ? [.. block.Vary] : [];
        foreach (string text in request.Vary)
        {
            if (!StudyTexts.TrySplit(text, problems, out string path, out string values))
                continue;
            if (!ValueList.TryRead(values, out ValueList? list, out string fault))
                problems.Add(new Problem(0, 0, Quote.Plain(path), fault, ""));
            else if (vary.FindIndex(one => one.Path == path) is var index && index >= 0)
                vary[index] = (path, list);
            else
                vary.Add((path, list));
        }

        return vary;
    }

    private static SweepCases? Grid(ScenarioDocument document, List<(string Path, ValueList Values)> vary, List<Problem> problems)
    {
        if (VariedScenario.Find(document, [.. vary.Select(one => (one.Path, one.Values.Texts))], problems) is not { } scenario)
            return null;
        List<ValueList> axes = [];
        double count = 1;
        for (int i = 0; i < vary.Count; i++)
        {
            if (vary[i].Values.TryResolve(scenario.Parameters[i].Quantity, out ValueList? axis, out string fault))
                axes.Add(axis);
            else
                problems.Add(new Problem(0, 0, vary[i].Path, fault, ""));
            count *= vary[i].Values.Count;
        }

        if (count > MostCases)
            problems.Add(new Problem(0, 0, "sweep", $"makes {count:0.##e0} cases", $"The most are {MostCases}"));
        return problems.Count > 0 ? null : SweepCases.Grid(scenario, axes, (long)count);
    }

    private static SweepCases? Table(ScenarioDocument document, string name, bool isOfScenario, List<Problem> problems)
    {
        string file = name;
        if (isOfScenario && !StrappingFileReader.IsWithin(document.Folder, name, out file))
        {
            problems.Add(new Problem(0, 0, "sweep.cases", $"{Quote.Of(name)} leaves the scenario's folder", "Name a file in that folder or below it"));
            return null;
        }

        if (CaseTable.Read(file, name, problems) is not { } table)
            return null;
        (string, IReadOnlyList<string>)[] samples = [.. table.Paths.Select((path, column) => (path, table.Samples(column)))];
        if (VariedScenario.Find(document, samples, problems) is not { } scenario)
            return null;
        table.Resolve(scenario.Parameters);
        return problems.Count > 0 ? null : SweepCases.Rows(scenario, table);
    }

    private static SweepCases? Nothing(ScenarioDocument document, List<Problem> problems)
    {
        problems.AddRange(document.Read().Problems);
        if (problems.Count > 0)
            return null;
        problems.Add(new Problem(0, 0, "sweep", "nothing is varied",
            "Give --vary 'line.path.outer_leg.length=5 m..50 m in 10', or a block 'sweep' with the key 'vary'"));
        return null;
    }
}
