namespace DrainSim.Scenarios.Studies;

/// <summary>The texts in which a caller adds to a study.</summary>
internal static class StudyTexts
{
    /// <summary>The scenario with the values that the block and the caller set.</summary>
    public static ScenarioDocument Set(ScenarioDocument document, StudyBlock block, StudyRequest request, List<Problem> problems)
    {
        foreach ((string path, string text) in block.Set)
            document = document.With(path, text);
        foreach (string text in request.Set)
        {
            if (TrySplit(text, problems, out string path, out string value))
                document = document.With(path, value);
        }

        return document;
    }

    /// <summary>Splits <c>PATH=VALUE</c> at its first equals sign.</summary>
    public static bool TrySplit(string text, List<Problem> problems, out string path, out string value)
    {
        int sign = text.IndexOf('=', StringComparison.Ordinal);
        (path, value) = sign < 0 ? (text, "") : (text[..sign].Trim(), text[(sign + 1)..].Trim());
        if (sign > 0 && path.Length > 0 && value.Length > 0)
            return true;
        problems.Add(new Problem(0, 0, "", $"{Quote.Of(text)} does not read PATH=VALUE", "An example is tank.level=1.8 m"));
        return false;
    }
}
