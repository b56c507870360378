namespace DrainSim.Lines;

/// <summary>The built-in table of fittings; check and foot valves, which nobody sets, are in it too.</summary>
public static class FittingTable
{
    private static readonly Lazy<NamedRows<FittingKind>> Rows = new(Read);

    /// <summary>Every row, in the order of the table.</summary>
    public static IReadOnlyList<FittingKind> All => Rows.Value.All;

    /// <summary>The trade words that stand for a row.</summary>
    public static IReadOnlyList<Alias> Aliases => Rows.Value.Aliases;

    /// <summary>The row of that name or trade word; null when there is none.</summary>
    /// <param name="id">exact name, in lower case with underscores</param>
    public static FittingKind? Find(string id) => Rows.Value.Find(id);

    private static NamedRows<FittingKind> Read()
    {
        var kinds = FittingRow.All
            .Where(row => row.Table is "fitting" or "both")
            .Select(row => new FittingKind
            {
                Id = row.Id,
                Description = row.Description,
                Loss = row.Loss,
                Source = row.Source,
            });
        return new(kinds.ToList(), kind => kind.Id, AliasTable.Of("fitting"));
    }
}
