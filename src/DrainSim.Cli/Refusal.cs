using System.CommandLine;
using System.CommandLine.Parsing;
using DrainSim.Scenarios;

namespace DrainSim.Cli;

/// <summary>What is wrong with a command line, in one line.</summary>
internal static class Refusal
{
    /// <summary>The first fault of a command line and where to look; null when there is none.</summary>
    public static string? Of(ParseResult parsed)
    {
        Command command = parsed.CommandResult.Command;
        string? unmatched = parsed.UnmatchedTokens.Count > 0 ? parsed.UnmatchedTokens[0] : MisreadOption(parsed);
        if (unmatched is null && parsed.Errors.Count == 0)
            return null;
        if (unmatched is null && command is RootCommand)
            return "drainsim: no command is given; mostly it is 'drainsim run SCENARIO'. See 'drainsim --help'.";
        string fault = unmatched is not null
            ? Unmatched(unmatched, command)
            : parsed.Errors[0].Message.TrimEnd('.') + ".";
        string name = command is RootCommand ? "drainsim" : $"drainsim {command.Name}";
        return $"drainsim: {fault} See '{name} --help'.";
    }

    /// <summary>A word with a dash that was taken for an argument; behind a plain '--' it is meant as one.</summary>
    private static string? MisreadOption(ParseResult parsed) =>
        parsed.Tokens.Any(token => token.Type == TokenType.DoubleDash)
            ? null
            : parsed.CommandResult.Children.OfType<ArgumentResult>()
                .SelectMany(argument => argument.Tokens)
                .Select(token => token.Value)
                .FirstOrDefault(value => value.Length > 1 && value[0] == '-');

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
