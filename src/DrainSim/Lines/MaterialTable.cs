namespace DrainSim.Lines;

/// <summary>The built-in table of materials.</summary>
public static class MaterialTable
{
    private static readonly Lazy<NamedRows<Material>> Rows = new(Read);

    /// <summary>Every row, in the order of the table.</summary>
    public static IReadOnlyList<Material> All => Rows.Value.All;

    /// <summary>The trade words that stand for a row.</summary>
    public static IReadOnlyList<Alias> Aliases => Rows.Value.Aliases;

    /// <summary>The row of that name or trade word; null when there is none.</summary>
    /// <param name="id">exact name, in lower case with underscores</param>
    public static Material? Find(string id) => Rows.Value.Find(id);

    private static NamedRows<Material> Read()
    {
        List<Material> materials = EmbeddedTable.Rows("Lines.Tables.pipe-roughness.csv", row => new Material
        {
            Id = row.GetString("id"),
            Description = row.GetString("material"),
            Roughness = row.Number("roughness_mm") / 1000,
            LeastRoughness = row.NumberOrNull("min_mm") / 1000,
            MostRoughness = row.NumberOrNull("max_mm") / 1000,
            Source = row.GetString("source"),
        });
        return new(materials, material => material.Id, AliasTable.Of("material"));
    }
}
