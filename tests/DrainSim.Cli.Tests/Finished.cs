namespace DrainSim.Cli.Tests;

/// <summary>What a process gave when it ended.</summary>
internal sealed record Finished(int ExitCode, string Output, string Error)
{
    public IReadOnlyList<string> OutputLines => Output.TrimEnd('\n').Split('\n');

    public IReadOnlyList<string> ErrorLines => Error.TrimEnd('\n').Split('\n');
}
