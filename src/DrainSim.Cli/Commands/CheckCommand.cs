using System.CommandLine;
using DrainSim.Cli.Terminal;
using DrainSim.Draining;
using DrainSim.Scenarios;

namespace DrainSim.Cli.Commands;

/// <summary>Reads scenarios, shows what was understood and the numbers at the first instant.</summary>
internal sealed class CheckCommand : ExplainedCommand
{
    private readonly Argument<string[]> scenarios = new("scenario")
    {
        Description = "Scenario files.",
        Arity = ArgumentArity.OneOrMore,
    };

    private readonly UnitChoice units = new();

    public CheckCommand() : base("check", "Reads scenarios: what was understood, and the numbers at the start.")
    {
        Arguments.Add(scenarios);
        Options.Add(units.Option);
        SetAction(Check);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<Example> Examples =>
    [
        new("drainsim check rinse.yaml", "Shows every value with its default, the flow at the start and the prime; writes nothing."),
        new("drainsim check jobs/*.yaml", "Tells every problem of every file."),
    ];

    private int Check(ParseResult parsed)
    {
        TextWriter output = parsed.InvocationConfiguration.Output;
        if (ScenarioBatch.Read(parsed.GetRequiredValue(scenarios), parsed.InvocationConfiguration.Error) is not { } batch)
            return ExitCode.Refused;
        bool isFirst = true;
        foreach (ScenarioReading reading in batch.Readings)
        {
            if (!isFirst)
                output.WriteLine();
            isFirst = false;
            FirstInstant first = Simulation.Begin(reading.Scenario!.Job);
            CheckBlock.Write(output, reading, first, units.For(parsed, reading.Scenario));
        }
        return ExitCode.Ran;
    }
}
