using DrainSim.Scenarios.Reading;
using DrainSim.Scenarios.Units;
using DrainSim.Studies.Forecasting;
using DrainSim.Studies.Sampling;

namespace DrainSim.Scenarios.Studies;

/// <summary>Reads what a forecast has to fit.</summary>
public static class ForecastPlan
{
    /// <summary>Resolution of a dip unless it is given, m: a stick or a tape read to half a centimetre.</summary>
    private const double UsualResolution = 0.005;

    /// <summary>The forecast of a scenario's block <c>forecast</c> and of what a caller adds to it.</summary>
    /// <param name="document">the scenario</param>
    /// <param name="request">what the caller adds</param>
    /// <param name="problems">takes everything that is wrong with the scenario, the block, the request or the readings</param>
    /// <returns>null when anything is wrong</returns>
    public static ForecastCase? Read(ScenarioDocument document, ForecastRequest request, List<Problem> problems)
    {
        ArgumentNullException.ThrowIfNull(document);
        ArgumentNullException.ThrowIfNull(request);
        ArgumentNullException.ThrowIfNull(problems);
        ForecastBlock block = document.StudyBlock(ForecastBlock.Read, new ForecastBlock(), problems);
        ScenarioDocument set = StudyTexts.Set(document, new StudyBlock { Set = block.Set }, new StudyRequest { Set = request.Set }, problems);
        IReadOnlyList<string> fit = request.Fit.Count > 0 ? request.Fit : block.Fit;
        string? path = FileOf(document, block, request, problems);
        if (fit.Count is 0 or >= SamplePlan.MostDimensions)
            problems.Add(new Problem(0, 0, "forecast.fit", fit.Count == 0 ? "nothing is fitted" : $"{fit.Count} parameters are fitted; at most {SamplePlan.MostDimensions - 1} can be",
                "Give --fit with the paths of one to three parameters, such as line.path.strainer.loss"));
        double resolution = Amount(request.Resolution ?? block.Resolution, "resolution", UsualResolution, problems);
        int seed = UncertaintyPlan.Count(request.Seed ?? block.Seed, "forecast.seed", 0, int.MaxValue, 1, problems);
        if (problems.Count > 0 || VariedScenario.Find(set, [.. fit.Select(one => (one, (IReadOnlyList<string>)[]))], problems) is not { } scenario)
            return null;
        double height = scenario.Base.Job.Vessel.Height;
        double gaugePoint = Amount(request.GaugePoint ?? block.GaugePoint, "gauge_point", height, problems);
        FittedParameter[] parameters = Parameters(scenario, problems);
        var frame = new ReadingsFrame(height, gaugePoint, resolution, scenario.Base.Begins);
        if (problems.Count > 0 || ReadingsReader.Read(path!, request.Readings ?? block.Readings!, frame, problems) is not { } sheet)
            return null;
        if (sheet.Readings.Count <= parameters.Length)
        {
            problems.Add(new Problem(0, 0, "", $"{sheet.Readings.Count} readings cannot tell {parameters.Length} parameters and their errors",
                $"Give {parameters.Length + 1} readings at least, better three times as many, or fit fewer")
            {
                File = Quote.Plain(request.Readings ?? block.Readings!),
            });
            return null;
        }

        return new ForecastCase(scenario, new ForecastStudy
        {
            Readings = sheet.Readings,
            Parameters = parameters,
            Make = scenario.Maker(),
            Seed = seed,
        }, sheet.Clock, Path.GetFullPath(path!));
    }

    private static string? FileOf(ScenarioDocument document, ForecastBlock block, ForecastRequest request, List<Problem> problems)
    {
        if (request.Readings is { } given)
            return given;
        if (block.Readings is not { } name)
            problems.Add(new Problem(0, 0, "forecast.readings", "is missing", "Give --readings with a CSV file of times and levels"));
        else if (StrappingFileReader.IsWithin(document.Folder, name, out string path))
            return path;
        else
            problems.Add(new Problem(0, 0, "forecast.readings", $"{Quote.Of(name)} leaves the scenario's folder", "Name a file in that folder or below it"));
        return null;
    }

    private static double Amount(string? text, string key, double usual, List<Problem> problems)
    {
        if (text is null)
            return usual;
        QuantityReading reading = QuantityText.Read(text, Quantities.Length);
        if (!reading.IsRefused && reading.Value > 0)
            return reading.Value;
        problems.Add(new Problem(0, 0, $"forecast.{key}", reading.Fault ?? $"{Quote.Of(text)} is not greater than 0", reading.Accepted ?? "Give a length"));
        return usual;
    }

    private static FittedParameter[] Parameters(VariedScenario scenario, List<Problem> problems)
    {
        List<FittedParameter> parameters = [];
        foreach (StudyParameter parameter in scenario.Parameters)
        {
            if (parameter is { Quantity: { } quantity, Base: { } value })
                parameters.Add(new FittedParameter(parameter.Path, quantity.SiUnit == "1" ? "" : quantity.SiUnit, value));
            else
                problems.Add(new Problem(0, 0, Quote.Plain(parameter.Path), parameter.Quantity is null ? "is a word; only numbers can be fitted" : "has no value to begin with",
                    parameter.Quantity is null ? "" : $"Set one: --set '{parameter.Path}=…'"));
        }

        return [.. parameters];
    }
}
