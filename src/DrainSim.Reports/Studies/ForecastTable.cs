using CsvHelper;
using DrainSim.Studies.Forecasting;

namespace DrainSim.Reports.Studies;

/// <summary>The readings beside the fitted curve, as CSV: SI, invariant, shortest round-trip numbers.</summary>
public static class ForecastTable
{
    /// <summary>The columns, in order.</summary>
    public static IReadOnlyList<string> Columns { get; } =
        ["time_s", "level_m", "resolution_m", "fitted_level_m", "residual_m", "standardised_residual"];

    /// <summary>Writes the table.</summary>
    /// <param name="stream">receives UTF-8; left open</param>
    /// <param name="result">the forecast</param>
    /// <exception cref="IOException">the stream refuses</exception>
    public static void Write(Stream stream, ForecastResult result)
    {
        ArgumentNullException.ThrowIfNull(result);
        using CsvWriter csv = CsvWriter.Create(stream, new CsvWriterOptions { NewLine = "\n" }, leaveOpen: true);
        csv.WriteRecord([.. Columns]);
        foreach (ReadingResidual one in result.Residuals)
        {
            csv.WriteField(one.Reading.Time);
            csv.WriteField(one.Reading.Level);
            csv.WriteField(one.Reading.Resolution);
            csv.WriteField(one.Fitted);
            csv.WriteField(one.Residual);
            csv.WriteField(one.Standardised);
            csv.EndRecord();
        }
    }
}
