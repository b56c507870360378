using System.CommandLine;
using System.CommandLine.Help;
using System.CommandLine.Invocation;
using DrainSim.Cli.Commands;

namespace DrainSim.Cli;

/// <summary>A command's help, closed by its examples and, for the program as a whole, by the exit codes.</summary>
internal sealed class HelpWithExamples : SynchronousCommandLineAction
{
    private const int Width = 96;

    private readonly HelpAction plain;

    public HelpWithExamples(HelpAction plain)
    {
        this.plain = plain;
        plain.MaxWidth = Width;
    }

    /// <inheritdoc/>
    public override bool ClearsParseErrors => true;

    /// <inheritdoc/>
    public override int Invoke(ParseResult parseResult)
    {
        TextWriter output = parseResult.InvocationConfiguration.Output;
        using var page = new StringWriter { NewLine = "\n" };
        TextWriter asked = parseResult.InvocationConfiguration.Output;
        parseResult.InvocationConfiguration.Output = page;
        plain.Invoke(parseResult);
        parseResult.InvocationConfiguration.Output = asked;

        foreach (string line in page.ToString().TrimEnd().Split('\n'))
            output.WriteLine(line.TrimEnd());
        output.WriteLine();
        output.WriteLine("Examples:");
        foreach (Example example in ExamplesOf(parseResult.CommandResult.Command))
        {
            output.WriteLine($"  {example.Text}");
            output.WriteLine($"      {example.Meaning}");
        }
        if (parseResult.CommandResult.Command is RootCommand)
            WriteExitCodes(output);
        return ExitCode.Ran;
    }

    private static IReadOnlyList<Example> ExamplesOf(Command command) => command is ExplainedCommand explained
        ? explained.Examples
        :
        [
            new("drainsim new rinse --from over-the-rim", "Writes rinse.yaml, a scenario to fill in with your own numbers."),
            new("drainsim run rinse.yaml", "Says when the tank is empty; writes the curve and the tables into out/."),
        ];

    private static void WriteExitCodes(TextWriter output)
    {
        output.WriteLine();
        output.WriteLine("Exit codes:");
        output.WriteLine("  0    the job ran, whatever its outcome");
        output.WriteLine("  1    a limit of the scenario was broken, --expect was not met, or no size was found");
        output.WriteLine("  2    the scenario or the command line was refused; nothing was run");
        output.WriteLine("  3    an output could not be written");
        output.WriteLine("  70   a fault of the program itself");
        output.WriteLine("  130  interrupted");
    }
}
