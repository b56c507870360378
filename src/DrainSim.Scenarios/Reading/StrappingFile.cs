using CsvHelper;
using DrainSim.Scenarios.Units;
using DrainSim.Scenarios.Yaml;
using DrainSim.Vessels;

namespace DrainSim.Scenarios.Reading;

/// <summary>The columns of a strapping table and what is wrong with its rows.</summary>
internal sealed class StrappingFile(BlockReader tank, string name, SourceText source)
{
    private const string HeaderHelp = "The first line names the columns with their units, such as level_m,volume_m3 or level (mm),volume (L)";

    private (int Column, Unit Unit) level;
    private (int Column, Unit Unit) volume;

    /// <summary>Whether a row or the header is refused.</summary>
    public bool IsRefused { get; private set; }

    /// <summary>Finds the columns in the first line.</summary>
    public bool TryHeader(CsvReader csv)
    {
        int line = (int)csv.LineNumber;
        bool isFound = TryColumn(csv, "level", Quantities.Length, line, out level);
        return TryColumn(csv, "volume", Quantities.Volume, line, out volume) && isFound;
    }

    /// <summary>Adds a row, when it is one and rises.</summary>
    public void AddRow(CsvReader csv, List<(double Level, double Volume)> rows)
    {
        int line = (int)csv.LineNumber;
        if (!TryCell(csv, level.Column, line, "level", out double h) || !TryCell(csv, volume.Column, line, "volume", out double v))
            return;
        (double Level, double Volume) row = (level.Unit.ToSi(h), volume.Unit.ToSi(v));
        if (rows.Count == 0 && row.Level != 0) // the first row is level 0 as written, not nearly
            Refuse(line, "the first row is not level 0", "Begin with level 0 and the volume below the dip point");
        else if (row.Volume < 0)
            Refuse(line, "the volume is below 0", "");
        else if (rows.Count > 0 && row.Level <= rows[^1].Level)
            Refuse(line, "the level does not rise from the row before", "A strapping table rises from row to row");
        else if (rows.Count > 0 && row.Volume <= rows[^1].Volume)
            Refuse(line, "the volume does not rise from the row before", "A strapping table rises from row to row");
        rows.Add(row);
    }

    /// <summary>Makes the vessel.</summary>
    public StrappingTable? Build(List<(double Level, double Volume)> rows)
    {
        if (rows.Count >= 2)
            return tank.BuildAt("file", () => new StrappingTable { Rows = rows });
        tank.Refuse("file", "the table has fewer than two rows", "Give a row for level 0 and one for the full tank at least");
        return null;
    }

    /// <summary>Refuses a line of the file.</summary>
    public void Refuse(int line, string fault, string accepted)
    {
        IsRefused = true;
        tank.Findings.Add(tank.PlaceOf("file"), source.Show(new Problem(line, 1, tank.PathOf("file"), fault, accepted) { File = name }));
    }

    private bool TryColumn(CsvReader csv, string what, Quantity quantity, int line, out (int, Unit) column)
    {
        column = default;
        int found = 0;
        for (int i = 0; i < csv.FieldCount; i++)
        {
            string title = csv.GetString(i).Trim();
            if (!title.StartsWith(what, StringComparison.OrdinalIgnoreCase))
                continue;
            string spelling = title[what.Length..].Trim(' ', '_', '(', ')', '[', ']', '/', ',');
            found++;
            if (quantity.Find(spelling) is { } unit)
            {
                column = (i, unit);
                continue;
            }
            Refuse(line, spelling.Length == 0 ? $"the column {Quote.Of(title)} has no unit"
                : $"the column {Quote.Of(title)} has a unit {Quote.Of(spelling)} that is no unit of {quantity.Name}", HeaderHelp);
            return false;
        }
        if (found != 1)
            Refuse(line, found == 0 ? $"there is no column of the {what}" : $"there are {found} columns of the {what}", HeaderHelp);
        return found == 1;
    }

    private bool TryCell(CsvReader csv, int column, int line, string what, out double number)
    {
        number = 0;
        string cell = column < csv.FieldCount ? csv.GetString(column).Trim() : "";
        if (NumberText.TryRead(cell, out number))
            return true;
        if (cell.Length == 0)
            Refuse(line, $"the {what} is missing", "");
        else if (cell.Contains(',', StringComparison.Ordinal))
            Refuse(line, $"{Quote.Of(cell)} has a comma", "Write a decimal point and no thousands sign");
        else
            Refuse(line, $"{Quote.Of(cell)} is not a finite number", "The unit stands in the first line");
        return false;
    }
}
