using System.Globalization;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads a date and time with its zone, as ISO 8601 writes them.</summary>
internal static class ClockReader
{
    private static readonly string[] Forms =
    [
        "yyyy-MM-dd'T'HH:mmzzz", "yyyy-MM-dd'T'HH:mm:sszzz", "yyyy-MM-dd HH:mmzzz", "yyyy-MM-dd HH:mm:sszzz",
        "yyyy-MM-dd HH:mm zzz", "yyyy-MM-dd HH:mm:ss zzz",
    ];

    private static readonly string[] UniversalForms =
    [
        "yyyy-MM-dd'T'HH:mm'Z'", "yyyy-MM-dd'T'HH:mm:ss'Z'", "yyyy-MM-dd HH:mm'Z'", "yyyy-MM-dd HH:mm:ss'Z'",
    ];

    private static readonly string[] ZonelessForms =
        ["yyyy-MM-dd'T'HH:mm", "yyyy-MM-dd'T'HH:mm:ss", "yyyy-MM-dd HH:mm", "yyyy-MM-dd HH:mm:ss", "yyyy-MM-dd"];

    /// <summary>The date and time of a key; null when it is absent or refused.</summary>
    public static DateTimeOffset? Read(BlockReader block, string key)
    {
        if (block.Word(key) is not { } text)
            return null;
        CultureInfo culture = CultureInfo.InvariantCulture;
        if (DateTimeOffset.TryParseExact(text, Forms, culture, DateTimeStyles.None, out DateTimeOffset clock)
            || DateTimeOffset.TryParseExact(text, UniversalForms, culture, DateTimeStyles.AssumeUniversal, out clock))
        {
            return clock;
        }
        bool isZoneless = DateTime.TryParseExact(text, ZonelessForms, culture, DateTimeStyles.None, out _);
        block.Refuse(key, $"{Quote.Of(text)} {(isZoneless ? "has no zone" : "is no date and time")}",
            "Write it like 2031-05-04 06:30 +02:00, or with Z for universal time");
        return null;
    }
}
