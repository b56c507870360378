namespace DrainSim.Lines;

/// <summary>The formula that a row's loss coefficient follows when the flow is turbulent.</summary>
public enum LossMethod
{
    /// <summary>K = p.</summary>
    Constant,

    /// <summary>K = p·f_T, Crane's equivalent length in bores times the fully rough friction factor.</summary>
    EquivalentLength,

    /// <summary>K = K∞·(1 + 1/ID), Hooper, with the inside diameter in inches.</summary>
    TwoK,

    /// <summary>K = Ki·(1 + Kd/NPS^0.3), Darby, with the nominal size in inches.</summary>
    ThreeK,
}
