using System.Globalization;
using CsvHelper;

namespace DrainSim;

/// <summary>A CSV table compiled into the library, read row by row.</summary>
internal static class EmbeddedTable
{
    private static readonly CsvReaderOptions Strict = new()
    {
        Separator = ',',
        MalformedData = CsvMalformedDataHandling.Throw,
        FieldCountMismatch = CsvFieldCountHandling.Throw,
    };

    /// <summary>All rows of a table, in file order.</summary>
    /// <param name="name">folder and file in the library, joined by points: <c>Liquids.liquids.csv</c></param>
    /// <param name="row">makes one row from the reader that stands on it</param>
    /// <exception cref="InvalidDataException">there is no such table</exception>
    public static List<T> Rows<T>(string name, Func<CsvReader, T> row)
    {
        using Stream stream = typeof(EmbeddedTable).Assembly.GetManifestResourceStream("DrainSim." + name)
            ?? throw new InvalidDataException($"the library holds no table {name}");
        using CsvReader reader = CsvReader.Create(stream, Strict);
        List<T> rows = [];
        while (reader.Read())
            rows.Add(row(reader));
        return rows;
    }

    /// <summary>The number in a column.</summary>
    /// <exception cref="InvalidDataException">the cell holds no number</exception>
    public static double Number(this CsvReader reader, string column) =>
        reader.NumberOrNull(column) ?? throw new InvalidDataException($"column {column} is empty");

    /// <summary>The number in a column, or null where the cell is empty.</summary>
    /// <exception cref="InvalidDataException">the cell holds something else</exception>
    public static double? NumberOrNull(this CsvReader reader, string column)
    {
        string text = reader.GetString(column);
        if (text.Length == 0)
            return null;
        return NumberText.TryRead(text, out double value)
            ? value
            : throw new InvalidDataException(string.Create(CultureInfo.InvariantCulture,
                $"column {column}: '{text}' is no number"));
    }

    /// <summary>The text in a column, or null where the cell is empty.</summary>
    public static string? TextOrNull(this CsvReader reader, string column) =>
        reader.GetString(column) is { Length: > 0 } text ? text : null;
}
