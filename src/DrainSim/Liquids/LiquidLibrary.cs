namespace DrainSim.Liquids;

/// <summary>The built-in liquids. Read at the first use, immutable afterwards.</summary>
public static class LiquidLibrary
{
    private static readonly Lazy<IReadOnlyList<CatalogueLiquid>> Liquids = new(LiquidTables.Read);

    private static readonly Lazy<Dictionary<string, CatalogueLiquid>> Index = new(() => All
        .SelectMany(liquid => liquid.Aliases.Append(liquid.Id), (liquid, name) => (name, liquid))
        .ToDictionary(entry => entry.name, entry => entry.liquid, StringComparer.OrdinalIgnoreCase));

    /// <summary>All liquids, in the order of the table.</summary>
    public static IReadOnlyList<CatalogueLiquid> All => Liquids.Value;

    /// <summary>The liquid of an id or another usual name; null when there is none.</summary>
    /// <param name="id">case does not matter, and a blank or a hyphen counts as an underscore: <c>Jet A-1</c> is <c>jet_a_1</c></param>
    public static CatalogueLiquid? Find(string id)
    {
        ArgumentNullException.ThrowIfNull(id);
        return Index.Value.GetValueOrDefault(id.Trim().Replace(' ', '_').Replace('-', '_'));
    }
}
