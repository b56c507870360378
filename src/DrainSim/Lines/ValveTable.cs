namespace DrainSim.Lines;

/// <summary>The built-in table of valves.</summary>
public static class ValveTable
{
    private static readonly Lazy<NamedRows<ValveKind>> Rows = new(Read);

    /// <summary>Every row, in the order of the table.</summary>
    public static IReadOnlyList<ValveKind> All => Rows.Value.All;

    /// <summary>The trade words that stand for a row.</summary>
    public static IReadOnlyList<Alias> Aliases => Rows.Value.Aliases;

    /// <summary>The row of that name or trade word; null when there is none.</summary>
    /// <param name="id">exact name, in lower case with underscores</param>
    public static ValveKind? Find(string id) => Rows.Value.Find(id);

    private static NamedRows<ValveKind> Read()
    {
        Dictionary<string, ValveCharacteristic> curves = ValveCurves.ById();
        var kinds = FittingRow.All
            .Where(row => row.Table is "valve" or "both")
            .Select(row => new ValveKind
            {
                Id = row.Id,
                Description = row.Description,
                Loss = row.Loss,
                Characteristic = curves[row.Curve ?? throw new InvalidDataException($"valve {row.Id} has no curve")],
                Source = row.Source,
            });
        return new(kinds.ToList(), kind => kind.Id, AliasTable.Of("valve"));
    }
}
