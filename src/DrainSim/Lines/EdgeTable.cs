namespace DrainSim.Lines;

/// <summary>The built-in table of inlet edges.</summary>
public static class EdgeTable
{
    private static readonly Lazy<NamedRows<InletEdge>> Rows = new(Read);

    /// <summary>Every row, in the order of the table.</summary>
    public static IReadOnlyList<InletEdge> All => Rows.Value.All;

    /// <summary>The trade words that stand for a row.</summary>
    public static IReadOnlyList<Alias> Aliases => Rows.Value.Aliases;

    /// <summary>The row of that name or trade word; null when there is none.</summary>
    /// <param name="id">exact name, in lower case with underscores</param>
    public static InletEdge? Find(string id) => Rows.Value.Find(id);

    private static NamedRows<InletEdge> Read()
    {
        List<InletEdge> edges = EmbeddedTable.Rows("Lines.Tables.edges.csv", row => new InletEdge
        {
            Id = row.GetString("id"),
            Description = row.GetString("description"),
            Loss = row.Number("loss"),
            Source = row.GetString("source"),
        });
        return new(edges, edge => edge.Id, AliasTable.Of("edge"));
    }
}
