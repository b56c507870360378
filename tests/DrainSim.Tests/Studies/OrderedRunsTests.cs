using System.Collections.Concurrent;
using CsCheck;
using DrainSim.Studies;

namespace DrainSim.Tests.Studies;

/// <summary>The engine of the studies: order, bounds, faults and cancellation.</summary>
public sealed class OrderedRunsTests
{
    private static CancellationToken Stop => TestContext.Current.CancellationToken;

    [Fact]
    public void Results_come_in_the_order_of_their_cases_whatever_the_threads() =>
        Gen.Select(Gen.Int[1, 9], Gen.Long[-50, 50], Gen.Int[0, 3000]).Sample(
            (threads, first, count) =>
            {
                var taken = new List<long>();
                new OrderedRuns { Threads = threads }.Run(first, first + count, Uneven, (number, result) =>
                {
                    Assert.Equal(number * 2, result);
                    taken.Add(number);
                }, Stop);
                Assert.Equal(Enumerable.Range(0, count).Select(i => first + i), taken);
            },
            iter: 60);

    [Fact]
    public void No_more_results_wait_than_the_window_holds()
    {
        long finished = 0, most = 0;
        long handed = 0;
        new OrderedRuns { Threads = 4 }.Run(0, 20_000,
            number =>
            {
                if (number == 0)
                    Thread.Sleep(200);
                long waiting = Interlocked.Increment(ref finished) - Volatile.Read(ref handed);
                InterlockedMax(ref most, waiting);
                return number;
            },
            (_, _) => Interlocked.Increment(ref handed),
            Stop);
        Assert.InRange(most, 1, 4 * 4 * 64 + 4);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(7)]
    public void A_fault_of_a_case_surfaces_after_all_cases_before_it(int threads)
    {
        var taken = new List<long>();
        InvalidOperationException fault = Assert.Throws<InvalidOperationException>(() =>
            new OrderedRuns { Threads = threads }.Run(0, 5000,
                number => number is 1234 or 1300 or 4000 ? throw new InvalidOperationException($"case {number}") : number,
                (number, _) => taken.Add(number),
                Stop));
        Assert.Equal("case 1234", fault.Message);
        Assert.Equal(Enumerable.Range(0, 1234).Select(i => (long)i), taken);
    }

    [Fact]
    public void A_fault_of_the_taker_surfaces_and_ends_the_study()
    {
        IOException fault = Assert.Throws<IOException>(() => new OrderedRuns { Threads = 3 }.Run(0, 100_000, number => number,
            (number, _) => _ = number == 700 ? throw new IOException("disk full") : 0, Stop));
        Assert.Equal("disk full", fault.Message);
    }

    [Fact]
    public void A_cancelled_study_leaves_no_gap()
    {
        using var stop = new CancellationTokenSource();
        var taken = new List<long>();
        Assert.Throws<OperationCanceledException>(() => new OrderedRuns { Threads = 4 }.Run(0, long.MaxValue / 2, Uneven,
            (number, _) =>
            {
                taken.Add(number);
                if (number == 3000)
                    stop.Cancel();
            },
            stop.Token));
        Assert.Equal(Enumerable.Range(0, taken.Count).Select(i => (long)i), taken);
        Assert.InRange(taken.Count, 3001, 3001 + 4 * 4 * 64);
    }

    [Fact]
    public void Each_thread_keeps_what_is_its_own()
    {
        var owners = new ConcurrentDictionary<object, int>();
        new OrderedRuns { Threads = 3 }.Run(0, 2000, () => new object(),
            (own, number) =>
            {
                int thread = Environment.CurrentManagedThreadId;
                Assert.Equal(thread, owners.GetOrAdd(own, thread));
                return number;
            },
            (_, _) => { },
            Stop);
        Assert.InRange(owners.Count, 1, 3);
    }

    [Fact]
    public void A_study_without_cases_ends_at_once() =>
        new OrderedRuns().Run<int>(5, 5, _ => throw new InvalidOperationException(), (_, _) => throw new InvalidOperationException(), Stop);

    private static long Uneven(long number)
    {
        if (number % 97 == 0)
            Thread.SpinWait(20_000);
        return number * 2;
    }

    private static void InterlockedMax(ref long most, long value)
    {
        long seen = Volatile.Read(ref most);
        while (value > seen && Interlocked.CompareExchange(ref most, value, seen) is var now && now != seen)
            seen = now;
    }
}
