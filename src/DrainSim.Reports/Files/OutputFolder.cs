namespace DrainSim.Reports.Files;

/// <summary>Writes a set of files whole or not at all.</summary>
/// <remarks>
/// Each file is written beside its place as <c>NAME.partial</c>; <see cref="Complete"/> moves all of them in.
/// Disposed before that, it takes away what it wrote, and the folder too where it made it and nothing else is in it.
/// Only a failure between two moves can leave some of the files new and others old; none is ever half written.
/// </remarks>
public sealed class OutputFolder : IDisposable
{
    private readonly string folder;
    private readonly bool isMade;
    private readonly List<string> waiting = [];
    private bool isComplete;

    /// <summary>Opens a folder for writing and makes it where it is missing.</summary>
    /// <param name="path">the folder; relative to the current one, or absolute</param>
    /// <exception cref="IOException">the path is a file, or the disk refuses</exception>
    /// <exception cref="UnauthorizedAccessException">the folder may not be made</exception>
    public OutputFolder(string path)
    {
        folder = path.Length == 0 ? "." : path;
        isMade = !Directory.Exists(folder);
        Directory.CreateDirectory(folder);
    }

    /// <summary>Writes a file beside its place.</summary>
    /// <param name="name">name of the file in the folder</param>
    /// <param name="write">writes its content</param>
    /// <exception cref="IOException">the disk refuses</exception>
    /// <exception cref="UnauthorizedAccessException">the file may not be written</exception>
    public void Write(string name, Action<Stream> write)
    {
        string path = Path.Combine(folder, name);
        if (Directory.Exists(path))
        {
            throw new IOException($"'{path}' is a folder; a file of that name cannot be written");
        }
        using var stream = new FileStream(Partial(path), FileMode.Create, FileAccess.Write, FileShare.None);
        waiting.Add(path);
        write(stream);
    }

    /// <summary>Moves all files into their places, over older ones.</summary>
    /// <returns>their paths, in the order in which they were written</returns>
    /// <exception cref="IOException">the disk refuses</exception>
    /// <exception cref="UnauthorizedAccessException">an older file may not be replaced</exception>
    public IReadOnlyList<string> Complete()
    {
        foreach (string path in waiting)
        {
            File.Move(Partial(path), path, overwrite: true);
        }
        isComplete = true;
        return waiting;
    }

    /// <summary>Takes away what was not moved in.</summary>
    public void Dispose()
    {
        if (isComplete)
        {
            return;
        }
        try
        {
            waiting.ForEach(path => File.Delete(Partial(path)));
            if (isMade && !Directory.EnumerateFileSystemEntries(folder).Any())
            {
                Directory.Delete(folder);
            }
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            // The fault that led here is the one worth telling.
        }
    }

    private static string Partial(string path) => path + ".partial";
}
