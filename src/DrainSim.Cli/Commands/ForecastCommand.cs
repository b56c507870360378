using System.CommandLine;
using DrainSim.Cli.Terminal;
using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Studies;
using DrainSim.Reports.Wording;
using DrainSim.Scenarios;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies;
using DrainSim.Studies.Forecasting;

namespace DrainSim.Cli.Commands;

/// <summary>Fits a scenario to the first readings of the job and tells when it will be over.</summary>
internal sealed class ForecastCommand : ExplainedCommand
{
    private readonly StudyOptions study = new();

    private readonly Option<string?> readings = new("--readings")
    {
        Description = "CSV file of times and levels; its first line names columns and units: 'time [min], level [mm]', 'clock, ullage [mm]', "
            + "with 'resolution [mm]' if it changes. Not needed where the scenario's block 'forecast' names one.",
        HelpName = "file",
    };

    private readonly Option<string[]> fit = new("--fit")
    {
        Description = "Parameters that the readings are to tell, by their dotted paths; those of the scenario's block unless given.",
        HelpName = "path",
        AllowMultipleArgumentsPerToken = true,
    };

    private readonly Option<string?> resolution = new("--resolution")
    {
        Description = "Smallest step of the dipstick or gauge; 5 mm unless given here or in the scenario.",
        HelpName = "length",
    };

    private readonly Option<string?> gaugePoint = new("--gauge-point")
    {
        Description = "Elevation of the point that ullages are measured from; the tank's top unless given.",
        HelpName = "length",
    };

    private readonly Option<string?> seed = new("--seed")
    {
        Description = "The same seed gives the same band; 1 unless given.",
        HelpName = "number",
    };

    public ForecastCommand() : base("forecast", "Says when a running job will be over, from the first readings of its level.")
    {
        study.AddTo(this, readings, fit, resolution, gaugePoint, seed);
        SetAction(RunAsync);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<Example> Examples =>
    [
        new("drainsim forecast rinse.yaml --readings dips.csv --fit line.path.strainer.loss tank.level", "Writes out/rinse.forecast.csv, .json and .png."),
        new("drainsim forecast rinse.yaml", "The forecast of the scenario's own block 'forecast'."),
    ];

    private async Task<int> RunAsync(ParseResult parsed, CancellationToken cancellation)
    {
        TextWriter error = parsed.InvocationConfiguration.Error;
        string scenario = parsed.GetRequiredValue(study.Scenario);
        var request = new ForecastRequest
        {
            Set = parsed.GetValue(study.Set) ?? [],
            Readings = parsed.GetValue(readings),
            Fit = parsed.GetValue(fit) ?? [],
            Resolution = parsed.GetValue(resolution),
            GaugePoint = parsed.GetValue(gaugePoint),
            Seed = parsed.GetValue(seed),
        };
        List<Problem> problems = [];
        if (ForecastPlan.Read(ScenarioDocument.Load(scenario), request, problems) is not { } plan)
            return StudyRefusal.Tell(error, scenario, problems);
        string folder = parsed.GetRequiredValue(study.Folder);
        if (ForecastFiles.Endings.Any(ending => Path.GetFullPath(Path.Combine(folder, plan.Scenario.Base.Name + ending)) == plan.ReadingsFile))
        {
            await error.WriteLineAsync($"drainsim forecast: the readings '{plan.ReadingsFile}' would be overwritten; name another folder with --out. Nothing was run and nothing was written.");
            return ExitCode.Refused;
        }

        try
        {
            ForecastReport report = await Task.Run(() => Report(parsed, plan, cancellation), cancellation);
            IReadOnlyList<string> files = await Task.Run(() => ForecastFiles.Write(folder, report), cancellation);
            ForecastBlock.Write(parsed.InvocationConfiguration.Output, report, files);
            return KeepsLimits(report, error) ? ExitCode.Ran : ExitCode.NotAsExpected;
        }
        catch (ArgumentOutOfRangeException impossible)
        {
            await error.WriteLineAsync($"drainsim forecast: {impossible.Message}. Nothing was written.");
            return ExitCode.Refused;
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            await error.WriteLineAsync($"drainsim forecast: the output cannot be written: {fault.Message}");
            return ExitCode.NotWritten;
        }
    }

    private ForecastReport Report(ParseResult parsed, ForecastCase plan, CancellationToken cancellation)
    {
        Scenario scenario = plan.Scenario.Base;
        ForecastStudy ready = plan.Study with { Runs = new OrderedRuns { Threads = study.ThreadsOf(parsed) } };
        return new ForecastReport
        {
            Name = scenario.Name,
            Title = scenario.Title,
            Result = ready.Run(cancellation),
            Units = study.Units.For(parsed, scenario),
            Clock = plan.Clock is { } clock ? new Clock(clock.Time) : null,
            HasDate = plan.Clock?.HasDate ?? false,
        };
    }

    private static bool KeepsLimits(ForecastReport report, TextWriter error)
    {
        LimitCheck[] broken = [.. report.Result.Run.LimitChecks.Where(check => !check.IsKept)];
        foreach (LimitCheck check in broken)
            error.WriteLine($"drainsim forecast: '{report.Name}' will break a limit: {LimitWording.Text(check, new MeasureFormat(report.Units))}");
        return broken.Length == 0;
    }
}
