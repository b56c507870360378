using CsvHelper;
using Spectre.Console;

namespace DrainSim.Cli;

/// <summary>A table for the terminal or, with the same cells, for a spreadsheet.</summary>
/// <param name="columns">the columns, from the left</param>
internal sealed class ColumnTable(params IReadOnlyList<Column> columns)
{
    private const int Width = 110;

    private readonly List<IReadOnlyList<string>> rows = [];

    /// <summary>Lines under the table on the terminal: sources, units, what to mind.</summary>
    public IReadOnlyList<string> Notes { get; init; } = [];

    /// <summary>Adds a row with a cell for each column.</summary>
    public void Add(params IReadOnlyList<string> cells)
    {
        if (cells.Count != columns.Count)
            throw new ArgumentException($"a row of {cells.Count} cells in a table of {columns.Count} columns");
        rows.Add(cells);
    }

    /// <summary>Writes aligned columns; long texts are wrapped within theirs.</summary>
    public void WriteText(TextWriter output)
    {
        var table = new Table { Border = TableBorder.Simple, Width = null };
        foreach (Column column in columns)
            table.AddColumn(new TableColumn(new Text(column.Title)) { NoWrap = column.IsNarrow, Alignment = column.IsNumber ? Justify.Right : Justify.Left });
        foreach (IReadOnlyList<string> row in rows)
            table.AddRow(row.Select(cell => new Text(cell)));
        using var page = new StringWriter { NewLine = "\n" };
        IAnsiConsole console = AnsiConsole.Create(new AnsiConsoleSettings
        {
            Ansi = AnsiSupport.No,
            ColorSystem = ColorSystemSupport.NoColors,
            Interactive = InteractionSupport.No,
            Out = new AnsiConsoleOutput(page),
        });
        console.Profile.Width = Width;
        console.Profile.Capabilities.Unicode = true;
        console.Write(table);
        foreach (string line in page.ToString().Split('\n', StringSplitOptions.RemoveEmptyEntries))
        {
            if (!string.IsNullOrWhiteSpace(line))
                output.WriteLine(line.TrimEnd());
        }
        foreach (string note in Notes)
            output.WriteLine(note);
    }

    /// <summary>Writes a header of column keys and a record for each row.</summary>
    public void WriteCsv(TextWriter output)
    {
        using var page = new StringWriter { NewLine = "\n" };
        using (CsvWriter csv = CsvWriter.Create(page, new CsvWriterOptions { NewLine = "\n" }))
        {
            foreach (IReadOnlyList<string> record in rows.Prepend([.. columns.Select(column => column.Key)]))
            {
                foreach (string cell in record)
                    csv.WriteField(cell);
                csv.EndRecord();
            }
        }
        output.Write(page.ToString());
    }
}
