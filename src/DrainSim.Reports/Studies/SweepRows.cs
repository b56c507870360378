using CsvHelper;

namespace DrainSim.Reports.Studies;

/// <summary>Reads the table of a sweep.</summary>
public static class SweepRows
{
    private static readonly CsvReaderOptions Options = new() { HasHeader = false };

    /// <summary>The rows, one after the other, so that a long table needs no more room than a short one.</summary>
    /// <param name="path">the table, with its first line</param>
    /// <param name="parameters">number of its parameters</param>
    /// <exception cref="IOException">it cannot be read</exception>
    public static IEnumerable<SweepRow> Read(string path, int parameters)
    {
        using CsvReader csv = CsvReader.FromFile(path, Options);
        foreach (SweepRow row in Rows(csv, parameters))
            yield return row;
    }

    /// <summary>The rows of a table that is no file.</summary>
    /// <param name="text">the table, with its first line</param>
    /// <param name="parameters">number of its parameters</param>
    public static IEnumerable<SweepRow> ReadText(string text, int parameters)
    {
        using CsvReader csv = CsvReader.FromText(text, Options);
        foreach (SweepRow row in Rows(csv, parameters))
            yield return row;
    }

    private static IEnumerable<SweepRow> Rows(CsvReader csv, int parameters)
    {
        csv.Read();
        while (csv.Read())
        {
            yield return new SweepRow
            {
                Case = long.Parse(csv.GetString(0), System.Globalization.CultureInfo.InvariantCulture),
                Parameters = [.. Enumerable.Range(1, parameters).Select(csv.GetString)],
                Outcome = Text("outcome"),
                Reason = Text("reason"),
                DrainTime = Number("drain_time_s"),
                LeftVolume = Number("left_volume_m3"),
                LeastMargin = Number("least_margin_Pa"),
                LimitsBroken = Text("limits_broken"),
            };
        }

        string Text(string column) => csv.GetString(1 + parameters + IndexOf(column));

        double? Number(string column) => NumberText.TryRead(Text(column), out double number) ? number : null;
    }

    private static int IndexOf(string column)
    {
        int index = 0;
        while (SweepTable.Results[index] != column)
            index++;
        return index;
    }
}
