using System.Globalization;

namespace DrainSim.Cli.Terminal;

/// <summary>Numbers the sources of a table, so that each is printed once under it.</summary>
internal sealed class SourceNotes
{
    private readonly List<string> sources = [];

    /// <summary>The sources with their numbers, in the order in which they were first named.</summary>
    public IEnumerable<string> Lines => sources.Select((source, index) =>
        string.Create(CultureInfo.InvariantCulture, $"{index + 1,2}  {source}"));

    /// <summary>The number of a source; the same text has the same number.</summary>
    public string NumberOf(string source)
    {
        int index = sources.IndexOf(source);
        if (index < 0)
        {
            index = sources.Count;
            sources.Add(source);
        }
        return (index + 1).ToString(CultureInfo.InvariantCulture);
    }
}
