using System.CommandLine;

namespace DrainSim.Cli.Commands;

/// <summary>A command whose help closes with examples.</summary>
internal abstract class ExplainedCommand(string name, string description) : Command(name, description)
{
    /// <summary>One to three command lines that people really type.</summary>
    public abstract IReadOnlyList<Example> Examples { get; }
}
