using DrainSim.Lines;
using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads a valve of a path.</summary>
internal static class ValveItemReader
{
    /// <summary>The valve; null when it is refused.</summary>
    /// <param name="block">the item</param>
    public static Valve? Read(BlockReader block)
    {
        ValveKind? kind = block.Row("valve", "valve", ValveTable.Find,
            () => ValveTable.All.Select(row => row.Id).Concat(ValveTable.Aliases.Select(alias => alias.Name)), "drainsim fittings");
        double opening = block.AmountOr("opening", Quantities.Ratio, Allowed.Share, 1, "100 %");
        block.AtMostOne("Give Kv or Cv, as the valve's sheet does", "kv", "cv");
        double? kv = Coefficient(block, "kv") ?? FlowCoefficient.KvPerCv * Coefficient(block, "cv");
        if (opening == 0)
            block.Warn("opening", "the valve is shut", "Nothing will flow");
        return kind is null ? null : block.Build(() => new Valve { Kind = kind, Opening = opening, FlowCoefficient = kv });
    }

    private static double? Coefficient(BlockReader block, string key) =>
        block.Amount(key, Quantities.FlowCoefficient, Allowed.Positive);
}
