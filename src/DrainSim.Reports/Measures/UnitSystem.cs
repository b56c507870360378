namespace DrainSim.Reports.Measures;

/// <summary>The family of units in which results are told to people; files stay SI.</summary>
public enum UnitSystem
{
    /// <summary>mm and m, L and m³, L/min, L/s and m³/h, kPa, °C.</summary>
    Metric,

    /// <summary>US customary: in and ft, gal, gpm, psi, °F.</summary>
    Us,
}
