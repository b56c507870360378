using DrainSim.Draining;
using DrainSim.Lines;
using MathNet.Numerics;

namespace DrainSim.Tests.Draining;

/// <summary>Several lines share a tank; each has its own life.</summary>
public sealed class SeveralLinesTests
{
    private const double Area = 2, High = 1, Start = 3;
    private static readonly double K = Jobs.OrificeFactor();

    [Theory]
    [InlineData(2)]
    [InlineData(3)]
    public void Equal_lines_are_as_good_as_parallel_ones(int count)
    {
        Job one = Jobs.Siphon();
        DrawOff hose = new() { Line = Jobs.SiphonLine() };
        DrainResult several = Jobs.Run(one with { DrawOffs = [.. Enumerable.Repeat(hose, count)] });
        DrainResult parallel = Jobs.Run(one with { DrawOffs = Jobs.Only(hose.Line with { Parallel = count }) });
        Assert.Equal(parallel.StoppedAt, several.StoppedAt, 1e-7 * parallel.StoppedAt);
        Assert.Equal(parallel.Outcome, several.Outcome);
        foreach (LineResult line in several.Lines)
            Assert.Equal(parallel.DrainedVolume / count, line.DeliveredVolume, 1e-9);
    }

    /// <summary>t = ∫A·dh/(K√h + K√(h − 1)) while both run, then 2A/K·√h.</summary>
    [Fact]
    public void The_higher_orifice_ends_and_the_lower_goes_on()
    {
        DrainResult result = Jobs.Run(TwoOrifices());
        double both = Integrate.GaussKronrod(h => Area / (K * (Math.Sqrt(h) + Math.Sqrt(h - High))), High, Start, 1e-12);
        double alone = 2 * Area / K * (Math.Sqrt(High) - Math.Sqrt(1e-3));
        (LineResult low, LineResult high) = (result.Lines[0], result.Lines[1]);
        Assert.Equal(both, high.StoppedAt, 1e-6 * both);
        Assert.Equal(both + alone, result.StoppedAt, 1e-6 * (both + alone));
        Assert.Equal((Outcome.InletUncovered, Outcome.Emptied), (high.Outcome, low.Outcome));
        Assert.Equal(Outcome.Emptied, result.Outcome);
    }

    [Fact]
    public void What_the_lines_deliver_adds_up()
    {
        DrainResult result = Jobs.Run(TwoOrifices());
        Assert.Equal(result.DrainedVolume, result.Lines.Sum(line => line.DeliveredVolume), 1e-12);
        Assert.Equal(result.InitialVolume, result.DrainedVolume + result.LeftVolume, 1e-9);
    }

    [Fact]
    public void A_line_that_parts_leaves_the_other_running()
    {
        Line weak = Jobs.SiphonLine() with { LeastPressure = 73e3 };
        DrainResult result = Jobs.Run(Jobs.Siphon() with
        {
            DrawOffs = [new DrawOff { Line = weak }, new DrawOff { Line = Jobs.SiphonLine() }],
        });
        Assert.Equal((Outcome.VapourBreak, Outcome.InletUncovered), (result.Lines[0].Outcome, result.Lines[1].Outcome));
        Assert.True(result.Lines[0].StoppedAt < result.StoppedAt);
        Assert.NotNull(result.Lines[0].FallBack);
        Assert.Null(result.Lines[1].FallBack);
        Assert.Equal(Outcome.InletUncovered, result.Outcome);
    }

    [Fact]
    public void A_line_that_never_starts_does_not_keep_the_other_from_its_work()
    {
        Line dry = Jobs.SiphonLine();
        dry = dry with { Inlet = dry.Inlet with { Elevation = 2.3 } };
        DrainResult result = Jobs.Run(Jobs.Siphon() with
        {
            DrawOffs = [new DrawOff { Line = Jobs.SiphonLine() }, new DrawOff { Line = dry }],
        });
        double alone = Jobs.Run(Jobs.Siphon()).StoppedAt;
        Assert.Equal(alone, result.StoppedAt, 1e-7 * alone);
        Assert.Equal((Outcome.NeverStarted, NoStart.InletAboveLevel, 0.0),
            (result.Lines[1].Outcome, result.Lines[1].NoStart, result.Lines[1].DeliveredVolume));
    }

    [Fact]
    public void Lines_that_end_together_each_say_so()
    {
        DrawOff hose = new() { Line = Jobs.SiphonLine() };
        DrainResult result = Jobs.Run(Jobs.Siphon() with { DrawOffs = [hose, hose] });
        Assert.All(result.Lines, line => Assert.Equal((Outcome.InletUncovered, result.StoppedAt), (line.Outcome, line.StoppedAt)));
    }

    [Fact]
    public void Lines_that_level_together_each_say_so()
    {
        DrawOff drowned = new() { Line = Jobs.Orifice(0.05, 0.6), Receiver = new FixedSurface { Elevation = 1 } };
        DrainResult result = Jobs.Run(Jobs.OrificeDrain(Area, 4, Start) with { DrawOffs = [drowned, drowned] });
        double time = Area / K * (Math.Sqrt(Start - 1) - Math.Sqrt(1e-3));
        Assert.Equal(time, result.StoppedAt, 1e-6 * time);
        Assert.Equal(Outcome.Levelled, result.Outcome);
        Assert.All(result.Lines, line => Assert.Equal((Outcome.Levelled, result.StoppedAt), (line.Outcome, line.StoppedAt)));
    }

    private static Job TwoOrifices()
    {
        Line low = Jobs.Orifice(0.05, 0.6);
        Line high = low with { Inlet = low.Inlet with { Elevation = High } };
        return Jobs.OrificeDrain(Area, 4, Start) with { DrawOffs = [new DrawOff { Line = low }, new DrawOff { Line = high }] };
    }
}
