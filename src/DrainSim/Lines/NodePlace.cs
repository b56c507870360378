namespace DrainSim.Lines;

/// <summary>Where a node stands on its line.</summary>
public enum NodePlace
{
    /// <summary>Just inside the inlet, behind its edge.</summary>
    Inlet,

    /// <summary>Behind a sudden change of bore, before the item that brings it; the node before is its other side.</summary>
    BehindBoreChange,

    /// <summary>Behind a path item.</summary>
    BehindItem,
}
