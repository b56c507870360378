using System.Globalization;
using DrainSim.Studies.Sampling;
using DrainSim.Studies.Uncertainty;

namespace DrainSim.Scenarios.Studies;

/// <summary>Reads what an uncertainty study has to run.</summary>
public static class UncertaintyPlan
{
    /// <summary>Most samples: their percentiles need all of them in memory, some 900 bytes each.</summary>
    private const int MostSamples = 100_000;

    private const string Nothing = "Give --vary 'tank.level=normal(10 mm)', or a block 'uncertainty' with the key 'parameters'";

    /// <summary>The study of a scenario's block <c>uncertainty</c> and of what a caller adds to it.</summary>
    /// <param name="document">the scenario</param>
    /// <param name="request">what the caller adds</param>
    /// <param name="problems">takes everything that is wrong with the scenario, the block or the request</param>
    /// <returns>null when anything is wrong</returns>
    public static UncertaintyCase? Read(ScenarioDocument document, UncertaintyRequest request, List<Problem> problems)
    {
        ArgumentNullException.ThrowIfNull(document);
        ArgumentNullException.ThrowIfNull(request);
        ArgumentNullException.ThrowIfNull(problems);
        UncertaintyBlock block = document.StudyBlock(UncertaintyBlock.Read, new UncertaintyBlock(), problems);
        List<(string Path, SpreadText Spread)> spreads = Spreads(block, request, problems);
        ScenarioDocument set = StudyTexts.Set(document, new StudyBlock { Set = block.Set }, new StudyRequest { Set = request.Set }, problems);
        int samples = Count(request.Samples ?? block.Samples, "uncertainty.samples", 2 * SamplePlan.Repetitions, MostSamples, UncertaintyStudy.UsualSamples, problems);
        int seed = Count(request.Seed ?? block.Seed, "uncertainty.seed", 0, int.MaxValue, 1, problems);
        SamplingMethod method = Method(request.Sampling ?? block.Sampling, problems);
        if (problems.Count == 0 && spreads.Count is 0 or > SamplePlan.MostDimensions)
            Refuse(problems, "", spreads.Count == 0 ? "nothing is uncertain" : $"{spreads.Count} parameters are uncertain; at most {SamplePlan.MostDimensions} can be",
                spreads.Count == 0 ? Nothing : "Leave out those that matter least");
        if (problems.Count > 0 || VariedScenario.Find(set, [.. spreads.Select(one => (one.Path, one.Spread.Samples))], problems) is not { } scenario)
            return null;
        UncertainParameter[] parameters = Resolve(scenario, spreads, problems);
        RankCorrelation[] correlations = Correlations([.. block.Correlations, .. request.Correlate], scenario, problems);
        return problems.Count > 0 ? null : new UncertaintyCase(scenario, new UncertaintyStudy
        {
            Parameters = parameters,
            Make = scenario.Maker(),
            Correlations = correlations,
            Samples = samples,
            Seed = seed,
            Method = method,
        });
    }

    /// <summary>A whole number; the usual one where none is given.</summary>
    internal static int Count(string? text, string key, int least, int most, int usual, List<Problem> problems)
    {
        if (text is null)
            return usual;
        if (int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out int count) && count >= least && count <= most)
            return count;
        problems.Add(new Problem(0, 0, key, $"{Quote.Of(text)} is out of range",
            string.Create(CultureInfo.InvariantCulture, $"Give a whole number from {least} to {most}")));
        return usual;
    }

    private static void Refuse(List<Problem> problems, string key, string fault, string accepted) =>
        problems.Add(new Problem(0, 0, key.Length == 0 ? "uncertainty" : $"uncertainty.{key}", fault, accepted));

    private static List<(string Path, SpreadText Spread)> Spreads(UncertaintyBlock block, UncertaintyRequest request, List<Problem> problems)
    {
        List<(string Path, SpreadText Spread)> spreads = [];
        foreach ((string path, string text) in block.Parameters)
            Put(path, text);
        foreach (string text in request.Vary)
        {
            if (StudyTexts.TrySplit(text, problems, out string path, out string spread))
                Put(path, spread);
        }

        return spreads;

        void Put(string path, string text)
        {
            if (!SpreadText.TryRead(text, out SpreadText? spread))
                problems.Add(new Problem(0, 0, Quote.Plain(path), $"{Quote.Of(text)} is no spread", SpreadText.Help));
            else if (spreads.FindIndex(one => one.Path == path) is var index && index >= 0)
                spreads[index] = (path, spread);
            else
                spreads.Add((path, spread));
        }
    }

    private static SamplingMethod Method(string? text, List<Problem> problems)
    {
        if (text is not (null or "sobol" or "latin_hypercube"))
            Refuse(problems, "sampling", $"{Quote.Of(text)} is not known here", "Give 'sobol' or 'latin_hypercube'");
        return text == "latin_hypercube" ? SamplingMethod.LatinHypercube : SamplingMethod.Sobol;
    }

    private static UncertainParameter[] Resolve(
        VariedScenario scenario, List<(string Path, SpreadText Spread)> spreads, List<Problem> problems)
    {
        List<UncertainParameter> parameters = [];
        for (int i = 0; i < spreads.Count; i++)
        {
            StudyParameter parameter = scenario.Parameters[i];
            if (spreads[i].Spread.Resolve(parameter, out string fault, out string? source) is { } spread)
                parameters.Add(new UncertainParameter(parameter.Path, parameter.Quantity!.SiUnit is "1" ? "" : parameter.Quantity.SiUnit, spread) { Source = source });
            else
                problems.Add(new Problem(0, 0, Quote.Plain(parameter.Path), fault, ""));
        }

        return [.. parameters];
    }

    private static RankCorrelation[] Correlations(IReadOnlyList<string> texts, VariedScenario scenario, List<Problem> problems)
    {
        List<RankCorrelation> correlations = [];
        foreach (string text in texts)
        {
            string[] parts = text.Split('=', 2, StringSplitOptions.TrimEntries);
            int[] places = [.. parts[0].Split(',', StringSplitOptions.TrimEntries).Select(path => scenario.Parameters.ToList().FindIndex(one => one.Path == path))];
            if (parts.Length == 2 && places is [>= 0, >= 0] && places[0] != places[1] && NumberText.TryRead(parts[1], out double coefficient) && Math.Abs(coefficient) < 1)
                correlations.Add(new RankCorrelation(places[0], places[1], coefficient));
            else
                Refuse(problems, "correlations", $"{Quote.Of(text)} is no correlation of two of the parameters", "One reads 'tank.level, line.bore = 0.4', strictly between -1 and 1");
        }

        try
        {
            if (problems.Count == 0 && correlations.Count > 0)
                _ = new GaussianCopula(scenario.Parameters.Count, correlations);
        }
        catch (ArgumentOutOfRangeException contradiction)
        {
            Refuse(problems, "correlations", contradiction.Message.Split(" (Parameter", 2)[0], "");
        }

        return [.. correlations];
    }
}
