namespace DrainSim.Lines;

/// <summary>Where and how the liquid enters a line.</summary>
public sealed record Inlet
{
    /// <summary>Elevation of the inlet's lowest edge above the tank's lowest inside point, m; at least 0.</summary>
    public required double Elevation { get; init => field = Require.NotNegative(value, "inlet elevation", "m"); }

    /// <summary>Which way the opening looks.</summary>
    public InletFacing Facing { get; init; } = InletFacing.Down;

    /// <summary>Loss coefficient of the edge on the velocity head in the line's first bore, 1; at least 0.</summary>
    public double EdgeLoss { get; init => field = Require.NotNegative(value, "inlet loss", ""); } = 0.78;

    /// <summary>Height of a rim that looks down above the floor, m; null where it is not known.</summary>
    public double? FloorClearance
    {
        get;
        init => field = value is { } clearance ? Require.Positive(clearance, "floor clearance", "m") : null;
    }

    /// <summary>What follows when the submergence no longer keeps air out.</summary>
    public AirDraw AirDraw { get; init; } = AirDraw.Warn;
}
