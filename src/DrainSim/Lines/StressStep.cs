namespace DrainSim.Lines;

/// <summary>The loss between two neighbouring nodes for a liquid that is not Newtonian, for one line.</summary>
internal readonly record struct StressStep
{
    /// <summary>Index of the wall of a straight run; −1 in front of any other node.</summary>
    public required int Wall { get; init; }

    /// <summary>Index of the bore at the node.</summary>
    public required int Bore { get; init; }

    /// <summary>(L/D)/(2·g·A²) of the run, s²/m⁵.</summary>
    public required double Pipe { get; init; }

    /// <summary>K∞/(2·g·A²), s²/m⁵.</summary>
    public required double Square { get; init; }

    /// <summary>K1/(2·g·A²), s²/m⁵.</summary>
    public required double Laminar { get; init; }

    /// <summary>1/(2·g·A²) of the bore at the node, s²/m⁵.</summary>
    public required double Jet { get; init; }

    /// <summary>Σ <see cref="Square"/> from the inlet, s²/m⁵.</summary>
    public required double SquareToHere { get; init; }

    /// <summary>Σ of the head that the yield stress holds, from the inlet, m.</summary>
    public required double YieldToHere { get; init; }
}
