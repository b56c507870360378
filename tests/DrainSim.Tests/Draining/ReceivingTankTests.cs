using DrainSim.Draining;
using DrainSim.Lines;

namespace DrainSim.Tests.Draining;

/// <summary>
/// Two prisms joined by a drowned orifice: d(Δh)/dt = −K·√Δh·(1/A₁ + 1/A₂), so √Δh = √Δh₀ − K/2·(1/A₁ + 1/A₂)·t; with
/// Poiseuille flow between them Δh falls exponentially.
/// </summary>
public sealed class ReceivingTankTests
{
    private const double Source = 2, Sink = 0.8;
    private static readonly double Rate = Jobs.OrificeFactor() / 2 * (1 / Source + 1 / Sink);

    [Theory]
    [InlineData(3.0, 1.0)]
    [InlineData(1.0, 3.0)]
    public void Both_levels_follow_the_closed_form_either_way(double here, double there)
    {
        DrainResult result = Jobs.Run(Joined(here, there));
        double together = here * Source + there * Sink, sign = Math.Sign(here - there);
        for (int i = 0; i <= 10; i++)
        {
            Instant instant = result.Trace.At(i / 10.0 * result.StoppedAt);
            double difference = sign * Math.Pow(Math.Sqrt(Math.Abs(here - there)) - Rate * instant.Time, 2);
            Assert.Equal((together + Sink * difference) / (Source + Sink), instant.Level, 1e-7);
            Assert.Equal((together - Source * difference) / (Source + Sink), instant.ReceiverLevel!.Value, 1e-7);
        }
    }

    [Theory]
    [InlineData(3.0, 1.0)]
    [InlineData(1.0, 3.0)]
    public void They_level_in_the_closed_time_to_within_the_settled_head(double here, double there)
    {
        DrainResult result = Jobs.Run(Joined(here, there));
        double time = (Math.Sqrt(Math.Abs(here - there)) - Math.Sqrt(1e-3)) / Rate;
        Assert.Equal(Outcome.Levelled, result.Outcome);
        Assert.Equal(time, result.StoppedAt, 1e-6 * time);
        Assert.Equal(1e-3, Math.Abs(result.FinalLevel - result.ReceiverLevel!.Value), 1e-9);
    }

    [Fact]
    public void What_comes_back_counts_as_drained_below_nothing()
    {
        DrainResult result = Jobs.Run(Joined(1, 3));
        Assert.Equal(Source * (1 - result.FinalLevel), result.DrainedVolume, 1e-9);
        Assert.True(result.DrainedVolume < 0);
        Assert.True(result.Trace.At(0).Flow < 0);
    }

    [Fact]
    public void A_capillary_levels_them_exponentially()
    {
        const double bore = 0.004, length = 2, viscosity = 5, density = 900;
        Line capillary = Jobs.Orifice(bore, 1) with { Path = [new StraightRun { Length = length, Rise = 0 }] };
        Job job = Joined(3, 1) with
        {
            Liquid = Jobs.Water with { Density = density, Viscosity = viscosity },
            DrawOffs = [new DrawOff { Line = capillary, Receiver = Tank(1) }],
            Run = new RunSettings { Until = 1e12 },
        };
        double rate = Math.PI * Math.Pow(bore, 4) * density * Site.StandardGravity / (128 * viscosity * length) * (1 / Source + 1 / Sink);
        double time = Math.Log(2 / 1e-3) / rate;
        Assert.Equal(time, Jobs.Run(job).StoppedAt, 1e-6 * time);
    }

    /// <summary>Free discharge until A₂·(z − bottom) has arrived, then the law of two surfaces.</summary>
    [Fact]
    public void The_outlet_is_free_until_the_receiver_covers_it()
    {
        const double depth = 0.4;
        Job job = Joined(3, 0) with
        {
            DrawOffs = [new DrawOff { Line = Jobs.Orifice(0.05, 0.6), Receiver = Tank(0) with { Bottom = -depth } }],
        };
        DrainResult result = Jobs.Run(job);
        double level = 3 - depth * Sink / Source;
        double covered = 2 * Source / Jobs.OrificeFactor() * (Math.Sqrt(3) - Math.Sqrt(level));
        DrainEvent covers = Assert.Single(result.Events, e => e.Code == EventCode.OutletCovered);
        Assert.Equal(covered, covers.Time, 1e-9 * result.StoppedAt);
        double time = covered + (Math.Sqrt(level) - Math.Sqrt(1e-3)) / Rate;
        Assert.Equal(time, result.StoppedAt, 1e-6 * time);
    }

    [Theory]
    [InlineData(1.5)]
    [InlineData(null)]
    public void The_receiver_stops_the_line_at_its_brim(double? brim)
    {
        Job job = Joined(3, 0.5) with
        {
            DrawOffs = [new DrawOff { Line = Jobs.Orifice(0.05, 0.6), Receiver = Tank(0.5) with { Bottom = -5, Brim = brim } }],
        };
        DrainResult result = Jobs.Run(job);
        double full = brim ?? 4, level = 3 - (full - 0.5) * Sink / Source;
        double time = 2 * Source / Jobs.OrificeFactor() * (Math.Sqrt(3) - Math.Sqrt(level));
        Assert.Equal(Outcome.ReceiverFull, result.Outcome);
        Assert.Equal(full, result.ReceiverLevel!.Value, 1e-9);
        Assert.Equal(time, result.StoppedAt, 1e-9 * time);
    }

    [Fact]
    public void A_line_that_hangs_in_the_air_does_not_run_backwards()
    {
        Line up = Jobs.Orifice(0.05, 0.6) with { Path = [new StraightRun { Length = 4, Rise = 3.5 }] };
        DrainResult result = Jobs.Run(Joined(3, 1) with { DrawOffs = [new DrawOff { Line = up, Receiver = Tank(1) }] });
        Assert.Equal((Outcome.NeverStarted, NoStart.NoDrivingHead), (result.Outcome, result.NoStart));
    }

    /// <summary>Back flow from a receiver whose surface sinks to the outlet: the outlet takes air and the line is finished.</summary>
    [Fact]
    public void A_receiver_that_runs_back_to_the_outlet_is_left_there()
    {
        Line up = Jobs.Orifice(0.05, 0.6) with { Path = [new StraightRun { Length = 1e-9, Rise = 2 }] };
        DrainResult result = Jobs.Run(Joined(0.5, 3) with { DrawOffs = [new DrawOff { Line = up, Receiver = Tank(3) }] });
        Assert.Equal(Outcome.Levelled, result.Outcome);
        Assert.Contains(result.Events, e => e.Code == EventCode.OutletFreed);
        Assert.Equal(2, result.ReceiverLevel!.Value, 1e-6);
    }

    private static ReceivingTank Tank(double level) => new() { Vessel = Jobs.Prism(Sink, 4), Bottom = 0, Level = level };

    private static Job Joined(double here, double there) => Jobs.OrificeDrain(Source, 4, here) with
    {
        DrawOffs = [new DrawOff { Line = Jobs.Orifice(0.05, 0.6), Receiver = Tank(there) }],
    };
}
