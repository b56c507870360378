using System.Globalization;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Studies;
using DrainSim.Studies.Forecasting;

namespace DrainSim.Cli.Terminal;

/// <summary>What a forecast found, on the terminal.</summary>
internal static class ForecastBlock
{
    /// <summary>Most readings that are listed.</summary>
    private const int MostRows = 24;

    /// <summary>Writes the verdict, the estimates, the readings, what else may be going on, and where the files are.</summary>
    public static void Write(TextWriter output, ForecastReport report, IReadOnlyList<string> files)
    {
        ForecastResult result = report.Result;
        var format = new MeasureFormat(report.Units);
        output.WriteLine(report.Title);
        Paragraphs(output, "", ForecastWording.Sentence(report));
        output.WriteLine();
        output.WriteLine("What the readings say");
        foreach (Estimate estimate in result.Estimates)
            Paragraphs(output, "  - ", $"{estimate.Parameter.Path}: {ForecastWording.Text(estimate)}.");
        for (int i = 1; i < result.Estimates.Count; i++)
        {
            for (int j = 0; j < i && double.IsFinite(result.Correlation[i][j]); j++)
                Paragraphs(output, "  - ", string.Create(CultureInfo.InvariantCulture, $"Correlation of {result.Estimates[j].Parameter.Path} and {result.Estimates[i].Parameter.Path}: {result.Correlation[i][j]:0.00}."));
        }

        Paragraphs(output, "  - ", ForecastWording.Text(result, result.Separation));
        Paragraphs(output, "  - ", ForecastWording.Scatter(result, format));
        foreach (Alternative alternative in result.Alternatives)
            Paragraphs(output, "  - ", ForecastWording.Text(alternative, report));
        if (!result.IsConverged)
            Paragraphs(output, "  - ", "The search did not come to rest: take the values with care.");
        if (result.Residuals.Count <= MostRows)
            WriteReadings(output, report, format);
        output.WriteLine();
        output.WriteLine("Files: " + string.Join(", ", files));
    }

    private static void WriteReadings(TextWriter output, ForecastReport report, MeasureFormat format)
    {
        var table = new ColumnTable(
            new Column { Title = "reading", IsNumber = true }, new Column { Title = "level", IsNumber = true },
            new Column { Title = "curve", IsNumber = true }, new Column { Title = "less curve", IsNumber = true });
        foreach (ReadingResidual one in report.Result.Residuals)
        {
            table.Add(report.Clock is null ? MeasureFormat.Duration(one.Reading.Time) : report.Moment(one.Reading.Time),
                Level(one.Reading.Level), Level(one.Fitted), format.Length(one.Residual));
        }

        output.WriteLine();
        table.WriteText(output);

        string Level(double level)
        {
            Unit unit = format.LengthUnit(report.Result.Run.Job.Level);
            return unit.From(level).ToString("F3", CultureInfo.InvariantCulture) + " " + unit.Sign;
        }
    }

    private static void Paragraphs(TextWriter output, string bullet, string text)
    {
        foreach (string line in Paragraph.Lines(bullet + text, Paragraph.Width, hang: bullet.Length))
            output.WriteLine(line);
    }
}
