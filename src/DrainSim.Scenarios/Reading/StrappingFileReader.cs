using CsvHelper;
using DrainSim.Scenarios.Yaml;
using DrainSim.Vessels;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads a strapping table from the CSV file beside the scenario.</summary>
internal static class StrappingFileReader
{
    private static readonly CsvReaderOptions Options = new()
    {
        HasHeader = false,
        CommentPrefix = '#',
        TrimWhitespace = true,
        TrackLineNumbers = true,
        AllowLineBreaksInQuotes = false,
    };

    /// <summary>The vessel of the key <c>file</c>; null when it is refused.</summary>
    /// <param name="block">the tank</param>
    /// <param name="folder">the scenario's folder, which the file must lie in</param>
    public static Vessel? Read(BlockReader block, string folder)
    {
        if (!block.Has("file"))
            block.Miss("is missing", "Name a CSV file with the columns level_m and volume_m3", "file");
        if (block.Word("file") is not { } name)
            return null;
        if (!IsWithin(folder, name, out string path))
        {
            block.Refuse("file", $"{Quote.Of(name)} leaves the scenario's folder", "Name a file in that folder or below it");
            return null;
        }
        if (!WholeText.TryRead(path, ScenarioDocument.LargestFile, out string text, out string fault))
        {
            block.Refuse("file", $"{Quote.Of(name)}: {fault}", "The name counts from the scenario's folder");
            return null;
        }
        return Rows(new StrappingFile(block, Quote.Plain(name), new SourceText(text)), text);
    }

    /// <summary>Whether a file named in a scenario lies in the scenario's folder.</summary>
    /// <param name="folder">the folder</param>
    /// <param name="name">the file as it is named</param>
    /// <param name="path">its full path</param>
    public static bool IsWithin(string folder, string name, out string path)
    {
        path = "";
        if (Path.IsPathRooted(name) || name.Contains('\0', StringComparison.Ordinal) || name.Contains('\\', StringComparison.Ordinal))
            return false;
        string root = Path.GetFullPath(folder) + Path.DirectorySeparatorChar;
        path = Path.GetFullPath(Path.Combine(root, name));
        if (!path.StartsWith(root, StringComparison.Ordinal))
            return false;
        try
        {
            string? target = File.ResolveLinkTarget(path, returnFinalTarget: true)?.FullName;
            return target is null || target.StartsWith(root, StringComparison.Ordinal);
        }
        catch (IOException)
        {
            return true;
        }
    }

    private static StrappingTable? Rows(StrappingFile file, string text)
    {
        using CsvReader csv = CsvReader.FromText(text, Options);
        if (!csv.Read() || !file.TryHeader(csv))
            return null;
        List<(double Level, double Volume)> rows = [];
        try
        {
            while (csv.Read())
                file.AddRow(csv, rows);
        }
        catch (CsvFormatException e)
        {
            file.Refuse((int)e.LineNumber, "the row cannot be read", "A row is a level and a volume");
        }
        return file.IsRefused ? null : file.Build(rows);
    }
}
