using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Studies;

/// <summary>The columns of a file of readings, by its first line.</summary>
internal sealed record ReadingsColumns
{
    /// <summary>How the first line reads, for messages.</summary>
    public const string Help = "The first line reads such as 'time [min], level [mm]', 'clock, ullage [mm]' or 'time [s], dip [cm], resolution [mm]'";

    /// <summary>Place and unit of the elapsed time; null where the clock is given.</summary>
    public (int Place, Unit Unit)? Time { get; init; }

    /// <summary>Place of the clock; null where the elapsed time is given.</summary>
    public int? Clock { get; init; }

    /// <summary>Place and unit of the level.</summary>
    public (int Place, Unit Unit) Level { get; init; }

    /// <summary>Whether the level is measured down from the gauge point.</summary>
    public bool IsUllage { get; init; }

    /// <summary>Place and unit of the resolution; null where the file gives none.</summary>
    public (int Place, Unit Unit)? Resolution { get; init; }

    /// <summary>Number of columns.</summary>
    public required int Count { get; init; }

    /// <summary>Reads the titles; null when they are refused.</summary>
    /// <param name="titles">the cells of the first line</param>
    /// <param name="refuse">takes the place of a title, what is wrong with it, and what would do</param>
    public static ReadingsColumns? Read(IReadOnlyList<string> titles, Action<int, string, string> refuse)
    {
        bool isRefused = false;
        var columns = new ReadingsColumns { Count = titles.Count };
        HashSet<string> seen = [];
        for (int i = 0; i < titles.Count; i++)
        {
            (string name, string spelling) = Split(titles[i]);
            string kind = name switch { "elapsed" => "time", "dip" or "ullage" => "level", "clock" => "time", _ => name };
            Quantity? quantity = name switch
            {
                "time" or "elapsed" => Quantities.Time,
                "level" or "dip" or "ullage" or "resolution" => Quantities.Length,
                _ => null,
            };
            Unit? unit = quantity?.Find(spelling);
            string fault = quantity is null && name is not ("clock" or "note") ? $"there is no column {Quote.Of(titles[i])}"
                : !seen.Add(kind) ? $"a second column of the {kind}: {Quote.Of(titles[i])}"
                : quantity is null || unit is not null ? ""
                : spelling.Length == 0 ? $"the column {Quote.Of(titles[i])} has no unit"
                : $"the column {Quote.Of(titles[i])} has a unit {Quote.Of(spelling)} that is no unit of {quantity.Name}";
            if (fault.Length > 0)
                Refuse(i, fault);
            else
                columns = With(columns, name, i, unit!);
        }

        foreach (string kind in (string[])["time", "level"])
        {
            if (!isRefused && !seen.Contains(kind))
                Refuse(0, $"there is no column of the {kind}");
        }

        return isRefused ? null : columns;

        void Refuse(int place, string fault)
        {
            isRefused = true;
            refuse(place, fault, Help);
        }
    }

    private static ReadingsColumns With(ReadingsColumns columns, string name, int place, Unit unit) => name switch
    {
        "time" or "elapsed" => columns with { Time = (place, unit) },
        "clock" => columns with { Clock = place },
        "level" or "dip" => columns with { Level = (place, unit) },
        "ullage" => columns with { Level = (place, unit), IsUllage = true },
        "resolution" => columns with { Resolution = (place, unit) },
        _ => columns,
    };

    /// <summary>A title as name and unit: <c>level [mm]</c>, <c>level (mm)</c> or <c>level_mm</c>.</summary>
    private static (string Name, string Unit) Split(string title)
    {
        string text = title.Trim();
        int end = text.AsSpan().IndexOfAny(" _([/");
        return end < 0
            ? (text.ToLowerInvariant(), "")
            : (text[..end].ToLowerInvariant(), text[end..].Trim(' ', '_', '(', ')', '[', ']', '/'));
    }
}
