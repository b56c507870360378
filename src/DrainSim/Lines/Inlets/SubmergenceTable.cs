using CsvHelper;

namespace DrainSim.Lines.Inlets;

/// <summary>The built-in table of submergence forms.</summary>
public static class SubmergenceTable
{
    /// <summary>Every row, in the order of the table.</summary>
    public static IReadOnlyList<SubmergenceFormula> All { get; } =
        EmbeddedTable.Rows("Lines.Inlets.submergence-formulas.csv", Row);

    /// <summary>The row of that name; null when there is none.</summary>
    /// <param name="id">exact name, in lower case with underscores</param>
    public static SubmergenceFormula? Find(string id) => All.FirstOrDefault(row => row.Id == id);

    private static SubmergenceFormula Row(CsvReader reader) => new()
    {
        Id = reader.GetString("id"),
        IsPullThrough = reader.GetString("kind") == "pull_through",
        Facing = Facing(reader.GetString("facing")),
        SideDatum = Datum(reader.GetString("datum")),
        NeedsSuppressor = reader.GetString("needs_suppressor") == "yes",
        Equation = reader.GetString("formula"),
        Source = reader.GetString("source"),
    };

    private static InletFacing? Facing(string word) => word switch
    {
        "any" => null,
        "down" => InletFacing.Down,
        "side" => InletFacing.Side,
        "up" => InletFacing.Up,
        _ => throw new InvalidDataException($"no inlet faces {word}"),
    };

    // Where a source names the opening alone, the whole of a side inlet is taken to be covered by that depth: the safe side.
    private static double Datum(string word) => word switch
    {
        "opening" or "crown" => 1,
        "axis" => 0.5,
        _ => throw new InvalidDataException($"no submergence is measured from {word}"),
    };
}
