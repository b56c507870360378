using CsvHelper;
using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Studies;

/// <summary>The cases of a sweep as rows of a CSV file: a column for each parameter, headed by its path.</summary>
internal sealed class CaseTable
{
    /// <summary>Largest file that is read, bytes: about a million rows of two values.</summary>
    public const int LargestFile = 1 << 25;

    /// <summary>Most faults that are told.</summary>
    private const int MostProblems = 20;

    private const string TitleHelp = "A title is a parameter's path, such as tank.level, or tank.level (m) above bare numbers";

    private static readonly CsvReaderOptions Options = new()
    {
        HasHeader = false,
        CommentPrefix = '#',
        TrimWhitespace = true,
        TrackLineNumbers = true,
        AllowLineBreaksInQuotes = false,
    };

    private readonly string name;
    private readonly List<Problem> problems;
    private readonly int told;
    private readonly List<string> paths = [];
    private readonly List<string?> units = [];
    private readonly List<string[]> rows = [];
    private readonly List<int> lines = [];
    private ParameterValue[] values = [];

    private CaseTable(string name, List<Problem> problems) => (this.name, this.problems, told) = (name, problems, problems.Count);

    /// <summary>Dotted paths of the columns.</summary>
    public IReadOnlyList<string> Paths => paths;

    /// <summary>Full path of the file.</summary>
    public string FullPath { get; private init; } = "";

    /// <summary>Number of rows.</summary>
    public int Count { get; private set; }

    /// <summary>Reads a file; null, with problems, when it is refused.</summary>
    /// <param name="file">path of the file</param>
    /// <param name="name">its name for messages</param>
    /// <param name="problems">takes what is wrong</param>
    public static CaseTable? Read(string file, string name, List<Problem> problems)
    {
        var table = new CaseTable(Quote.Plain(name), problems) { FullPath = SafePath(file) };
        if (WholeText.TryRead(file, LargestFile, out string text, out string fault))
            table.ReadRows(text);
        else
            table.Refuse(0, "", fault, "");
        return problems.Count > table.told ? null : table;
    }

    /// <summary>The first texts of a column.</summary>
    /// <param name="column">index of the column</param>
    public IReadOnlyList<string> Samples(int column) => [.. rows.Take(3).Select(row => row[column])];

    /// <summary>Turns the texts into values once it is known what the columns are.</summary>
    /// <param name="parameters">what they are</param>
    public void Resolve(IReadOnlyList<StudyParameter> parameters)
    {
        values = new ParameterValue[Count * paths.Count];
        for (int row = 0; row < Count && problems.Count - told < MostProblems; row++)
        {
            for (int i = 0; i < paths.Count; i++)
            {
                ParameterValue value = values[row * paths.Count + i] = ParameterValue.Written(rows[row][i], parameters[i].Quantity);
                if (parameters[i].Quantity is { } quantity && !value.IsNumber)
                {
                    QuantityReading refused = QuantityText.Read(rows[row][i], quantity);
                    Refuse(lines[row], paths[i], refused.Fault!, refused.Accepted!);
                }
            }
        }

        rows.Clear();
        lines.Clear();
    }

    /// <summary>A value, once they are resolved.</summary>
    /// <param name="row">from 0</param>
    /// <param name="column">index of the parameter</param>
    public ParameterValue At(int row, int column) => values[row * paths.Count + column];

    /// <summary>The full path; the name as it is where it is none.</summary>
    private static string SafePath(string file) => file.Length == 0 || file.Contains('\0', StringComparison.Ordinal) ? file : Path.GetFullPath(file);

    private void ReadRows(string text)
    {
        try
        {
            using CsvReader csv = CsvReader.FromText(text, Options);
            if (!csv.Read())
                Refuse(0, "", "the file is empty", TitleHelp);
            else if (TryHeader(csv))
            {
                while (problems.Count - told < MostProblems && csv.Read())
                    AddRow(csv);
                Count = rows.Count;
                if (Count == 0 && problems.Count == told)
                    Refuse(0, "", "the file has no rows", "Each row below the titles is a case");
            }
        }
        catch (CsvFormatException e)
        {
            Refuse((int)e.LineNumber, "", "the row cannot be read", "A quotation mark may be open");
        }
    }

    private bool TryHeader(CsvReader csv)
    {
        for (int i = 0; i < csv.FieldCount; i++)
        {
            string title = csv.GetString(i).Trim();
            int bracket = title.IndexOf('(', StringComparison.Ordinal);
            bool hasUnit = bracket > 0 && title.EndsWith(')');
            string path = hasUnit ? title[..bracket].Trim() : title;
            if (path.Length == 0)
                Refuse((int)csv.LineNumber, "", $"column {i + 1} has no title", TitleHelp);
            else if (paths.Contains(path))
                Refuse((int)csv.LineNumber, "", $"the column {Quote.Of(path)} stands twice", TitleHelp);
            paths.Add(path);
            units.Add(hasUnit ? title[(bracket + 1)..^1].Trim() : null);
        }

        return problems.Count == told;
    }

    private void AddRow(CsvReader csv)
    {
        int line = (int)csv.LineNumber;
        if (csv.FieldCount != paths.Count)
        {
            Refuse(line, "", $"the row has {csv.FieldCount} cells and the first line {paths.Count}", "Each row has a cell for each column");
            return;
        }

        string[] row = new string[paths.Count];
        for (int i = 0; i < row.Length; i++)
        {
            string cell = csv.GetString(i).Trim();
            if (cell.Length == 0)
                Refuse(line, Quote.Plain(paths[i]), "the cell is empty", "Each row has a value for each parameter");
            row[i] = units[i] is { } unit ? $"{cell} {unit}" : cell;
        }

        rows.Add(row);
        lines.Add(line);
    }

    private void Refuse(int line, string key, string fault, string accepted) =>
        problems.Add(new Problem(line, line > 0 ? 1 : 0, key, fault, accepted) { File = name });
}
