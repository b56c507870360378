namespace DrainSim.Liquids;

/// <summary>How well defined a catalogue liquid is.</summary>
public enum LiquidCategory
{
    /// <summary>One substance.</summary>
    Pure,

    /// <summary>A solution of one stated strength.</summary>
    Solution,

    /// <summary>A product of the trade; the figures are those of a typical one.</summary>
    Commercial,
}
