using System.CommandLine;
using DrainSim.Cli.Terminal;
using DrainSim.Reports.Measures;
using DrainSim.Scenarios;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies;

namespace DrainSim.Cli.Commands;

/// <summary>Finds the value of one parameter at which a result meets a target.</summary>
internal sealed class SizeCommand : ExplainedCommand
{
    private readonly StudyOptions study = new(hasThreads: false);

    private readonly Option<string?> parameter = new("--parameter", "-p")
    {
        Description = "The number to size, by its dotted path; the scenario's block 'size' names it unless given.",
        HelpName = "path",
    };

    private readonly Option<string?> target = new("--target", "-t")
    {
        Description = "What has to be met: a result and its value, or 'limits kept'.",
        HelpName = "result = value",
    };

    private readonly Option<string?> between = new("--between")
    {
        Description = "The range to search; found around the scenario's own value unless given.",
        HelpName = "from..to",
    };

    public SizeCommand() : base("size", "Finds the value of a parameter that meets a drain time, a heel or a margin.")
    {
        study.AddTo(this, parameter, target, between);
        SetAction(SizeAsync);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<Example> Examples =>
    [
        new("drainsim size rinse.yaml -p line.bore -t 'drain_time = 4 h'", "The bore that takes 4 h, and what the standard sizes beside it take."),
        new("drainsim size rinse.yaml -p line.path.outlet_valve.opening -t 'least_margin = 15 kPa' --between '5 %..100 %'", "How far to open the valve."),
        new("drainsim size rinse.yaml", "The sizing of the scenario's own block."),
    ];

    private async Task<int> SizeAsync(ParseResult parsed, CancellationToken cancellation)
    {
        TextWriter error = parsed.InvocationConfiguration.Error;
        string scenario = parsed.GetRequiredValue(study.Scenario);
        var request = new StudyRequest
        {
            Set = parsed.GetValue(study.Set) ?? [],
            Parameter = parsed.GetValue(parameter),
            Between = parsed.GetValue(between),
            Target = parsed.GetValue(target),
        };
        List<Problem> problems = [];
        if (SizePlan.Read(ScenarioDocument.Load(scenario), request, problems) is not { } plan)
            return StudyRefusal.Tell(error, scenario, problems);
        UnitSystem units = study.Units.For(parsed, plan.Scenario.Base);
        SizingResult result = await Task.Run(() => plan.Find(cancellation), cancellation);
        IReadOnlyList<StandardCase> standard = StandardCase.Beside(plan, result, units, cancellation);
        try
        {
            IReadOnlyList<string> files = await Task.Run(() => new SizeFiles(plan, result, standard, units).Write(parsed.GetRequiredValue(study.Folder)), cancellation);
            SizeBlock.Write(parsed.InvocationConfiguration.Output, plan, result, standard, files, units);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            await error.WriteLineAsync($"drainsim size: the output cannot be written: {fault.Message}");
            return ExitCode.NotWritten;
        }

        return result.Values.Any(value => !value.IsJump) ? ExitCode.Ran : ExitCode.NotAsExpected;
    }
}
