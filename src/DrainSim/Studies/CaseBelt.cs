using System.Runtime.ExceptionServices;

namespace DrainSim.Studies;

/// <summary>One study at work: the blocks of cases taken, those that wait for an earlier one, and the one that is due.</summary>
internal sealed class CaseBelt<TWorker, TResult>
{
    /// <summary>Blocks for each thread that may be at work or waiting at a time.</summary>
    private const int AheadPerThread = 4;

    /// <summary>How long a thread waits before it looks for a cancellation.</summary>
    private static readonly TimeSpan Patience = TimeSpan.FromMilliseconds(50);

    private readonly long first, end;
    private readonly int size;
    private readonly Func<TWorker> worker;
    private readonly Func<TWorker, long, TResult> run;
    private readonly Action<long, TResult> take;
    private readonly CancellationToken cancellation;
    private readonly object gate = new();
    private readonly Block[] ring;
    private long taken, due;
    private bool isHandingOver;
    private volatile ExceptionDispatchInfo? fault;

    /// <param name="first">number of the first case</param>
    /// <param name="end">number behind the last case</param>
    /// <param name="size">cases in a block</param>
    /// <param name="threads">number of threads that will work</param>
    /// <param name="worker">makes what a thread keeps for itself</param>
    /// <param name="run">runs a case</param>
    /// <param name="take">takes a result</param>
    /// <param name="cancellation">ends the study early</param>
    public CaseBelt(long first, long end, int size, int threads, Func<TWorker> worker, Func<TWorker, long, TResult> run,
        Action<long, TResult> take, CancellationToken cancellation)
    {
        (this.first, this.end, this.size) = (first, end, size);
        (this.worker, this.run, this.take, this.cancellation) = (worker, run, take, cancellation);
        BlockCount = (end - first + size - 1) / size;
        ring = new Block[Math.Clamp(BlockCount, 1, threads * AheadPerThread)];
        for (int i = 0; i < ring.Length; i++)
            ring[i] = new Block(size);
    }

    /// <summary>Number of blocks in the study.</summary>
    public long BlockCount { get; }

    private bool IsOver => fault is not null || cancellation.IsCancellationRequested;

    /// <summary>Takes block after block until none is left; the work of one thread.</summary>
    public void Work()
    {
        IDisposable? owned = null;
        try
        {
            TWorker own = worker();
            owned = own as IDisposable;
            while (Interlocked.Increment(ref taken) - 1 is var number && number < BlockCount && AwaitPlace(number) is { } block)
            {
                Fill(block, own, number);
                HandOver(block);
            }
        }
#pragma warning disable CA1031 // the calling thread throws it on
        catch (Exception e)
#pragma warning restore CA1031
        {
            fault ??= ExceptionDispatchInfo.Capture(e);
        }
        finally
        {
            owned?.Dispose();
        }
    }

    /// <summary>Throws what broke the study, if anything did.</summary>
    public void ThrowIfBroken() => fault?.Throw();

    /// <summary>The place of a block, once the block that had it before is handed over; null when the study is over.</summary>
    private Block? AwaitPlace(long number)
    {
        lock (gate)
        {
            while (due + ring.Length <= number && !IsOver)
                Monitor.Wait(gate, Patience);
        }

        return IsOver ? null : ring[number % ring.Length];
    }

    private void Fill(Block block, TWorker own, long number)
    {
        block.First = first + number * size;
        block.Fault = null;
        int count = (int)Math.Min(size, end - block.First), done = 0;
        try
        {
            while (done < count && !IsOver)
            {
                block.Results[done] = run(own, block.First + done);
                done++;
            }
        }
#pragma warning disable CA1031 // thrown on when the block is due
        catch (Exception e)
#pragma warning restore CA1031
        {
            block.Fault = ExceptionDispatchInfo.Capture(e);
        }

        (block.Count, block.IsWhole) = (done, done == count);
    }

    /// <summary>Hands over every block that is due and finished, unless another thread is at it.</summary>
    private void HandOver(Block finished)
    {
        lock (gate)
        {
            finished.IsFinished = true;
            if (isHandingOver)
                return;
            isHandingOver = true;
        }

        while (NextDue() is { } block)
        {
            for (int i = 0; i < block.Count; i++)
                take(block.First + i, block.Results[i]!);
            Array.Clear(block.Results);
            if (!block.IsWhole)
            {
                fault ??= block.Fault; // a gap follows: nothing more is handed over
                return;
            }

            lock (gate)
            {
                due++;
                Monitor.PulseAll(gate);
            }
        }
    }

    private Block? NextDue()
    {
        lock (gate)
        {
            Block block = ring[due % ring.Length];
            isHandingOver = block.IsFinished;
            block.IsFinished = false;
            return isHandingOver ? block : null;
        }
    }

    /// <summary>The results of one block.</summary>
    private sealed class Block(int size)
    {
        public long First { get; set; }

        public int Count { get; set; }

        public bool IsWhole { get; set; }

        public bool IsFinished { get; set; }

        public TResult?[] Results { get; } = new TResult?[size];

        public ExceptionDispatchInfo? Fault { get; set; }
    }
}
