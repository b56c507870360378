namespace DrainSim.Draining;

/// <summary>What a line discharges into, where it is not the open air.</summary>
/// <remarks>A closed set: the cases live beside this file.</remarks>
public abstract record Receiver
{
    private protected Receiver()
    {
    }
}
