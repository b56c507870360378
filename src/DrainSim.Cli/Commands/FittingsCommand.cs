using System.CommandLine;
using DrainSim.Cli.Terminal;
using DrainSim.Lines;
using DrainSim.Reports.Measures;

namespace DrainSim.Cli.Commands;

/// <summary>Shows the fittings, valves and inlet edges with their losses.</summary>
internal sealed class FittingsCommand() : TableCommand("fittings", "Shows the fittings, valves and inlet edges.")
{
    /// <summary>Bore at which the table tells a loss coefficient, m.</summary>
    private const double Bore = 0.05;

    /// <inheritdoc/>
    protected override ColumnTable Table(ParseResult parsed)
    {
        var table = new ColumnTable(
            new Column { Title = "key", Key = "key" },
            new Column { Title = "name", Key = "id" },
            new Column { Title = "K", Key = "loss_coefficient_turbulent_50mm", IsNumber = true },
            new Column { Title = "K1", Key = "laminar_constant", IsNumber = true },
            new Column { Title = "what it is", Key = "description", IsWrapped = true },
            new Column { Title = "source" },
            new Column { Key = "source" });
        var sources = new SourceNotes();
        foreach (FittingKind row in FittingTable.All)
            Add(table, sources, "fitting", row.Id, row.Loss, row.Description, row.Source);
        foreach (Alias alias in FittingTable.Aliases)
            Add(table, sources, "fitting", alias.Name, FittingTable.Find(alias.Name)!.Loss, Meaning(alias), alias.Reason);
        foreach (ValveKind row in ValveTable.All)
            Add(table, sources, "valve", row.Id, row.Loss, row.Description, row.Source);
        foreach (Alias alias in ValveTable.Aliases)
            Add(table, sources, "valve", alias.Name, ValveTable.Find(alias.Name)!.Loss, Meaning(alias), alias.Reason);
        foreach (InletEdge row in EdgeTable.All)
            AddEdge(table, sources, row.Id, row.Loss, row.Description, row.Source);
        foreach (Alias alias in EdgeTable.Aliases)
            AddEdge(table, sources, alias.Name, EdgeTable.Find(alias.Name)!.Loss, Meaning(alias), alias.Reason);
        table.Notes.Add("K is the loss coefficient on the local velocity head in turbulent flow in a 50 mm bore; valves fully open.");
        table.Notes.Add("K1/Re is added to it where there is a K1: the rise in slow, viscous flow.");
        table.Notes.AddRange(sources.Lines);
        return table;
    }

    private static void Add(
        ColumnTable table, SourceNotes sources, string key, string id, LossLaw loss, string description, string source)
    {
        string laminar = loss.LaminarConstant > 0 ? MeasureFormat.Number(loss.LaminarConstant) : "";
        table.Add(key, id, MeasureFormat.Number(loss.Turbulent(Bore)), laminar, description, sources.NumberOf(source), source);
    }

    private static void AddEdge(
        ColumnTable table, SourceNotes sources, string id, double loss, string description, string source) =>
        table.Add("edge", id, MeasureFormat.Number(loss), "", description, sources.NumberOf(source), source);

    private static string Meaning(Alias alias) => $"the same as {alias.Target}";
}
