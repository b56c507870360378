namespace DrainSim.Lines;

/// <summary>The built-in table of nominal sizes of pipe and hose.</summary>
public static class SizeTable
{
    /// <summary>Wall schedule of a steel pipe where none is given.</summary>
    public const string DefaultSchedule = "40";

    private static readonly Lazy<IReadOnlyList<PipeSize>> Rows = new(Read);
    private static readonly Lazy<IReadOnlyList<Alias>> Words = new(() => AliasTable.Of("size"));

    /// <summary>Every row, in the order of the table.</summary>
    public static IReadOnlyList<PipeSize> All => Rows.Value;

    /// <summary>The ways of writing a size that stand for another.</summary>
    public static IReadOnlyList<Alias> Aliases => Words.Value;

    /// <summary>The row of a nominal size; null when there is none.</summary>
    /// <param name="size">
    /// DN50 or 2 in for steel pipe, 38 mm hose or 2 in hose for hose, or the name of a row; letter case, spaces and
    /// underscores do not count
    /// </param>
    /// <param name="schedule">
    /// wall schedule of steel pipe, such as 40, 80 or 10S; null for <see cref="DefaultSchedule"/>; a hose has none
    /// </param>
    public static PipeSize? Find(string size, string? schedule = null)
    {
        Alias? alias = Aliases.FirstOrDefault(word => Same(word.Name, size));
        string wanted = alias?.Target ?? size;
        return All.FirstOrDefault(row => Same(row.Id, wanted) && (schedule is null || SameSchedule(row, schedule)))
            ?? All.FirstOrDefault(row => IsCalled(row, wanted) && SameSchedule(row, schedule));
    }

    /// <summary>The rows next to a bore: of hose and of pipe the largest that is no wider and the smallest that is no narrower.</summary>
    /// <param name="bore">inside diameter, m</param>
    /// <param name="isOffered">whether a row is to be had</param>
    public static IReadOnlyList<PipeSize> Beside(double bore, Func<PipeSize, bool> isOffered)
    {
        List<PipeSize> beside = [];
        foreach (IGrouping<string, PipeSize> kind in All.Where(isOffered).GroupBy(row => row.Kind))
        {
            if (kind.Where(row => row.Bore <= bore).MaxBy(row => row.Bore) is { } below)
                beside.Add(below);
            if (kind.Where(row => row.Bore >= bore).MinBy(row => row.Bore) is { } above && !beside.Contains(above))
                beside.Add(above);
        }

        return beside;
    }

    private static bool IsCalled(PipeSize row, string size) =>
        Same(row.Nominal, size) || (row.NominalInches is { } inches && Same(inches, size));

    private static bool SameSchedule(PipeSize row, string? schedule) =>
        row.Schedule is null ? schedule is null : Same(row.Schedule, Bare(schedule ?? DefaultSchedule));

    private static string Bare(string schedule) => schedule
        .Replace("schedule", "", StringComparison.OrdinalIgnoreCase)
        .Replace("sch", "", StringComparison.OrdinalIgnoreCase);

    private static bool Same(string one, string other) =>
        string.Equals(Packed(one), Packed(other), StringComparison.OrdinalIgnoreCase);

    private static string Packed(string text) => string.Concat(text.Where(letter => letter is not (' ' or '_')));

    private static List<PipeSize> Read() => EmbeddedTable.Rows("Lines.Tables.pipe-sizes.csv", row => new PipeSize
    {
        Id = row.GetString("id"),
        Kind = row.GetString("kind"),
        Standard = row.GetString("standard"),
        Nominal = row.TextOrNull("dn") is { } dn ? "DN" + dn : HoseName(row.GetString("id")),
        NominalInches = row.TextOrNull("nps_in") is { } inches ? inches + " in" : null,
        Schedule = row.TextOrNull("schedule"),
        OutsideDiameter = row.NumberOrNull("outside_diameter_mm") / 1000,
        Wall = row.NumberOrNull("wall_mm") / 1000,
        Bore = row.Number("inside_diameter_mm") / 1000,
        Source = row.GetString("source"),
    });

    private static string HoseName(string id) => id
        .Replace("HOSE_", "", StringComparison.Ordinal)
        .Replace("MM", " mm hose", StringComparison.Ordinal)
        .Replace("IN", " in hose", StringComparison.Ordinal);
}
