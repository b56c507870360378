using DrainSim.Gas;
using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads <c>tank.headspace</c>: a word, or a block with a held pressure or with openings.</summary>
internal static class HeadspaceReader
{
    /// <summary>The gas over the liquid; open where the tank says nothing.</summary>
    /// <param name="tank">the block of the tank</param>
    public static Headspace Read(BlockReader tank)
    {
        if (tank.BlockIfAny("headspace") is { } block)
            return FromBlock(block) ?? new OpenHeadspace();
        bool isClosed = tank.Choice("headspace", false, ("open", false), ("closed", true));
        return isClosed ? new ClosedHeadspace() : new OpenHeadspace();
    }

    private static Headspace? FromBlock(BlockReader block)
    {
        if (block.Has("overpressure"))
            return Held(block);
        double exponent = block.AmountOr("polytropic_exponent", Quantities.Ratio, Allowed.Within(1, 1.67, "from 1 to 1.67"), 1, "1");
        double? initial = block.Amount("initial_pressure", Quantities.Pressure, Allowed.Positive);
        List<Opening> openings = OpeningReader.Read(block);
        block.Finish();
        return openings.Count == 0
            ? block.Build(() => new ClosedHeadspace { PolytropicExponent = exponent, InitialPressure = initial })
            : block.Build(() => new VentedHeadspace { PolytropicExponent = exponent, InitialPressure = initial, Openings = openings });
    }

    private static HeldPressure? Held(BlockReader block)
    {
        double? overpressure = block.Amount("overpressure", Quantities.Pressure, Allowed.NotNegative);
        foreach (string key in new[] { "polytropic_exponent", "initial_pressure", "vent", "vents", "relief_valve", "vacuum_break" })
        {
            if (block.Has(key))
                block.Refuse(key, "stands beside 'overpressure'", "A supply that holds the pressure leaves nothing to the gas and its openings");
        }
        block.Finish();
        return overpressure is { } p ? block.Build(() => new HeldPressure { Overpressure = p }) : null;
    }
}
