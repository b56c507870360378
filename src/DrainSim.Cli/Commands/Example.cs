namespace DrainSim.Cli.Commands;

/// <summary>A command line that a help page shows.</summary>
/// <param name="Text">as it is typed</param>
/// <param name="Meaning">what it does, in one sentence</param>
internal sealed record Example(string Text, string Meaning);
