using DrainSim.Reports;
using DrainSim.Reports.Files;

namespace DrainSim.Tests.Reports;

public sealed class RunFilesTests : IDisposable
{
    private readonly DirectoryInfo root = Directory.CreateTempSubdirectory("drainsim-");

    public void Dispose() => root.Delete(recursive: true);

    [Fact]
    public void A_run_leaves_five_files_and_nothing_else()
    {
        IReadOnlyList<string> paths = RunFiles.Write(root.FullName, Report(), TestContext.Current.CancellationToken);
        string[] names = ["rinse.csv", "rinse.events.csv", "rinse.json", "rinse.line.png", "rinse.png"];
        Assert.Equal(names, Names());
        Assert.Equal(names, paths.Select(path => Path.GetFileName(path)).Order(StringComparer.Ordinal));
    }

    [Fact]
    public void A_run_that_is_cancelled_leaves_nothing()
    {
        Assert.Throws<OperationCanceledException>(() =>
            RunFiles.Write(root.FullName, Report(), new CancellationToken(canceled: true)));
        Assert.Empty(Names());
    }

    [Fact]
    public void A_place_that_is_taken_by_a_folder_leaves_nothing()
    {
        root.CreateSubdirectory("rinse.png");
        Assert.ThrowsAny<IOException>(() =>
            RunFiles.Write(root.FullName, Report(), TestContext.Current.CancellationToken));
        Assert.Equal(["rinse.png"], Names());
    }

    private static RunReport Report() => new() { Name = "rinse", Result = new InventedRun().Result() };

    private string[] Names() =>
        [.. root.EnumerateFileSystemInfos().Select(info => info.Name).Order(StringComparer.Ordinal)];
}
