namespace DrainSim.Gas;

/// <summary>What stands above the liquid in a tank.</summary>
/// <remarks>A closed set: the cases live beside this file.</remarks>
public abstract record Headspace
{
    private protected Headspace()
    {
    }
}
