using DrainSim.Scenarios.Units;
using DrainSim.Studies;

namespace DrainSim.Scenarios.Studies;

/// <summary>What a sizing has to find.</summary>
/// <param name="Scenario">the scenario with the parameter to size</param>
/// <param name="Target">what has to be met</param>
/// <param name="Range">the range to search, SI; null to find one around the parameter's value</param>
public sealed record SizePlan(VariedScenario Scenario, SizingTarget Target, (double From, double To)? Range)
{
    private const string TargetHelp = "A target reads 'drain_time = 4 h', 'left_volume = 50 L', 'least_margin = 15 kPa' or 'limits kept'";

    /// <summary>The parameter to size.</summary>
    public StudyParameter Parameter => Scenario.Parameters[0];

    /// <summary>The sizing of a scenario's block <c>size</c> and of what a caller adds to it.</summary>
    /// <param name="document">the scenario</param>
    /// <param name="request">what the caller adds</param>
    /// <param name="problems">takes everything that is wrong with the scenario, the block or the request</param>
    /// <returns>null when anything is wrong</returns>
    public static SizePlan? Read(ScenarioDocument document, StudyRequest request, List<Problem> problems)
    {
        ArgumentNullException.ThrowIfNull(document);
        ArgumentNullException.ThrowIfNull(request);
        ArgumentNullException.ThrowIfNull(problems);
        StudyBlock block = document.StudyBlock("size", problems);
        ScenarioDocument set = StudyTexts.Set(document, block, request, problems);
        string? path = request.Parameter ?? block.Parameter;
        string? between = request.Between ?? (request.Parameter is null ? block.Between : null);
        SizingTarget? target = TargetOf(request.Target ?? block.Target, problems);
        if (path is null)
            Refuse("size.parameter", "is missing", "Name the parameter to size, such as line.bore");
        string[] ends = between?.Split("..", StringSplitOptions.TrimEntries) ?? [];
        if (between is not null && ends.Length != 2)
            Refuse("size.between", $"{Quote.Of(between)} is no range", "A range reads 20 mm..80 mm");
        if (problems.Count > 0 || path is null || target is null)
            return null;
        if (VariedScenario.Find(set, [(path, ends)], problems) is not { } scenario)
            return null;
        StudyParameter parameter = scenario.Parameters[0];
        if (parameter.Quantity is not { } quantity)
            Refuse(path, "is no number", "Sizing changes a number, such as line.bore");
        else if (ends.Length == 2)
            return RangeOf(ends, quantity, path, problems) is { } range ? new SizePlan(scenario, target, range) : null;
        else if (parameter.Base is null)
            Refuse(path, "has no value in the scenario to begin from", "Give the range to search, such as 20 mm..80 mm");
        if (target.Quantity is null && scenario.Base.Job.Limits is null)
            Refuse("size.target", "the scenario has no limits to keep", "Give the block 'limits', or another target");
        return problems.Count > 0 ? null : new SizePlan(scenario, target, null);

        void Refuse(string key, string fault, string accepted) => problems.Add(new Problem(0, 0, key, fault, accepted));
    }

    /// <summary>Finds the values of the parameter.</summary>
    /// <param name="cancellation">ends the search early</param>
    /// <exception cref="OperationCanceledException">it was cancelled</exception>
    public SizingResult Find(CancellationToken cancellation = default)
    {
        CaseReader reader = Scenario.NewReader();
        return Range is { } range
            ? new Sizing { Target = Target, From = range.From, To = range.To }.Find(Run, cancellation)
            : Sizing.FindAround(Target, Parameter.Base!.Value, Run, cancellation);

        CaseResult Run(double value) => reader.Run([Parameter.Of(value)], cancellation);
    }

    private static SizingTarget? TargetOf(string? text, List<Problem> problems)
    {
        string[] parts = text?.Split('=', StringSplitOptions.TrimEntries) ?? [];
        if (parts is ["limits kept"])
            return SizingTarget.LimitsKept;
        if (parts.Length != 2)
        {
            problems.Add(new Problem(0, 0, "size.target", text is null ? "is missing" : $"{Quote.Of(text)} is no target", TargetHelp));
            return null;
        }

        if (ResultQuantity.Find(parts[0]) is not { } result)
        {
            IEnumerable<string> names = ResultQuantity.All.Select(quantity => quantity.Name);
            problems.Add(new Problem(0, 0, "size.target", $"no result is called {Quote.Of(parts[0])}",
                Nearest.Find(parts[0], names) is { } near ? $"did you mean {Quote.Of(near)}?" : $"The results are {string.Join(", ", names)}"));
            return null;
        }

        QuantityReading value = QuantityText.Read(parts[1], Quantities.All.First(quantity => quantity.SiUnit == result.SiUnit));
        if (!value.IsRefused)
            return SizingTarget.Of(result, value.Value);
        problems.Add(new Problem(0, 0, "size.target", value.Fault, value.Accepted));
        return null;
    }

    private static (double From, double To)? RangeOf(string[] ends, Quantity quantity, string path, List<Problem> problems)
    {
        QuantityReading from = QuantityText.Read(ends[0], quantity), to = QuantityText.Read(ends[1], quantity);
        QuantityReading wrong = from.IsRefused ? from : to;
        if (wrong.IsRefused)
            problems.Add(new Problem(0, 0, path, wrong.Fault, wrong.Accepted));
        else if (!(from.Value < to.Value))
            problems.Add(new Problem(0, 0, path, "the range does not rise", "Give the smaller end first"));
        else
            return (from.Value, to.Value);
        return null;
    }
}
