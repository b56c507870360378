namespace DrainSim.Lines;

/// <summary>Which way the opening of a line's inlet looks.</summary>
public enum InletFacing
{
    /// <summary>Down, as a dip leg or the end of a hose hung over the rim.</summary>
    Down,

    /// <summary>Sideways, as a nozzle in the wall.</summary>
    Side,

    /// <summary>Up, as a drain in the floor.</summary>
    Up,
}
