using System.Globalization;

namespace DrainSim.Scenarios.Studies;

/// <summary>Reads a clock: a time of day, <c>14:05</c>, or a date and a time, <c>2026-05-04 14:05</c>, with or without a zone.</summary>
internal static class ClockText
{
    /// <summary>How a clock reads, for messages.</summary>
    public const string Help = "A clock reads 14:05, 14:05:30, 2026-05-04 14:05 or 2026-05-04T14:05+02:00";

    private static readonly string[] TimesOfDay = ["H:mm", "H:mm:ss"];
    private static readonly string[] Dates = ["yyyy-MM-dd H:mm", "yyyy-MM-dd H:mm:ss", "yyyy-MM-dd'T'HH:mm", "yyyy-MM-dd'T'HH:mm:ss"];
    private static readonly string[] Zoned = ["yyyy-MM-dd H:mmzzz", "yyyy-MM-dd H:mm:sszzz", "yyyy-MM-dd'T'HH:mmzzz", "yyyy-MM-dd'T'HH:mm:sszzz"];

    /// <summary>Reads a text.</summary>
    /// <param name="text">the text</param>
    /// <param name="day">the day that a time of day belongs to, and the zone of a time without one</param>
    /// <param name="time">the time</param>
    /// <param name="hasDate">whether the text has its own date</param>
    public static bool TryRead(string text, DateTimeOffset day, out DateTimeOffset time, out bool hasDate)
    {
        CultureInfo invariant = CultureInfo.InvariantCulture;
        hasDate = true;
        if (DateTimeOffset.TryParseExact(text.Replace("Z", "+00:00", StringComparison.Ordinal), Zoned, invariant, DateTimeStyles.None, out time))
            return true;
        if (DateTime.TryParseExact(text, Dates, invariant, DateTimeStyles.None, out DateTime local))
        {
            time = new DateTimeOffset(local, day.Offset);
            return true;
        }

        hasDate = false;
        if (!TimeOnly.TryParseExact(text, TimesOfDay, invariant, DateTimeStyles.None, out TimeOnly ofDay))
            return false;
        time = new DateTimeOffset(day.Date + ofDay.ToTimeSpan(), day.Offset);
        return true;
    }
}
