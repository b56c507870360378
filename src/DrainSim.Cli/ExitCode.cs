namespace DrainSim.Cli;

/// <summary>What the program returns to the shell.</summary>
internal static class ExitCode
{
    /// <summary>The job ran, whatever its outcome.</summary>
    public const int Ran = 0;

    /// <summary>A limit of the scenario was broken, or an expected outcome was not met.</summary>
    public const int NotAsExpected = 1;

    /// <summary>A scenario or the command line was refused; nothing was run.</summary>
    public const int Refused = 2;

    /// <summary>An output could not be written.</summary>
    public const int NotWritten = 3;

    /// <summary>A fault of the program itself; EX_SOFTWARE of BSD's sysexits.</summary>
    public const int Fault = 70;

    /// <summary>Stopped by Ctrl-C or a request to terminate; 128 and the number of SIGINT.</summary>
    public const int Interrupted = 130;
}
