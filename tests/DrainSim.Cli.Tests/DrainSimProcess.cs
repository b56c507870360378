using System.Diagnostics;
using System.Text;

namespace DrainSim.Cli.Tests;

/// <summary>The program as a user starts it: the built executable in a process of its own.</summary>
internal static class DrainSimProcess
{
    private static readonly TimeSpan Patience = TimeSpan.FromMinutes(2);

    /// <summary>The environment of the tests themselves.</summary>
    public static IReadOnlyDictionary<string, string> AsItIs { get; } = new Dictionary<string, string>();

    /// <summary>The built executable beside the tests.</summary>
    public static string Executable { get; } =
        Path.Combine(AppContext.BaseDirectory, OperatingSystem.IsWindows() ? "drainsim.exe" : "drainsim");

    /// <summary>Starts the program in a folder and waits for its end.</summary>
    public static Finished Run(TestFolder folder, params string[] args) => Run(folder, AsItIs, args);

    /// <summary>Starts the program with settings of the environment and waits for its end.</summary>
    public static Finished Run(TestFolder folder, IReadOnlyDictionary<string, string> environment, params string[] args) =>
        Wait(Start(folder, Executable, environment, args));

    /// <summary>Starts a program without waiting.</summary>
    public static Process Start(
        TestFolder folder, string program, IReadOnlyDictionary<string, string> environment, params string[] args)
    {
        var start = new ProcessStartInfo(program, args)
        {
            WorkingDirectory = folder.Path,
            RedirectStandardInput = true,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            StandardOutputEncoding = new UTF8Encoding(false),
            StandardErrorEncoding = new UTF8Encoding(false),
        };
        foreach ((string name, string value) in environment)
            start.Environment[name] = value;
        Process process = Process.Start(start)!;
        process.StandardInput.Close();
        return process;
    }

    /// <summary>What a started program gave when it has ended.</summary>
    public static Finished Wait(Process process)
    {
        using (process)
        {
            Task<string> output = process.StandardOutput.ReadToEndAsync();
            Task<string> error = process.StandardError.ReadToEndAsync();
            if (!process.WaitForExit(Patience))
            {
                process.Kill(entireProcessTree: true);
                throw new TimeoutException($"the program did not end within {Patience}");
            }
            return new Finished(process.ExitCode, output.GetAwaiter().GetResult(), error.GetAwaiter().GetResult());
        }
    }
}
