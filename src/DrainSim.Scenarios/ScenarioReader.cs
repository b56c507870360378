namespace DrainSim.Scenarios;

/// <summary>Reads a scenario in one call.</summary>
public static class ScenarioReader
{
    /// <summary>Reads a file; a file that cannot be opened is a problem like any other.</summary>
    /// <param name="path">the file as the user named it</param>
    public static ScenarioReading Read(string path) => ScenarioDocument.Load(path).Read();

    /// <summary>Reads a text.</summary>
    /// <param name="text">the whole scenario</param>
    /// <param name="fileName">name of the file for messages</param>
    /// <param name="folder">folder in which a strapping table is looked for</param>
    public static ScenarioReading ReadText(string text, string fileName, string folder) =>
        ScenarioDocument.FromText(text, fileName, folder).Read();
}
