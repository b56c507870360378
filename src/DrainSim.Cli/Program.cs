using System.Text;

namespace DrainSim.Cli;

/// <summary>The entry point: the only place that touches the console.</summary>
internal static class Program
{
    private static async Task<int> Main(string[] args)
    {
        // UTF-8 whatever the machine's locale, so that the same job gives the same bytes.
        if (OperatingSystem.IsWindows())
            Console.OutputEncoding = Encoding.UTF8;
        // Not disposed: a full disk would throw once more; the command line flushes them and tells.
        StreamWriter output = Utf8(Console.OpenStandardOutput());
        StreamWriter error = Utf8(Console.OpenStandardError());
        error.AutoFlush = true;
        return await CommandLine.RunAsync(args, output, error);
    }

    private static StreamWriter Utf8(Stream stream) =>
        new(stream, new UTF8Encoding(encoderShouldEmitUTF8Identifier: false)) { NewLine = "\n" };
}
