namespace DrainSim.Cli.Tests;

/// <summary>A folder of its own for one test, taken away afterwards.</summary>
internal sealed class TestFolder : IDisposable
{
    public string Path { get; } = Directory.CreateTempSubdirectory("drainsim-test-").FullName;

    /// <summary>Names of all files below the folder, with forward slashes, sorted.</summary>
    public IReadOnlyList<string> Files =>
    [
        .. Directory.EnumerateFiles(Path, "*", SearchOption.AllDirectories)
            .Select(file => System.IO.Path.GetRelativePath(Path, file).Replace('\\', '/'))
            .Order(StringComparer.Ordinal),
    ];

    public string Full(string name) => System.IO.Path.Combine(Path, name);

    public void Write(string name, string text)
    {
        Directory.CreateDirectory(System.IO.Path.GetDirectoryName(Full(name))!);
        File.WriteAllText(Full(name), text);
    }

    public void WriteBytes(string name, byte[] bytes) => File.WriteAllBytes(Full(name), bytes);

    /// <summary>Takes a file, or a folder with all in it, away.</summary>
    public void Delete(string name)
    {
        if (Directory.Exists(Full(name)))
            Directory.Delete(Full(name), recursive: true);
        else
            File.Delete(Full(name));
    }

    public string Read(string name) => File.ReadAllText(Full(name));

    public byte[] Bytes(string name) => File.ReadAllBytes(Full(name));

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
