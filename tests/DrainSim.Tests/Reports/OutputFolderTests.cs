using DrainSim.Reports.Files;

namespace DrainSim.Tests.Reports;

public sealed class OutputFolderTests : IDisposable
{
    private readonly DirectoryInfo root = Directory.CreateTempSubdirectory("drainsim-");

    private string Folder => Path.Combine(root.FullName, "made", "here");

    public void Dispose() => root.Delete(recursive: true);

    [Fact]
    public void A_missing_folder_is_made_and_the_files_stand_in_it()
    {
        using (var output = new OutputFolder(Folder))
        {
            output.Write("a.txt", stream => stream.WriteByte(65));
            output.Write("b.txt", stream => stream.WriteByte(66));
            Assert.Equal(["a.txt.partial", "b.txt.partial"], Names());
            Assert.Equal([Path.Combine(Folder, "a.txt"), Path.Combine(Folder, "b.txt")], output.Complete());
        }
        Assert.Equal(["a.txt", "b.txt"], Names());
    }

    [Fact]
    public void A_failing_write_leaves_the_older_file_and_nothing_half_written()
    {
        WholeFile.Write(Path.Combine(Folder, "a.txt"), stream => stream.WriteByte(1));
        Assert.Throws<IOException>(() =>
        {
            using var output = new OutputFolder(Folder);
            output.Write("a.txt", stream => stream.WriteByte(2));
            output.Write("b.txt", stream =>
            {
                stream.WriteByte(3);
                throw new IOException("disk full");
            });
            output.Complete();
        });
        Assert.Equal(["a.txt"], Names());
        Assert.Equal([1], File.ReadAllBytes(Path.Combine(Folder, "a.txt")));
    }

    [Fact]
    public void A_folder_made_for_a_write_that_failed_is_taken_away()
    {
        Assert.Throws<IOException>(() =>
            WholeFile.Write(Path.Combine(Folder, "a.txt"), _ => throw new IOException("disk full")));
        Assert.False(Directory.Exists(Folder));
    }

    [Fact]
    public void A_file_in_the_place_of_the_folder_is_an_IO_fault()
    {
        string path = Path.Combine(root.FullName, "file");
        File.WriteAllText(path, "x");
        Assert.ThrowsAny<IOException>(() => new OutputFolder(path));
    }

    [Fact]
    public void A_folder_in_the_place_of_a_file_is_an_IO_fault_and_leaves_the_other_files_out()
    {
        Directory.CreateDirectory(Path.Combine(Folder, "b.txt"));
        Assert.ThrowsAny<IOException>(() =>
        {
            using var output = new OutputFolder(Folder);
            output.Write("a.txt", stream => stream.WriteByte(1));
            output.Write("b.txt", stream => stream.WriteByte(2));
            output.Complete();
        });
        Assert.Equal(["b.txt"], Names());
    }

    private string[] Names() =>
        [.. Directory.EnumerateFileSystemEntries(Folder).Select(path => Path.GetFileName(path)).Order(StringComparer.Ordinal)];
}
