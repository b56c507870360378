using System.Text;
using CsvHelper;

namespace DrainSim.Cli.Terminal;

/// <summary>A table for the terminal or for a spreadsheet.</summary>
/// <param name="columns">the columns, from the left</param>
internal sealed class ColumnTable(params IReadOnlyList<Column> columns)
{
    private const int Width = 110;
    private const int Gap = 2;

    /// <summary>No wrapped column is made narrower than this, characters.</summary>
    private const int LeastWidth = 20;

    private readonly List<IReadOnlyList<string>> rows = [];

    /// <summary>Lines under the table on the terminal: units, sources, what to mind.</summary>
    public List<string> Notes { get; } = [];

    /// <summary>Adds a row with a cell for each column.</summary>
    public void Add(params IReadOnlyList<string> cells)
    {
        if (cells.Count != columns.Count)
            throw new ArgumentException($"a row of {cells.Count} cells in a table of {columns.Count} columns");
        rows.Add(cells);
    }

    /// <summary>Writes aligned columns, then the notes.</summary>
    public void WriteText(TextWriter output)
    {
        int[] shown = [.. Enumerable.Range(0, columns.Count).Where(i => columns[i].Title is not null)];
        int[] widths = Widths(shown);
        WriteRow(output, shown, widths, [.. columns.Select(column => column.Title ?? "")]);
        output.WriteLine(new string('-', widths.Sum() + Gap * (widths.Length - 1)));
        foreach (IReadOnlyList<string> row in rows)
            WriteRow(output, shown, widths, row);
        if (Notes.Count > 0)
            output.WriteLine();
        foreach (string line in Notes.SelectMany(note => Paragraph.Lines(note, Width, hang: 4)))
            output.WriteLine(line);
    }

    /// <summary>Writes a header of column keys and a record for each row.</summary>
    public void WriteCsv(TextWriter output)
    {
        int[] shown = [.. Enumerable.Range(0, columns.Count).Where(i => columns[i].Key is not null)];
        using var page = new StringWriter { NewLine = "\n" };
        using (CsvWriter csv = CsvWriter.Create(page, new CsvWriterOptions { NewLine = "\n" }))
        {
            string[] header = [.. columns.Select(column => column.Key ?? "")];
            foreach (IReadOnlyList<string> record in rows.Prepend(header))
            {
                foreach (int i in shown)
                    csv.WriteField(record[i]);
                csv.EndRecord();
            }
        }
        output.Write(page.ToString());
    }

    /// <summary>Plain columns take what they need; wrapped ones share the rest by their longest cells.</summary>
    private int[] Widths(int[] shown)
    {
        int[] widths = [.. shown.Select(i => rows.Select(row => row[i].Length).Append(columns[i].Title!.Length).Max())];
        int plain = shown.Select((column, at) => columns[column].IsWrapped ? 0 : widths[at]).Sum();
        int wrapped = widths.Sum() - plain;
        int room = Width - plain - Gap * (shown.Length - 1);
        if (wrapped <= room)
            return widths;
        return [.. shown.Select((column, at) => columns[column].IsWrapped
            ? Math.Min(widths[at], Math.Max(LeastWidth, room * widths[at] / wrapped))
            : widths[at])];
    }

    private void WriteRow(TextWriter output, int[] shown, int[] widths, IReadOnlyList<string> cells)
    {
        string[][] lines = [.. shown.Select((column, at) => columns[column].IsWrapped
            ? Paragraph.Lines(cells[column], widths[at], hang: 0).ToArray()
            : [cells[column]])];
        for (int line = 0; line < lines.Max(cell => cell.Length); line++)
        {
            var text = new StringBuilder();
            for (int at = 0; at < shown.Length; at++)
            {
                string cell = line < lines[at].Length ? lines[at][line] : "";
                text.Append(columns[shown[at]].IsNumber ? cell.PadLeft(widths[at]) : cell.PadRight(widths[at]));
                text.Append(' ', Gap);
            }
            output.WriteLine(text.ToString().TrimEnd());
        }
    }
}
