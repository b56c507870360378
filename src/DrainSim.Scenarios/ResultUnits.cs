namespace DrainSim.Scenarios;

/// <summary>The family of units that a scenario asks its results in; files stay SI.</summary>
public enum ResultUnits
{
    /// <summary>Metric units of the trade.</summary>
    Metric,

    /// <summary>US customary units.</summary>
    Us,
}
