namespace DrainSim.Studies.Forecasting;

/// <summary>What else might move the level.</summary>
public enum AlternativeKind
{
    /// <summary>A sharp-edged hole at the tank's lowest point.</summary>
    Leak,

    /// <summary>Something that runs in at a steady rate.</summary>
    Inflow,
}
