namespace DrainSim.Lines;

/// <summary>A walk along a line at one flow that adds up the loss, node by node.</summary>
internal interface ILossWalk
{
    /// <summary>Head used up to the node reached, its velocity head included, m.</summary>
    double Used { get; }

    /// <summary>Head lost up to the node reached, m.</summary>
    double Lost { get; }

    /// <summary>Goes on to the next node; false behind the last.</summary>
    bool MoveNext();
}
