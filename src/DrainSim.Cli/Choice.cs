using System.CommandLine;

namespace DrainSim.Cli;

/// <summary>An option whose value is one of a few words.</summary>
internal static class Choice
{
    /// <summary>Refuses every other word in one line that names all of them.</summary>
    /// <param name="option">the option</param>
    /// <param name="kind">what the words are, <c>outcome</c></param>
    /// <param name="words">the words, exact case</param>
    public static void AcceptOnly(this Option<string?> option, string kind, IReadOnlyList<string> words)
    {
        option.CompletionSources.Add([.. words]);
        option.Validators.Add(result =>
        {
            if (result.Tokens.Select(token => token.Value).FirstOrDefault(value => !words.Contains(value)) is { } other)
                result.AddError($"{option.Name}: '{other}' is no {kind}; there are {string.Join(", ", words)}.");
        });
    }
}
