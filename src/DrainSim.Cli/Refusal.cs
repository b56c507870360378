using System.CommandLine;
using DrainSim.Scenarios;

namespace DrainSim.Cli;

/// <summary>What is wrong with a command line, in one line.</summary>
internal static class Refusal
{
    /// <summary>The first fault of a command line and where to look; null when there is none.</summary>
    public static string? Of(ParseResult parsed)
    {
        if (parsed.Errors.Count == 0)
            return null;
        Command command = parsed.CommandResult.Command;
        if (command is RootCommand && parsed.UnmatchedTokens.Count == 0)
            return "drainsim: no command is given; mostly it is 'drainsim run SCENARIO'. See 'drainsim --help'.";
        string fault = parsed.UnmatchedTokens.Count > 0
            ? Unmatched(parsed.UnmatchedTokens[0], command)
            : parsed.Errors[0].Message.TrimEnd('.') + ".";
        string name = command is RootCommand ? "drainsim" : $"drainsim {command.Name}";
        return $"drainsim: {fault} See '{name} --help'.";
    }

    private static string Unmatched(string token, Command command)
    {
        bool isOption = token.StartsWith('-');
        IEnumerable<string> known = isOption
            ? command.Options.Where(option => !option.Hidden).Select(option => option.Name)
            : command.Subcommands.Select(sub => sub.Name);
        string kind = isOption ? "option" : command.Subcommands.Count > 0 ? "command" : "argument";
        return Nearest.Find(token, known) is { } near
            ? $"no such {kind}: '{token}'; did you mean '{near}'?"
            : $"no such {kind}: '{token}'.";
    }
}
