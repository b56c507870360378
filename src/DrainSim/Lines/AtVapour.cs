namespace DrainSim.Lines;

/// <summary>What happens when the low point reaches the vapour pressure.</summary>
public enum AtVapour
{
    /// <summary>The column parts and the siphon is finished.</summary>
    Break,

    /// <summary>
    /// The flow is held at the value that keeps the low point there, until the static lift alone is too much.
    /// </summary>
    Limit,
}
