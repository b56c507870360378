using System.CommandLine;
using DrainSim.Cli.Terminal;
using DrainSim.Lines;

namespace DrainSim.Cli.Commands;

/// <summary>Shows the materials of pipes and hoses with their roughness.</summary>
internal sealed class MaterialsCommand() : TableCommand("materials", "Shows the materials of pipes and hoses.")
{
    /// <inheritdoc/>
    protected override ColumnTable Table(ParseResult parsed)
    {
        var table = new ColumnTable(
            new Column { Title = "material", Key = "id" },
            new Column { Title = "roughness, mm", Key = "roughness_mm", IsNumber = true },
            new Column { Title = "from", Key = "least_roughness_mm", IsNumber = true },
            new Column { Title = "to", Key = "most_roughness_mm", IsNumber = true },
            new Column { Title = "what it is", Key = "description", IsWrapped = true },
            new Column { Title = "source" },
            new Column { Key = "source" });
        var sources = new SourceNotes();
        foreach (Material row in MaterialTable.All)
            Add(table, sources, row.Id, row, row.Description, row.Source);
        foreach (Alias alias in MaterialTable.Aliases)
            Add(table, sources, alias.Name, MaterialTable.Find(alias.Name)!, $"the same as {alias.Target}", alias.Reason);
        table.Notes.AddRange(sources.Lines);
        return table;
    }

    private static void Add(
        ColumnTable table, SourceNotes sources, string id, Material row, string description, string source) =>
        table.Add(
            id,
            Exact(row.Roughness, 1000),
            Exact(row.LeastRoughness, 1000),
            Exact(row.MostRoughness, 1000),
            description,
            sources.NumberOf(source),
            source);
}
