namespace DrainSim.Scenarios.Yaml;

/// <summary>Ends the loading of a file that cannot be read further.</summary>
internal sealed class YamlRefusal(Position at, string fault, string accepted) : Exception(fault)
{
    /// <summary>Where the reading stopped.</summary>
    public Position At { get; } = at;

    /// <summary>What would be accepted.</summary>
    public string Accepted { get; } = accepted;
}
