using System.CommandLine;
using DrainSim.Cli.Terminal;
using DrainSim.Draining;
using DrainSim.Reports;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using DrainSim.Scenarios;

namespace DrainSim.Cli.Commands;

/// <summary>Runs scenarios, says how each ends and writes its files.</summary>
internal sealed class RunCommand : ExplainedCommand
{
    private readonly Argument<string[]> scenarios = new("scenario")
    {
        Description = "Scenario files; all are read before the first is run.",
        Arity = ArgumentArity.OneOrMore,
    };

    private readonly Option<string> folder = new("--out")
    {
        Description = "Folder for the files; made where it is missing. Older files of the same scenario are replaced.",
        HelpName = "folder",
        DefaultValueFactory = _ => "out",
    };

    private readonly Option<string?> expected = new("--expect")
    {
        Description = "Outcome that every run must have; the exit code is 1 when one has another.",
        HelpName = "outcome",
    };

    private readonly UnitChoice units = new();

    private readonly Option<bool> quiet = new("--quiet", "-q") { Description = "Says the verdict alone." };

    public RunCommand() : base("run", "Runs scenarios: the verdict, the level curve and the tables.")
    {
        expected.AcceptOnly("outcome", OutcomeCodes.All);
        Arguments.Add(scenarios);
        Options.Add(folder);
        Options.Add(expected);
        Options.Add(units.Option);
        Options.Add(quiet);
        SetAction(RunAsync);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<Example> Examples =>
    [
        new("drainsim run rinse.yaml", "Writes out/rinse.csv, .events.csv, .json, .png and .line.png."),
        new("drainsim run jobs/*.yaml --out results", "Runs several jobs and closes with one table of them."),
        new("drainsim run rinse.yaml --expect inlet_uncovered", "Ends with exit code 1 when the job ends otherwise."),
    ];

    private async Task<int> RunAsync(ParseResult parsed, CancellationToken cancellation)
    {
        TextWriter error = parsed.InvocationConfiguration.Error;
        string[] files = parsed.GetRequiredValue(scenarios);
        string target = parsed.GetRequiredValue(folder);
        if (ScenarioBatch.Read(files, error) is not { } batch)
            return ExitCode.Refused;
        if (OutputPlan.Clash(files, batch.InputFiles, target) is { } clash)
        {
            await error.WriteLineAsync($"drainsim run: {clash} Nothing was run and nothing was written.");
            return ExitCode.Refused;
        }
        var finished = new List<FinishedRun>();
        foreach (ScenarioReading reading in batch.Readings)
        {
            FinishedRun run = await Task.Run(() => Run(parsed, reading, target, cancellation), cancellation);
            finished.Add(run);
            Tell(parsed, run, isAlone: files.Length == 1);
        }
        if (files.Length > 1 && !parsed.GetValue(quiet))
            RunSummary.Write(parsed.InvocationConfiguration.Output, finished, target);
        return finished.Any(run => run.WriteFault is not null) ? ExitCode.NotWritten
            : finished.All(run => IsAsExpected(parsed, run) && KeepsLimits(run)) ? ExitCode.Ran
            : ExitCode.NotAsExpected;
    }

    private FinishedRun Run(ParseResult parsed, ScenarioReading reading, string target, CancellationToken cancellation)
    {
        Scenario scenario = reading.Scenario!;
        DrainResult result = Simulation.Run(scenario.Job, cancellation);
        var report = new RunReport
        {
            Name = scenario.Name,
            Result = result with { Remedies = RemedySearch.Find(result, cancellation) },
            Units = units.For(parsed, scenario),
            Clock = scenario.Begins is { } begins ? new Clock(begins) : null,
            Inputs = [.. scenario.Understood.Select(AsInput)],
        };
        return FinishedRun.Written(reading, report, target, cancellation);
    }

    private void Tell(ParseResult parsed, FinishedRun run, bool isAlone)
    {
        TextWriter output = parsed.InvocationConfiguration.Output;
        TextWriter error = parsed.InvocationConfiguration.Error;
        if (isAlone && !parsed.GetValue(quiet))
            VerdictBlock.Write(output, run);
        else
            VerdictBlock.WriteLine(output, run, isAlone, withWarnings: !parsed.GetValue(quiet));
        output.Flush();
        if (run.WriteFault is { } fault)
            error.WriteLine($"drainsim run: the files of '{run.Report.Name}' cannot be written: {fault}");
        if (!IsAsExpected(parsed, run))
        {
            error.WriteLine($"drainsim run: '{run.Report.Name}' was expected to end as {parsed.GetValue(expected)}, "
                + $"and it ends as {OutcomeCodes.Code(run.Report.Result.Outcome)}.");
        }
        foreach (LimitCheck check in run.Report.Result.LimitChecks.Where(check => !check.IsKept))
            error.WriteLine($"drainsim run: '{run.Report.Name}' breaks a limit: {LimitWording.Text(check, new MeasureFormat(run.Report.Units))}");
        error.Flush();
    }

    private static bool KeepsLimits(FinishedRun run) => run.Report.Result.LimitChecks.All(check => check.IsKept);

    private bool IsAsExpected(ParseResult parsed, FinishedRun run) =>
        parsed.GetValue(expected) is not { } code || code == OutcomeCodes.Code(run.Report.Result.Outcome);

    private static UnderstoodInput AsInput(UnderstoodValue value) => new()
    {
        Path = value.Path,
        Number = value.Value,
        Unit = value.Unit,
        Text = value.Value is null ? value.Written : null,
        AsWritten = value.IsDefault ? null : value.Written,
        IsDefault = value.IsDefault,
    };
}
