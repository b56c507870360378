using CsCheck;
using DrainSim.Draining;
using DrainSim.Reports.Series;

namespace DrainSim.Tests.Reports;

public sealed class SampleTimesTests
{
    [Theory]
    [InlineData(0.5, 0.002)]
    [InlineData(60, 0.2)]
    [InlineData(400, 1)]
    [InlineData(401, 2)]
    [InlineData(6125, 20)]
    [InlineData(86400, 300)]
    [InlineData(30 * 86400.0, 7200)]
    [InlineData(300 * 86400.0, 86400)]
    [InlineData(3e4 * 86400.0, 100 * 86400.0)]
    public void The_interval_chosen_is_one_that_people_count_in(double end, double expected) =>
        Assert.Equal(expected, SampleTimes.Interval(end, null), 1e-9 * expected);

    [Fact]
    public void An_interval_asked_for_is_kept() => Assert.Equal(7.5, SampleTimes.Interval(6125, 7.5));

    [Fact]
    public void A_chosen_interval_makes_between_160_and_400_steps() =>
        Gen.Double[-2, 8].Sample(power =>
        {
            double end = Math.Pow(10, power);
            double steps = end / SampleTimes.Interval(end, null);
            return steps > 159 && steps <= 400.001;
        });

    [Fact]
    public void Times_rise_strictly_and_hold_every_event_and_both_ends() =>
        Gen.Select(Gen.Double[0.1, 1e6], Gen.Double[0, 1].Array[0, 12], Gen.Double[3, 500]).Sample((end, shares, steps) =>
        {
            DrainResult result = new InventedRun
            {
                End = end,
                MoreEvents = [.. shares.Select(share => new DrainEvent(share * end, EventCode.BecameLaminar, 1, 1, 2000))],
                Run = new() { ReportEvery = end / steps },
            }.Result();
            double[] times = [.. SampleTimes.Of(result)];
            return times[0] == 0 && times[^1] == end
                && times.Zip(times.Skip(1)).All(pair => pair.First < pair.Second)
                && result.Events.All(moment => times.Contains(moment.Time));
        });

    [Fact]
    public void A_run_without_events_is_still_reported_at_its_end() =>
        Assert.Equal(6125, SampleTimes.Of(new InventedRun().Result() with { Events = [] }).Last());

    [Fact]
    public void A_run_that_never_starts_has_one_row() =>
        Assert.Equal([0.0], SampleTimes.Of(new InventedRun { Outcome = Outcome.NeverStarted }.Result()));
}
