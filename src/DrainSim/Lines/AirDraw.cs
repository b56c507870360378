namespace DrainSim.Lines;

/// <summary>What follows when a vortex draws air into the inlet.</summary>
public enum AirDraw
{
    /// <summary>A warning; the line runs on.</summary>
    Warn,

    /// <summary>The line takes air and is finished.</summary>
    Break,
}
