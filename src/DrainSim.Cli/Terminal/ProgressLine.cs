using System.Diagnostics;
using System.Globalization;
using DrainSim.Reports.Measures;

namespace DrainSim.Cli.Terminal;

/// <summary>A bar on the terminal with the rate and the time left; nothing where the output is piped.</summary>
/// <remarks>One line, written over in place: a package for it costs more start-up than most sweeps take.</remarks>
internal sealed class ProgressLine : IDisposable
{
    private const int Cells = 30;
    private const long Every = 200;

    /// <summary>A rate is worth something from here on, ms.</summary>
    private const long FirstRate = 1000;

    private readonly TextWriter? terminal;
    private readonly long total;
    private readonly long before;
    private readonly Stopwatch watch = Stopwatch.StartNew();
    private long shownAt;
    private bool isShown;

    /// <summary>A bar at its beginning.</summary>
    /// <param name="terminal">where it is written; null for nowhere</param>
    /// <param name="total">number of runs in all</param>
    /// <param name="before">number of runs that were done before this process</param>
    public ProgressLine(TextWriter? terminal, long total, long before) =>
        (this.terminal, this.total, this.before) = (terminal, total, before);

    /// <summary>The error output where it is a terminal; null where it is piped.</summary>
    public static TextWriter? Terminal(TextWriter error) => Console.IsErrorRedirected ? null : error;

    /// <summary>Shows how many runs are done, a few times a second.</summary>
    /// <param name="done">number of runs, those before this process included</param>
    public void Show(long done)
    {
        if (terminal is null || watch.ElapsedMilliseconds - shownAt < Every)
            return;
        shownAt = watch.ElapsedMilliseconds;
        isShown = true;
        double rate = (done - before) / watch.Elapsed.TotalSeconds;
        int full = (int)(Cells * done / Math.Max(1, total));
        string left = rate > 0 && shownAt >= FirstRate ? MeasureFormat.Duration((total - done) / rate) : "…";
        terminal.Write(string.Create(CultureInfo.InvariantCulture,
            $"\r[{new string('#', full)}{new string('.', Cells - full)}] {done} of {total}, {rate:0} runs/s, {left} left   "));
        terminal.Flush();
    }

    /// <summary>Takes the bar away.</summary>
    public void Dispose()
    {
        if (!isShown)
            return;
        terminal!.Write("\r" + new string(' ', 100) + "\r");
        terminal.Flush();
    }
}
