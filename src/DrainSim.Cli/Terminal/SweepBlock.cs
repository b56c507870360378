using System.Globalization;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Studies;
using DrainSim.Scenarios.Studies;

namespace DrainSim.Cli.Terminal;

/// <summary>What a sweep found, on the terminal.</summary>
internal static class SweepBlock
{
    /// <summary>Most cases that are shown one by one.</summary>
    private const int MostRows = 24;

    /// <summary>Writes the counts, the extremes, the rows where they are few, and where the files are.</summary>
    /// <param name="output">takes the text</param>
    /// <param name="cases">the cases</param>
    /// <param name="path">their table</param>
    /// <param name="files">all files written</param>
    /// <param name="units">units for people</param>
    public static void Write(TextWriter output, SweepCases cases, string path, IReadOnlyList<string> files, UnitSystem units)
    {
        var format = new MeasureFormat(units);
        var digest = new SweepDigest();
        ColumnTable rows = Table(cases);
        bool isShort = cases.Count <= MostRows;
        foreach (SweepRow row in SweepRows.Read(path, cases.Scenario.Parameters.Count))
        {
            digest.Add(row);
            if (isShort)
                AddRow(rows, cases, row, format);
        }

        output.WriteLine(cases.Scenario.Base.Title);
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{cases.Count} cases over {string.Join(" and ", cases.Scenario.Parameters.Select(parameter => parameter.Path))}: {digest.Outcomes}."));
        foreach (string line in digest.Lines(format))
            output.WriteLine(line);
        if (isShort)
        {
            output.WriteLine();
            rows.WriteText(output);
        }

        output.WriteLine();
        output.WriteLine($"Files: {string.Join(", ", files)}");
    }

    private static ColumnTable Table(SweepCases cases) => new(
    [
        .. cases.Scenario.Parameters.Select(parameter => new Column { Title = parameter.Path, IsNumber = parameter.Quantity is not null }),
        new Column { Title = "outcome" },
        new Column { Title = "drain time", IsNumber = true },
        new Column { Title = "left", IsNumber = true },
        new Column { Title = "least margin", IsNumber = true },
        new Column { Title = "limits broken, reason", IsWrapped = true },
    ]);

    private static void AddRow(ColumnTable rows, SweepCases cases, SweepRow row, MeasureFormat format)
    {
        Span<ParameterValue> values = new ParameterValue[cases.Scenario.Parameters.Count];
        cases.Read(row.Case - 1, values);
        List<string> cells = [];
        for (int i = 0; i < values.Length; i++)
            cells.Add(values[i].Shown);
        rows.Add([.. cells, row.Outcome,
            row.DrainTime is { } time ? MeasureFormat.Duration(time) : "",
            row.LeftVolume is { } left ? format.Volume(left) : "",
            row.LeastMargin is { } margin ? format.Pressure(margin) : "",
            row.LimitsBroken.Length > 0 ? row.LimitsBroken : row.Reason]);
    }
}
