using System.Globalization;
using System.Text;

namespace DrainSim.Scenarios;

/// <summary>Reads a small text file whole.</summary>
internal static class WholeText
{
    /// <summary>Why a file over the limit is refused.</summary>
    public static string TooLarge(int limit) =>
        string.Create(CultureInfo.InvariantCulture, $"the file is larger than {limit / 1024} KiB");

    /// <summary>Reads a file of UTF-8 text; no more than one byte beyond the limit is taken in.</summary>
    /// <param name="path">the file</param>
    /// <param name="limit">largest size, bytes</param>
    /// <param name="text">its text without a byte-order mark</param>
    /// <param name="fault">why it is refused, for people</param>
    public static bool TryRead(string path, int limit, out string text, out string fault)
    {
        text = fault = "";
        try
        {
            using FileStream file = new(path, FileMode.Open, FileAccess.Read, FileShare.Read);
            byte[] bytes = new byte[limit + 1];
            int count = file.ReadAtLeast(bytes, bytes.Length, throwOnEndOfStream: false);
            if (count > limit)
                fault = TooLarge(limit);
            else
                text = new UTF8Encoding(false, throwOnInvalidBytes: true).GetString(bytes, 0, count).TrimStart('\uFEFF');
        }
        catch (Exception e) when (e is FileNotFoundException or DirectoryNotFoundException)
        {
            fault = "there is no such file";
        }
        catch (DecoderFallbackException)
        {
            fault = "the file is not UTF-8 text";
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException or NotSupportedException or ArgumentException)
        {
            fault = Directory.Exists(path) ? "this is a folder, not a file" : "the file cannot be opened";
        }
        return fault.Length == 0;
    }
}
