using System.Text;
using DrainSim.Reports.Files;
using DrainSim.Reports.Pictures;
using DrainSim.Studies;
using DrainSim.Studies.Uncertainty;

namespace DrainSim.Reports.Studies;

/// <summary>The files of an uncertainty study.</summary>
public static class UncertaintyFiles
{
    /// <summary>What the files end in, behind the name.</summary>
    public static IReadOnlyList<string> Endings { get; } = [".uncertainty.csv", ".uncertainty.json", ".uncertainty.png"];

    /// <summary>Runs a study and writes its rows as they come, then its document and its picture: all of them whole, or none.</summary>
    /// <param name="folder">where they go; made where it is missing</param>
    /// <param name="name">name of the files, without ending</param>
    /// <param name="study">the study</param>
    /// <param name="columns">names of the parameters' columns</param>
    /// <param name="tell">how the result is told</param>
    /// <param name="progress">takes the number of runs done</param>
    /// <param name="cancellation">ends the study; nothing is left behind</param>
    /// <returns>the report and the paths</returns>
    /// <exception cref="IOException">the disk refuses</exception>
    /// <exception cref="UnauthorizedAccessException">the folder or a file may not be written</exception>
    /// <exception cref="ArgumentOutOfRangeException">no sample makes a job</exception>
    /// <exception cref="OperationCanceledException">the cancellation asked for it</exception>
    public static (UncertaintyReport Report, IReadOnlyList<string> Files) Write(
        string folder, string name, UncertaintyStudy study, IReadOnlyList<string> columns, Func<UncertaintyResult, UncertaintyReport> tell,
        Action<long> progress, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(study);
        ArgumentNullException.ThrowIfNull(tell);
        using var output = new OutputFolder(folder);
        UncertaintyResult? result = null;
        output.Write(name + Endings[0], stream => result = WriteRows(stream, study, columns, progress, cancellation));
        UncertaintyReport report = tell(result!);
        output.Write(name + Endings[1], stream => UncertaintyDocument.Write(stream, report));
        output.Write(name + Endings[2], stream => UncertaintyPicture.Write(stream, report));
        cancellation.ThrowIfCancellationRequested();
        return (report, output.Complete());
    }

    /// <summary>The columns are those of a sweep; a sample is a case.</summary>
    private static UncertaintyResult WriteRows(
        Stream stream, UncertaintyStudy study, IReadOnlyList<string> columns, Action<long> progress, CancellationToken cancellation)
    {
        using var rows = new StreamWriter(stream, new UTF8Encoding(false), leaveOpen: true) { NewLine = "\n" };
        using var table = new SweepTable();
        rows.Write(SweepTable.Header(columns));
        return study.Run(
            sample =>
            {
                ParameterCell[] cells = [.. sample.Values.Select(value => new ParameterCell(value, null))];
                rows.Write(table.Row(sample.Number + 1, cells, new CaseResult(sample.Run, sample.Fault ?? "")));
                progress(sample.Number + 1);
            },
            cancellation);
    }
}
