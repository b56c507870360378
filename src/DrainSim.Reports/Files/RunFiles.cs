using DrainSim.Reports.Pictures;
using DrainSim.Reports.Series;

namespace DrainSim.Reports.Files;

/// <summary>The files of one run.</summary>
public static class RunFiles
{
    /// <summary>
    /// Writes <c>NAME.csv</c>, <c>NAME.events.csv</c>, <c>NAME.json</c>, <c>NAME.png</c> and
    /// <c>NAME.line.png</c>: all of them whole, or none.
    /// </summary>
    /// <param name="folder">where they go; made where it is missing</param>
    /// <param name="report">the run and how it is told</param>
    /// <param name="cancellation">tested before every piece written; all of it is then taken away</param>
    /// <returns>their paths</returns>
    /// <exception cref="IOException">the disk refuses</exception>
    /// <exception cref="UnauthorizedAccessException">the folder or a file may not be written</exception>
    /// <exception cref="OperationCanceledException">the cancellation asked for it</exception>
    public static IReadOnlyList<string> Write(
        string folder, RunReport report, CancellationToken cancellation = default)
    {
        using var output = new OutputFolder(folder);
        foreach ((string ending, Action<Stream> write) in Contents(report))
        {
            cancellation.ThrowIfCancellationRequested();
            output.Write(report.Name + ending, stream => write(new StoppableStream(stream, cancellation)));
        }
        cancellation.ThrowIfCancellationRequested();
        return output.Complete();
    }

    private static (string Ending, Action<Stream> Write)[] Contents(RunReport report) =>
    [
        (".csv", stream => SeriesTables.WriteSeries(stream, report.Result, report.Clock)),
        (".events.csv", stream => SeriesTables.WriteEvents(stream, report.Result, report.Clock)),
        (".json", stream => ResultDocument.Write(stream, report)),
        (".png", stream => RunPicture.Write(stream, report)),
        (".line.png", stream => LinePicture.Write(stream, report)),
    ];
}
