using System.CommandLine;
using System.Globalization;
using DrainSim.Cli.Terminal;
using DrainSim.Scenarios.Units;

namespace DrainSim.Cli.Commands;

/// <summary>Shows the units in which a scenario gives its values.</summary>
internal sealed class UnitsCommand() : TableCommand("units", "Shows the units in which values are given.")
{
    /// <inheritdoc/>
    protected override ColumnTable Table(ParseResult parsed)
    {
        var table = new ColumnTable(
            new Column { Title = "quantity", Key = "quantity" },
            new Column { Title = "unit", Key = "unit" },
            new Column { Title = "also written", Key = "other_spellings", IsWrapped = true },
            new Column { Title = "is", Key = "definition", IsWrapped = true },
            new Column { Key = "offset", IsNumber = true },
            new Column { Title = "in SI", Key = "factor", IsNumber = true },
            new Column { Title = "", Key = "si_unit" });
        foreach (Quantity quantity in Quantities.All)
        {
            foreach (Unit unit in quantity.Units)
            {
                table.Add(
                    quantity.Name,
                    unit.Spelling,
                    string.Join(", ", unit.OtherSpellings),
                    unit.Definition,
                    Exact(unit.Offset),
                    unit.Factor.ToString("G10", CultureInfo.InvariantCulture),
                    quantity.SiUnit);
            }
        }
        table.Notes.Add("Capitals count: mPa is not MPa. A value may have several parts, the large unit first: 5 ft 3 in, 1 h 30 min.");
        table.Notes.Add("Pressures are absolute unless the key says otherwise.");
        return table;
    }
}
