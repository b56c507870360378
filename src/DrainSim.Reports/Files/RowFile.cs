using System.Globalization;
using System.Text;

namespace DrainSim.Reports.Files;

/// <summary>A table that a study writes row by row, and goes on with after it was stopped at any moment.</summary>
/// <remarks>
/// The rows stand in <c>FILE.partial</c> until all are there; then the file is moved in. <c>FILE.state</c> tells what
/// the rows were made of and is open to one process alone while it writes, which the system ends however the process
/// ends: two runs cannot mix their rows. A last line that was cut short is taken away when the work goes on.
/// </remarks>
public sealed class RowFile : IDisposable
{
    /// <summary>How often rows are given to the system at least, ms; a killed process loses no more of its work.</summary>
    private const int FlushEvery = 200;

    private static readonly UTF8Encoding Utf8 = new(encoderShouldEmitUTF8Identifier: false);

    private readonly string path;
    private readonly FileStream state;
    private StreamWriter? rows;
    private long flushedAt = Environment.TickCount64;

    private RowFile(string path, FileStream state) => (this.path, this.state) = (path, state);

    /// <summary>Number of rows that stood there from an earlier run.</summary>
    public long Finished { get; private set; }

    private string Partial => path + ".partial";

    /// <summary>Opens a table for writing.</summary>
    /// <param name="path">where it goes; the folder is made where it is missing</param>
    /// <param name="header">its first line with the line feed; empty for a table without one</param>
    /// <param name="count">number of rows that it will have</param>
    /// <param name="origin">what the rows are made of, one line</param>
    /// <param name="goesOn">whether finished rows of the same origin are kept</param>
    /// <exception cref="IOException">another process writes it, or the disk refuses</exception>
    /// <exception cref="UnauthorizedAccessException">it may not be written</exception>
    /// <exception cref="InvalidDataException">the rows that stand there are of another origin</exception>
    public static RowFile Open(string path, string header, long count, string origin, bool goesOn)
    {
        ArgumentNullException.ThrowIfNull(header);
        Directory.CreateDirectory(Path.GetDirectoryName(Path.GetFullPath(path))!);
        if (Directory.Exists(path))
            throw new IOException($"'{path}' is a folder; a file of that name cannot be written");
        var file = new RowFile(path, Locked(path + ".state", path));
        try
        {
            file.Begin(header, count, origin, goesOn);
            return file;
        }
        catch
        {
            file.Dispose();
            throw;
        }
    }

    /// <summary>Adds a row.</summary>
    /// <param name="row">the row with its line feed</param>
    /// <exception cref="IOException">the disk refuses</exception>
    public void Append(string row)
    {
        rows!.Write(row);
        long now = Environment.TickCount64;
        if (now - flushedAt >= FlushEvery)
        {
            rows.Flush();
            flushedAt = now;
        }
    }

    /// <summary>Moves the finished table in, over an older one.</summary>
    /// <exception cref="IOException">the disk refuses</exception>
    public void Complete()
    {
        rows?.Dispose();
        rows = null;
        File.Move(Partial, path, overwrite: true);
    }

    /// <summary>Keeps the rows written so far and lets another process write.</summary>
    public void Dispose()
    {
        rows?.Dispose();
        state.Dispose();
    }

    private static FileStream Locked(string statePath, string path)
    {
        try
        {
            return new FileStream(statePath, FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None);
        }
        catch (IOException fault) when (File.Exists(statePath))
        {
            throw new IOException($"'{path}' is being written by another run; name another folder with --out", fault);
        }
    }

    private void Begin(string header, long count, string origin, bool goesOn)
    {
        bool isThere = File.Exists(Partial) || File.Exists(path);
        string before = new StreamReader(state, Utf8).ReadLine() ?? "";
        if (goesOn && isThere && before != origin)
            throw new InvalidDataException($"the rows in '{path}' were made of another scenario, other values or another version");
        state.SetLength(0);
        state.Write(Utf8.GetBytes(origin + "\n"));
        state.Flush();
        if (goesOn && !File.Exists(Partial) && File.Exists(path))
            File.Move(path, Partial);
        var stream = new FileStream(Partial, FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.Read);
        rows = new StreamWriter(stream, Utf8, 1 << 16);
        if (goesOn && stream.Length > 0)
            KeepWholeRows(stream, header, count);
        else
            stream.SetLength(0);
        if (stream.Length == 0)
            rows.Write(header);
        rows.Flush();
    }

    /// <summary>Counts the whole lines and takes away what stands behind the last one.</summary>
    private void KeepWholeRows(FileStream stream, string header, long count)
    {
        byte[] first = Utf8.GetBytes(header), buffer = new byte[1 << 16];
        long lines = 0, end = 0, at = 0;
        for (int read = stream.Read(buffer); read > 0; read = stream.Read(buffer))
        {
            for (int i = 0; i < read; i++, at++)
            {
                if (at < first.Length && buffer[i] != first[at])
                    throw new InvalidDataException($"the first line of '{Partial}' is not that of this study");
                if (buffer[i] == '\n')
                    (lines, end) = (lines + 1, at + 1);
            }
        }

        if (end < first.Length)
            (lines, end) = (first.Length > 0 ? 1 : 0, 0);
        Finished = lines - (first.Length > 0 ? 1 : 0);
        if (Finished > count)
            throw new InvalidDataException(string.Create(CultureInfo.InvariantCulture, $"'{Partial}' has {Finished} rows and this study {count}"));
        stream.SetLength(end);
        stream.Seek(0, SeekOrigin.End);
    }
}
