namespace DrainSim.Lines;

/// <summary>The loss between two neighbouring nodes, and the sums up to the second, for one line.</summary>
internal readonly record struct LossStep
{
    /// <summary>Index of the wall of a straight run; −1 in front of any other node.</summary>
    public required int Wall { get; init; }

    /// <summary>(L/D)/(2·g·A²) of the run, s²/m⁵.</summary>
    public required double Pipe { get; init; }

    /// <summary>K∞/(2·g·A²), s²/m⁵.</summary>
    public required double Square { get; init; }

    /// <summary>(K1·q/Re)/(2·g·A²), s/m².</summary>
    public required double Linear { get; init; }

    /// <summary>1/(2·g·A²) of the bore at the node, s²/m⁵.</summary>
    public required double Jet { get; init; }

    /// <summary>Reynolds number per flow in the bore at the node, s/m³.</summary>
    public required double ReynoldsPerFlow { get; init; }

    /// <summary>Σ <see cref="Square"/> from the inlet, s²/m⁵.</summary>
    public required double SquareToHere { get; init; }

    /// <summary>Σ <see cref="Linear"/> from the inlet, s/m².</summary>
    public required double LinearToHere { get; init; }

    /// <summary>Σ of the laminar friction 64/(Re/q)·<see cref="Pipe"/> from the inlet, s/m².</summary>
    public required double LaminarToHere { get; init; }

    /// <summary>Σ of the least friction factor at any Re from the inlet, s²/m⁵.</summary>
    public required double LeastToHere { get; init; }

    /// <summary>Σ of the friction at Re 4000 from the inlet, s²/m⁵: with the laminar sum, the most it uses.</summary>
    public required double LargestToHere { get; init; }
}
