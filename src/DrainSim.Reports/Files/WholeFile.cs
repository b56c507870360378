namespace DrainSim.Reports.Files;

/// <summary>Writes one file whole or not at all.</summary>
public static class WholeFile
{
    /// <summary>Writes beside the place and moves in; the folder is made where it is missing.</summary>
    /// <param name="path">where the file goes; an older one is replaced</param>
    /// <param name="write">writes its content</param>
    /// <exception cref="IOException">the disk refuses</exception>
    /// <exception cref="UnauthorizedAccessException">the file may not be written</exception>
    public static void Write(string path, Action<Stream> write)
    {
        using var folder = new OutputFolder(Path.GetDirectoryName(path) ?? ".");
        folder.Write(Path.GetFileName(path), write);
        folder.Complete();
    }
}
