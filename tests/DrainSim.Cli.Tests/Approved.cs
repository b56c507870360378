using System.Runtime.CompilerServices;

namespace DrainSim.Cli.Tests;

/// <summary>Texts that somebody has read and found good; they lie in the folder Approved.</summary>
internal static class Approved
{
    /// <summary>Compares a text with its approved file; on a difference the text is left beside it as .received.txt.</summary>
    public static void Matches(string name, string text, [CallerFilePath] string source = "")
    {
        string folder = Path.Combine(Path.GetDirectoryName(source)!, "Approved");
        string approved = Path.Combine(folder, name + ".txt");
        string received = Path.Combine(folder, name + ".received.txt");
        string expected = File.Exists(approved) ? File.ReadAllText(approved) : "";
        if (expected == text)
        {
            File.Delete(received);
            return;
        }
        File.WriteAllText(received, text);
        Assert.Equal(expected, text);
    }
}
