using System.CommandLine;
using DrainSim.Cli.Terminal;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Studies;
using DrainSim.Scenarios;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies;
using DrainSim.Studies.Uncertainty;

namespace DrainSim.Cli.Commands;

/// <summary>Runs a scenario with its uncertain numbers drawn at random.</summary>
internal sealed class UncertaintyCommand : ExplainedCommand
{
    private readonly StudyOptions study = new();

    private readonly Option<string[]> vary = new("--vary")
    {
        Description = "How far a parameter may lie off: normal(2.6 m, 10 mm), lognormal(38 mm, 5 %), uniform(36 mm, 40 mm), triangular(1 m, 2 m, 4 m); "
            + "with one width, normal(1 %), about the scenario's value; usual for the trade's own. Takes the place of the scenario's block for that parameter.",
        HelpName = "path=spread",
    };

    private readonly Option<string[]> correlate = new("--correlate")
    {
        Description = "Rank correlation of two of them, 'tank.level, line.bore = 0.4'.",
        HelpName = "path,path=number",
    };

    private readonly Option<string?> samples = new("--samples")
    {
        Description = "Number of runs, from 32 to 100000; 2048 unless given here or in the scenario.",
        HelpName = "number",
    };

    private readonly Option<string?> seed = new("--seed")
    {
        Description = "The same seed gives the same study; 1 unless given.",
        HelpName = "number",
    };

    private readonly Option<string?> sampling = new("--sampling")
    {
        Description = "How the samples lie: sobol, scrambled, unless given.",
        HelpName = "sobol|latin_hypercube",
    };

    public UncertaintyCommand() : base("uncertainty", "Says how sure a result is: bands of the level and the finish, chances, what matters most.")
    {
        sampling.AcceptOnly("way of sampling", ["sobol", "latin_hypercube"]);
        study.AddTo(this, vary, correlate, samples, seed, sampling);
        SetAction(RunAsync);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<Example> Examples =>
    [
        new("drainsim uncertainty rinse.yaml --vary 'tank.level=normal(10 mm)' --vary line.bore=usual", "Writes out/rinse.uncertainty.csv, .json and .png."),
        new("drainsim uncertainty rinse.yaml", "The study of the scenario's own block 'uncertainty'."),
    ];

    private async Task<int> RunAsync(ParseResult parsed, CancellationToken cancellation)
    {
        TextWriter error = parsed.InvocationConfiguration.Error;
        string scenario = parsed.GetRequiredValue(study.Scenario);
        var request = new UncertaintyRequest
        {
            Set = parsed.GetValue(study.Set) ?? [],
            Vary = parsed.GetValue(vary) ?? [],
            Correlate = parsed.GetValue(correlate) ?? [],
            Samples = parsed.GetValue(samples),
            Seed = parsed.GetValue(seed),
            Sampling = parsed.GetValue(sampling),
        };
        List<Problem> problems = [];
        if (UncertaintyPlan.Read(ScenarioDocument.Load(scenario), request, problems) is not { } plan)
            return StudyRefusal.Tell(error, scenario, problems);
        try
        {
            (UncertaintyReport report, IReadOnlyList<string> files) = await Task.Run(() => Run(parsed, plan, error, cancellation), cancellation);
            UncertaintyBlock.Write(parsed.InvocationConfiguration.Output, report, files);
            return ExitCode.Ran;
        }
        catch (ArgumentOutOfRangeException nothing)
        {
            await error.WriteLineAsync($"drainsim uncertainty: {nothing.Message}. Nothing was written.");
            return ExitCode.Refused;
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            await error.WriteLineAsync($"drainsim uncertainty: the output cannot be written: {fault.Message}");
            return ExitCode.NotWritten;
        }
    }

    private (UncertaintyReport, IReadOnlyList<string>) Run(ParseResult parsed, UncertaintyCase plan, TextWriter error, CancellationToken cancellation)
    {
        Scenario scenario = plan.Scenario.Base;
        UncertaintyStudy ready = plan.Study with { Runs = new OrderedRuns { Threads = study.ThreadsOf(parsed) } };
        using var progress = new ProgressLine(ProgressLine.Terminal(error), ready.Samples, 0);
        return UncertaintyFiles.Write(
            parsed.GetRequiredValue(study.Folder), scenario.Name, ready, [.. plan.Scenario.Parameters.Select(parameter => parameter.Column)],
            result => new UncertaintyReport
            {
                Name = scenario.Name,
                Title = scenario.Title,
                Result = result,
                Job = scenario.Job,
                Units = study.Units.For(parsed, scenario),
                Clock = scenario.Begins is { } begins ? new Clock(begins) : null,
            },
            progress.Show, cancellation);
    }
}
