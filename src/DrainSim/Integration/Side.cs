namespace DrainSim.Integration;

/// <summary>Which value is meant at a time when the state or its slope jumps.</summary>
public enum Side
{
    /// <summary>The last one before the jump.</summary>
    Before,

    /// <summary>The first one after the jump; of several jumps at one time, after them all.</summary>
    After,
}
