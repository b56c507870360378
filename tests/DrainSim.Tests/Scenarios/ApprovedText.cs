using System.Runtime.CompilerServices;

namespace DrainSim.Tests.Scenarios;

/// <summary>Compares a text with the approved one in the folder Approved; a differing text is left beside it.</summary>
internal static class ApprovedText
{
    public static void Matches(string name, string text, [CallerFilePath] string testFile = "")
    {
        string folder = Path.Combine(Path.GetDirectoryName(testFile)!, "Approved");
        string approved = Path.Combine(folder, name + ".txt");
        string received = Path.Combine(folder, name + ".received.txt");
        string expected = File.Exists(approved) ? File.ReadAllText(approved).ReplaceLineEndings("\n") : "";
        if (expected == text)
        {
            File.Delete(received);
            return;
        }
        File.WriteAllText(received, text);
        Assert.Equal(expected, text);
    }

    /// <summary>Full path of a file in a folder beside the test.</summary>
    public static string Beside(string relative, [CallerFilePath] string testFile = "") =>
        Path.Combine(Path.GetDirectoryName(testFile)!, relative);
}
