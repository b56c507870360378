namespace DrainSim.Studies;

/// <summary>
/// Runs numbered cases over several threads and hands their results over one by one in the order of their numbers,
/// so that a study says the same whatever the number of threads.
/// </summary>
/// <remarks>
/// Threads take blocks of cases. A finished block waits until the blocks before it are handed over; a thread that is
/// too far ahead waits too, so that the results in memory are bounded however many cases there are. The calling
/// thread works like the others, and results are handed over by whichever thread finished the block that was due:
/// one at a time, never two at once.
/// </remarks>
public sealed record OrderedRuns
{
    /// <summary>Most cases in a block: some milliseconds of plain runs, so that taking a block costs nothing beside it.</summary>
    private const int LargestBlock = 64;

    /// <summary>Blocks of a study for each thread, at least where there are so many cases, so that the threads end together.</summary>
    private const int BlocksPerThread = 16;

    /// <summary>Number of threads, the calling one included; at least 1. As many as the machine has cores unless given.</summary>
    public int Threads
    {
        get;
        init => field = value >= 1
            ? value
            : throw new ArgumentOutOfRangeException(null, $"number of threads must be at least 1, got {value}");
    } = Environment.ProcessorCount;

    /// <summary>Runs cases that need nothing but their number.</summary>
    /// <inheritdoc cref="Run{TWorker, TResult}"/>
    public void Run<TResult>(
        long first, long end, Func<long, TResult> run, Action<long, TResult> take, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(run);
        Run(first, end, () => run, (own, number) => own(number), take, cancellation);
    }

    /// <summary>Runs all cases from one number to another.</summary>
    /// <typeparam name="TWorker">what a thread keeps for itself</typeparam>
    /// <typeparam name="TResult">what is kept of a case</typeparam>
    /// <param name="first">number of the first case</param>
    /// <param name="end">number behind the last case</param>
    /// <param name="worker">makes what a thread keeps for itself; called once by each thread, which disposes of it where it can be</param>
    /// <param name="run">runs a case; called by all threads at once, each with what is its own</param>
    /// <param name="take">takes the results, in the order of their numbers, one at a time, on any of the threads</param>
    /// <param name="cancellation">ends the study early, after the cases at work</param>
    /// <exception cref="OperationCanceledException">the study was cancelled; what was handed over has no gap</exception>
    /// <remarks>
    /// An exception of a case ends the study and is thrown on; the results of all cases before it are handed over
    /// first, so that it is the same one whatever the number of threads.
    /// </remarks>
    public void Run<TWorker, TResult>(
        long first, long end, Func<TWorker> worker, Func<TWorker, long, TResult> run, Action<long, TResult> take,
        CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(worker);
        ArgumentNullException.ThrowIfNull(run);
        ArgumentNullException.ThrowIfNull(take);
        ArgumentOutOfRangeException.ThrowIfLessThan(end, first);
        int block = (int)Math.Clamp((end - first) / ((long)Threads * BlocksPerThread), 1, LargestBlock);
        var belt = new CaseBelt<TWorker, TResult>(first, end, block, Threads, worker, run, take, cancellation);
        Thread[] others = new Thread[Math.Clamp(belt.BlockCount, 1, Threads) - 1];
        for (int i = 0; i < others.Length; i++)
            (others[i] = new Thread(belt.Work) { IsBackground = true }).Start();
        belt.Work();
        foreach (Thread other in others)
            other.Join();
        belt.ThrowIfBroken();
        cancellation.ThrowIfCancellationRequested();
    }
}
