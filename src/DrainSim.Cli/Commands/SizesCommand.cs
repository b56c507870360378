using System.CommandLine;
using DrainSim.Cli.Terminal;
using DrainSim.Lines;

namespace DrainSim.Cli.Commands;

/// <summary>Shows the nominal sizes of pipe and hose with their bores.</summary>
internal sealed class SizesCommand() : TableCommand("sizes", "Shows the nominal sizes of pipe and hose.")
{
    /// <inheritdoc/>
    protected override ColumnTable Table(ParseResult parsed)
    {
        var table = new ColumnTable(
            new Column { Title = "row", Key = "id" },
            new Column { Title = "kind", Key = "kind" },
            new Column { Title = "size", Key = "size" },
            new Column { Title = "or", Key = "size_in" },
            new Column { Title = "sched.", Key = "schedule", IsNumber = true },
            new Column { Title = "OD, mm", Key = "outside_diameter_mm", IsNumber = true },
            new Column { Title = "wall, mm", Key = "wall_mm", IsNumber = true },
            new Column { Title = "bore, mm", Key = "bore_mm", IsNumber = true },
            new Column { Title = "standard", Key = "standard", IsWrapped = true },
            new Column { Key = "source" });
        foreach (PipeSize row in SizeTable.All)
        {
            table.Add(
                row.Id,
                row.Kind,
                row.Nominal,
                row.NominalInches ?? "",
                row.Schedule ?? "",
                Exact(row.OutsideDiameter, 1000),
                Exact(row.Wall, 1000),
                Exact(row.Bore, 1000),
                row.Standard,
                row.Source);
        }
        table.Notes.Add($"A steel pipe without a schedule is taken as schedule {SizeTable.DefaultSchedule}.");
        table.Notes.Add("Source of every row: drainsim sizes --csv");
        return table;
    }
}
