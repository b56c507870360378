namespace DrainSim.Scenarios.Reading;

/// <summary>Keys of the vocabulary that this version does not read. Ignoring them would change the result unseen.</summary>
internal static class LaterWork
{
    private static readonly Dictionary<string, string> Keys = new()
    {
        ["uncertainty"] = "Run the cases one by one",
        ["forecast"] = "Run the cases one by one",
    };

    /// <summary>What to do instead; null for a key that is not of the vocabulary at all.</summary>
    /// <param name="path">dotted path of the key</param>
    public static string? Find(string path) => Keys.GetValueOrDefault(path);
}
