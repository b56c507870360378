namespace DrainSim.Lines;

/// <summary>The built-in table of inlet edges.</summary>
public static class EdgeTable
{
    /// <summary>Every row, in the order of the table.</summary>
    public static IReadOnlyList<InletEdge> All { get; } = [];

    /// <summary>The trade words that stand for a row.</summary>
    public static IReadOnlyList<Alias> Aliases { get; } = [];

    /// <summary>The row of that name or trade word; null when there is none.</summary>
    /// <param name="id">exact name, in lower case with underscores</param>
    public static InletEdge? Find(string id) => All.FirstOrDefault(row => row.Id == id);
}
