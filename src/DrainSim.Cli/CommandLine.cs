using System.CommandLine;
using System.CommandLine.Help;
using DrainSim.Cli.Commands;

namespace DrainSim.Cli;

/// <summary>The program from its arguments to its exit code.</summary>
internal static class CommandLine
{
    /// <summary>How long a command may take to end in good order after Ctrl-C.</summary>
    private static readonly TimeSpan EndsWithin = TimeSpan.FromSeconds(10);

    /// <summary>Runs one command line.</summary>
    /// <param name="args">the arguments, without the program's name</param>
    /// <param name="output">takes what was asked for</param>
    /// <param name="error">takes what went wrong</param>
    /// <returns>an <see cref="ExitCode"/></returns>
    public static async Task<int> RunAsync(string[] args, TextWriter output, TextWriter error)
    {
        try
        {
            ParseResult parsed = Tree().Parse(args, new ParserConfiguration { ResponseFileTokenReplacer = null });
            if (parsed.Action is not HelpWithExamples && Refusal.Of(parsed) is { } refusal)
            {
                await error.WriteLineAsync(refusal);
                return ExitCode.Refused;
            }
            return await InvokeAsync(parsed, output, error);
        }
        catch (OperationCanceledException)
        {
            await error.WriteLineAsync("drainsim: interrupted; files already finished are kept.");
            return ExitCode.Interrupted;
        }
        catch (IOException fault)
        {
            await error.WriteLineAsync($"drainsim: the output cannot be written: {fault.Message}");
            return ExitCode.NotWritten;
        }
#pragma warning disable CA1031 // the last resort: people get one line, not a stack trace
        catch (Exception fault)
#pragma warning restore CA1031
        {
            await error.WriteLineAsync($"drainsim: a fault of the program itself: {fault.GetType().Name}: {fault.Message}");
            return ExitCode.Fault;
        }
    }

    private static async Task<int> InvokeAsync(ParseResult parsed, TextWriter output, TextWriter error)
    {
        try
        {
            return await parsed.InvokeAsync(new InvocationConfiguration
            {
                Output = output,
                Error = error,
                EnableDefaultExceptionHandler = false,
                ProcessTerminationTimeout = EndsWithin,
            });
        }
        finally
        {
            await output.FlushAsync();
        }
    }

    private static RootCommand Tree()
    {
        var root = new RootCommand("Says how long a tank takes to empty by gravity, and whether it empties at all.")
        {
            new RunCommand(),
            new CheckCommand(),
            new SweepCommand(),
            new SizeCommand(),
            new UncertaintyCommand(),
            new ForecastCommand(),
            new NewCommand(),
            new LiquidsCommand(),
            new FittingsCommand(),
            new MaterialsCommand(),
            new SizesCommand(),
            new ShapesCommand(),
            new UnitsCommand(),
        };
        foreach (Option option in root.Options)
        {
            if (option is HelpOption { Action: HelpAction action } help)
                (help.Description, help.Action) = ("Shows this page.", new HelpWithExamples(action));
            else if (option is VersionOption)
                option.Description = "Shows the version.";
        }
        return root;
    }
}
