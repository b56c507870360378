namespace DrainSim.Lines;

/// <summary>The built-in table of nominal sizes of pipe and hose.</summary>
public static class SizeTable
{
    /// <summary>Wall schedule of a steel pipe where none is given.</summary>
    public const string DefaultSchedule = "40";

    /// <summary>Every row, in the order of the table.</summary>
    public static IReadOnlyList<PipeSize> All { get; } = [];

    /// <summary>The row of a nominal size; null when there is none.</summary>
    /// <param name="size">DN50, 2 in, or the name of a row such as HOSE_38MM</param>
    /// <param name="schedule">wall schedule, such as 40 or 10S; null for <see cref="DefaultSchedule"/></param>
    public static PipeSize? Find(string size, string? schedule = null) =>
        All.FirstOrDefault(row => row.Id == size && (row.Schedule ?? DefaultSchedule) == (schedule ?? DefaultSchedule));
}
