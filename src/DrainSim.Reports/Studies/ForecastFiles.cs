using DrainSim.Reports.Files;
using DrainSim.Reports.Pictures;

namespace DrainSim.Reports.Studies;

/// <summary>The files of a forecast.</summary>
public static class ForecastFiles
{
    /// <summary>What the files end in, behind the name.</summary>
    public static IReadOnlyList<string> Endings { get; } = [".forecast.csv", ".forecast.json", ".forecast.png"];

    /// <summary>Writes the readings with their residuals, the document and the picture: all of them whole, or none.</summary>
    /// <param name="folder">where they go; made where it is missing</param>
    /// <param name="report">the forecast and how it is told</param>
    /// <returns>their paths</returns>
    /// <exception cref="IOException">the disk refuses</exception>
    /// <exception cref="UnauthorizedAccessException">the folder or a file may not be written</exception>
    public static IReadOnlyList<string> Write(string folder, ForecastReport report)
    {
        ArgumentNullException.ThrowIfNull(report);
        using var output = new OutputFolder(folder);
        output.Write(report.Name + Endings[0], stream => ForecastTable.Write(stream, report.Result));
        output.Write(report.Name + Endings[1], stream => ForecastDocument.Write(stream, report));
        output.Write(report.Name + Endings[2], stream => ForecastPicture.Write(stream, report));
        return output.Complete();
    }
}
