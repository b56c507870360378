using System.CommandLine;
using DrainSim.Cli.Terminal;
using DrainSim.Reports.Measures;
using DrainSim.Scenarios;
using DrainSim.Scenarios.Studies;

namespace DrainSim.Cli.Commands;

/// <summary>Runs a scenario over many values of its parameters.</summary>
internal sealed class SweepCommand : ExplainedCommand
{
    private readonly StudyOptions study = new();

    private readonly Option<string[]> vary = new("--vary")
    {
        Description = "Varies a parameter over a list (25 mm, 32 mm), a range (5 m..50 m in 10) or a logarithmic range "
            + "(1 mm..1 m in 4 log); several make a grid. Takes the place of the scenario's block 'sweep' for that parameter.",
        HelpName = "path=values",
    };

    private readonly Option<string?> table = new("--cases")
    {
        Description = "CSV file whose rows are the cases; its first line names the parameters by their paths.",
        HelpName = "file",
    };

    private readonly Option<bool> resume = new("--resume")
    {
        Description = "Goes on with a sweep that was stopped: finished runs are kept, the others are run.",
    };

    private readonly Option<Shard?> shard = new("--shard")
    {
        Description = "Runs one part of the cases; the parts' tables joined in order are the whole table.",
        HelpName = "part/parts",
        CustomParser = result =>
        {
            if (Shard.TryRead(result.Tokens[0].Value, out Shard part))
                return part;
            result.AddError($"--shard: '{result.Tokens[0].Value}' is no part; the second of eight reads 2/8.");
            return null;
        },
    };

    public SweepCommand() : base("sweep", "Runs a scenario over many values of its parameters: a table and its picture.")
    {
        study.AddTo(this, vary, table, resume, shard);
        SetAction(SweepAsync);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<Example> Examples =>
    [
        new("drainsim sweep rinse.yaml --vary 'line.path.outer_leg.length=5 m..50 m in 10'", "Writes out/rinse.sweep.csv and .sweep.png."),
        new("drainsim sweep rinse.yaml --vary 'line.bore=25 mm, 32 mm, 38 mm' --vary 'tank.level=1 m..2.6 m in 9'", "A grid of 27 cases, drawn as a map."),
        new("drainsim sweep rinse.yaml --resume", "Goes on with the sweep of the scenario's own block after it was stopped."),
    ];

    private async Task<int> SweepAsync(ParseResult parsed, CancellationToken cancellation)
    {
        TextWriter error = parsed.InvocationConfiguration.Error;
        string scenario = parsed.GetRequiredValue(study.Scenario);
        var request = new StudyRequest
        {
            Set = parsed.GetValue(study.Set) ?? [],
            Vary = parsed.GetValue(vary) ?? [],
            Cases = parsed.GetValue(table),
        };
        List<Problem> problems = [];
        if (SweepPlan.Read(ScenarioDocument.Load(scenario), request, problems) is not { } cases)
            return StudyRefusal.Tell(error, scenario, problems);
        Shard part = parsed.GetValue(shard) ?? Shard.Whole;
        string folder = parsed.GetRequiredValue(study.Folder);
        string path = Path.Combine(folder, $"{cases.Scenario.Base.Name}.sweep{part.Suffix}.csv");
        if (cases.Scenario.InputFiles.Append(cases.TableFile).Contains(Path.GetFullPath(path)))
        {
            await error.WriteLineAsync($"drainsim sweep: '{path}' is read and would be overwritten; name another folder with --out. Nothing was run and nothing was written.");
            return ExitCode.Refused;
        }

        var run = new SweepRun(cases, part, path);
        try
        {
            await Task.Run(() => run.Run(parsed.GetValue(resume), study.ThreadsOf(parsed), ProgressLine.Terminal(error), cancellation), cancellation);
            await Task.Run(() => Tell(parsed, cases, part, path, cancellation), cancellation);
        }
        catch (OperationCanceledException)
        {
            await error.WriteLineAsync($"drainsim sweep: interrupted; the rows finished are kept beside '{path}', and --resume goes on with them.");
            return ExitCode.Interrupted;
        }
        catch (InvalidDataException fault)
        {
            await error.WriteLineAsync($"drainsim sweep: {fault.Message}; without --resume they are replaced.");
            return ExitCode.Refused;
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            await error.WriteLineAsync($"drainsim sweep: the output cannot be written: {fault.Message}");
            return ExitCode.NotWritten;
        }

        return ExitCode.Ran;
    }

    private void Tell(ParseResult parsed, SweepCases cases, Shard part, string path, CancellationToken cancellation)
    {
        TextWriter output = parsed.InvocationConfiguration.Output;
        if (!part.IsWhole)
        {
            output.WriteLine($"Part {part.Number} of {part.Of}: {path}");
            return;
        }

        UnitSystem units = study.Units.For(parsed, cases.Scenario.Base);
        string picture = Path.ChangeExtension(path, ".png");
        new SweepFigure(cases, units).Write(path, picture, cancellation);
        SweepBlock.Write(output, cases, path, [path, picture], units);
    }
}
