namespace DrainSim.Scenarios.Reading;

/// <summary>Reads names by which parameters are found.</summary>
internal static class NameReader
{
    /// <summary>The name of an item; null when it has none or it is refused.</summary>
    /// <param name="block">the item</param>
    /// <param name="names">the names of the items before; the name is added</param>
    public static string? Read(BlockReader block, HashSet<string> names)
    {
        if (block.Word("name") is not { } name)
            return null;
        if (!char.IsAsciiLetter(name[0]) || name.Any(letter => !char.IsAsciiLetterOrDigit(letter) && letter is not ('_' or '-')))
            block.Refuse("name", $"{Quote.Of(name)} cannot stand in a parameter's path", "A name is letters, digits, '_' and '-', a letter first");
        else if (!names.Add(name))
            block.Refuse("name", $"{Quote.Of(name)} is the name of an item before", "Each item has its own name");
        return name;
    }
}
