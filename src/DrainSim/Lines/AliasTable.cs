namespace DrainSim.Lines;

/// <summary>The trade words of every table of this folder.</summary>
internal static class AliasTable
{
    private static readonly Lazy<List<(string Table, Alias Alias)>> Rows = new(() =>
        EmbeddedTable.Rows("Lines.Tables.aliases.csv", row => (
            row.GetString("table"),
            new Alias(row.GetString("name"), row.GetString("target"), row.GetString("reason")))));

    /// <summary>The trade words of one table.</summary>
    public static IReadOnlyList<Alias> Of(string table) =>
        Rows.Value.Where(row => row.Table == table).Select(row => row.Alias).ToList().AsReadOnly();
}
