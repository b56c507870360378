namespace DrainSim.Liquids;

/// <summary>Hazards of a liquid that the cautions of a run name.</summary>
[Flags]
public enum LiquidHazards
{
    /// <summary>No hazard of its own.</summary>
    None = 0,

    /// <summary>Flash point at or below 60 °C, or at or below the liquid's own temperature.</summary>
    Flammable = 1,

    /// <summary>Burns, though its flash point lies above 60 °C.</summary>
    Combustible = 2,

    /// <summary>Attacks skin, eyes or metal.</summary>
    Corrosive = 4,

    /// <summary>Poisonous by mouth, skin or breath.</summary>
    Toxic = 8,

    /// <summary>At or above 60 °C: scalds.</summary>
    Hot = 16,

    /// <summary>Harms soil, water or a sewer when released.</summary>
    Polluting = 32,
}
