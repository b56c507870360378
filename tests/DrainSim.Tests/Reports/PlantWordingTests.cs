using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Liquids;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using DrainSim.Tests.Draining;

namespace DrainSim.Tests.Reports;

/// <summary>What a whole run of a coupled plant says to people.</summary>
public sealed class PlantWordingTests
{
    private static readonly MeasureFormat Metric = new(UnitSystem.Metric);

    [Fact]
    public void A_rating_that_is_passed_stands_in_the_verdict()
    {
        DrainResult result = Jobs.Run(Jobs.OrificeDrain() with { Headspace = new ClosedHeadspace(), VacuumRating = 500 });
        string sentence = Verdict.Sentence(result, Metric);
        Assert.Matches("the vacuum in the headspace holds the liquid up. The tank's vacuum rating of 0.5 kPa is passed after [0-9.]+ s.$", sentence);
        DrainResult kept = Jobs.Run(Jobs.OrificeDrain() with { Headspace = new ClosedHeadspace(), VacuumRating = 90e3 });
        Assert.DoesNotContain("rating", Verdict.Sentence(kept, Metric), StringComparison.Ordinal);
    }

    [Fact]
    public void A_tank_that_levels_with_its_receiver_says_so()
    {
        ReceivingTank tank = new() { Vessel = Jobs.Prism(2, 4), Bottom = -0.5 };
        Job job = Jobs.OrificeDrain() with { DrawOffs = [new DrawOff { Line = Jobs.Orifice(0.05, 0.6), Receiver = tank }] };
        Assert.EndsWith("it stands level with the liquid in the receiver.", Verdict.Sentence(Jobs.Run(job), Metric), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(LiquidHazards.Flammable, true)]
    [InlineData(LiquidHazards.Combustible, false)]
    public void A_flammable_liquid_that_runs_fast_names_the_standards_of_slow_start(LiquidHazards hazard, bool isNamed)
    {
        Job job = Jobs.OrificeDrain() with { Liquid = Jobs.Inviscid with { Hazards = hazard } };
        Caution[] charging = [.. Cautions.For(Jobs.Run(job), Metric).Where(caution => caution.Code == "static_charge")];
        Assert.Equal(isNamed ? 1 : 0, charging.Length);
        Assert.All(charging, caution => Assert.Contains("API RP 2003 and IEC TS 60079-32-1", caution.Text, StringComparison.Ordinal));
        Assert.All(charging, caution => Assert.Contains("no permission", caution.Text, StringComparison.Ordinal));
        Assert.DoesNotContain(Cautions.For(job, Metric), caution => caution.Code == "static_charge"); // before a run no velocity is known
    }

    [Theory]
    [InlineData(LimitKind.DrainTimeAtMost, 7200, 3600, true, "Drain time at most 2 h: kept, 1 h.")]
    [InlineData(LimitKind.LargestVacuum, 500, 600, false, "Vacuum in the headspace at most 0.5 kPa: BROKEN, 0.6 kPa after 30 s.")]
    [InlineData(LimitKind.FastestFall, 0.5 / 3600, 0.25 / 3600, true, "Fall of the level at most 0.5 m an hour: kept, 0.25 m an hour after 30 s.")]
    public void A_limit_is_told_with_its_worst_value_and_moment(LimitKind kind, double bound, double worst, bool isKept, string text) =>
        Assert.Equal(text, LimitWording.Text(new LimitCheck(kind, bound, new Extreme(worst, 30), isKept), Metric));

    [Fact]
    public void A_hose_that_is_sucked_past_its_rating_is_an_event_and_a_warning()
    {
        Job job = Jobs.Siphon();
        DrainResult result = Jobs.Run(job with { DrawOffs = Jobs.Only(Jobs.SiphonLine() with { VacuumRating = 30e3 }) });
        DrainEvent passed = Assert.Single(result.Events, e => e.Code == EventCode.HoseRatingPassed);
        double atmosphere = job.Site.AtmosphericPressure;
        Assert.Equal(atmosphere - 30e3, result.Trace.At(passed.Time).LowPointPressure, 1);
        Assert.Contains(result.Warnings, w => w.Code == WarningCode.HoseMayFlatten);
        Assert.DoesNotContain(Jobs.Run(job with { DrawOffs = Jobs.Only(Jobs.SiphonLine() with { VacuumRating = 90e3 }) }).Events, e => e.Code == EventCode.HoseRatingPassed);
    }
}
