using System.CommandLine;
using DrainSim.Cli.Terminal;

namespace DrainSim.Cli.Commands;

/// <summary>What every study is told on the command line.</summary>
internal sealed class StudyOptions(bool hasThreads = true)
{
    /// <summary>The scenario.</summary>
    public Argument<string> Scenario { get; } = new("scenario") { Description = "Scenario file." };

    /// <summary>Values to set.</summary>
    public Option<string[]> Set { get; } = new("--set")
    {
        Description = "Sets a parameter by its dotted path, as if it stood so in the file.",
        HelpName = "path=value",
    };

    /// <summary>Where the files go.</summary>
    public Option<string> Folder { get; } = new("--out")
    {
        Description = "Folder for the files; made where it is missing.",
        HelpName = "folder",
        DefaultValueFactory = _ => "out",
    };

    /// <summary>Number of threads.</summary>
    public Option<int> Threads { get; } = new("--threads")
    {
        Description = "Threads to run on; as many as the machine has cores unless given. The results do not depend on it.",
        HelpName = "number",
        CustomParser = result =>
        {
            string text = result.Tokens[0].Value;
            if (int.TryParse(text, System.Globalization.NumberStyles.None, System.Globalization.CultureInfo.InvariantCulture, out int count) && count is >= 1 and <= 1024)
                return count;
            result.AddError($"--threads: '{text}' is no number of threads; give a whole number from 1 to 1024.");
            return 1;
        },
    };

    /// <summary>Units for people.</summary>
    public UnitChoice Units { get; } = new();

    /// <summary>Adds them to a command.</summary>
    public void AddTo(Command command, params ReadOnlySpan<Option> own)
    {
        command.Arguments.Add(Scenario);
        foreach (Option option in own)
            command.Options.Add(option);
        command.Options.Add(Set);
        command.Options.Add(Folder);
        if (hasThreads)
            command.Options.Add(Threads);
        command.Options.Add(Units.Option);
    }

    /// <summary>The number of threads that the command line asks for.</summary>
    public int ThreadsOf(ParseResult parsed) =>
        parsed.GetResult(Threads) is { Implicit: false } ? parsed.GetValue(Threads) : Environment.ProcessorCount;
}
