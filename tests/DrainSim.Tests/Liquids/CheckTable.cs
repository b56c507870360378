using CsvHelper;

namespace DrainSim.Tests.Liquids;

/// <summary>A table of check values that lies beside the tests.</summary>
internal static class CheckTable
{
    /// <summary>All rows, each as text by column.</summary>
    public static List<IReadOnlyDictionary<string, string>> Rows(string folderAndFile)
    {
        using Stream stream = typeof(CheckTable).Assembly.GetManifestResourceStream("DrainSim.Tests." + folderAndFile)
            ?? throw new InvalidDataException(folderAndFile);
        using CsvReader reader = CsvReader.Create(stream);
        List<IReadOnlyDictionary<string, string>> rows = [];
        while (reader.Read())
            rows.Add(reader.Headers!.ToDictionary(column => column, reader.GetString));
        return rows;
    }

    /// <summary>The number in a column.</summary>
    public static double Number(this IReadOnlyDictionary<string, string> row, string column) =>
        NumberText.TryRead(row[column], out double value) ? value : throw new InvalidDataException(row[column]);

    /// <summary>The number in a column, or another where the column is empty.</summary>
    public static double Number(this IReadOnlyDictionary<string, string> row, string column, double otherwise) =>
        row[column].Length == 0 ? otherwise : row.Number(column);

    /// <summary>One line on a row that our value misses, or null where it is met.</summary>
    public static string? Miss(this IReadOnlyDictionary<string, string> row, double expected, double actual)
    {
        double difference = Math.Abs(actual / expected - 1);
        return difference <= row.Number("rel_tol")
            ? null
            : FormattableString.Invariant($"{string.Join(", ", row.Values)}: ours {actual:g9}, off by {difference:g3}");
    }
}
