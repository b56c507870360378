using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;

namespace DrainSim.Tests.Reports;

/// <summary>The approved sentences.</summary>
public sealed class VerdictTests
{
    [Fact]
    public void Air_at_the_inlet() => AssertSentence(new InventedRun(),
        "Stops after 1 h 42 min with 312 L left: air reaches the inlet at 0.12 m.",
        "Stops after 1 h 42 min with 82.4 gal left: air reaches the inlet at 4.72 in.");

    [Fact]
    public void Empty() => AssertSentence(new InventedRun { Outcome = Outcome.Emptied, EndLevel = 0 },
        "Empties in 1 h 42 min; nothing but a film is left.",
        "Empties in 1 h 42 min; nothing but a film is left.");

    [Fact]
    public void The_column_parts_at_the_vapour_pressure() => AssertSentence(
        new InventedRun { Outcome = Outcome.VapourBreak, EndLevel = 0.85 },
        "Stops after 1 h 42 min with 2.21 m³ left: at 0.85 m the low point reaches the vapour pressure and the column parts.",
        "Stops after 1 h 42 min with 584 gal left: at 2.79 ft the low point reaches the vapour pressure and the column parts.");

    [Fact]
    public void The_column_parts_at_the_least_pressure_allowed() => AssertSentence(
        new InventedRun { Outcome = Outcome.VapourBreak, EndLevel = 0.85, LeastPressure = 60e3 },
        "Stops after 1 h 42 min with 2.21 m³ left: at 0.85 m the low point reaches the least pressure allowed and the column parts.",
        "Stops after 1 h 42 min with 584 gal left: at 2.79 ft the low point reaches the least pressure allowed and the column parts.");

    [Fact]
    public void Level_with_the_outlet() => AssertSentence(
        new InventedRun { Outcome = Outcome.Levelled, OutletElevation = 0.4, EndLevel = 0.4 },
        "Stops after 1 h 42 min with 1.04 m³ left: at 0.4 m it stands level with the outlet.",
        "Stops after 1 h 42 min with 275 gal left: at 1.31 ft it stands level with the outlet.");

    [Fact]
    public void Level_with_the_receiver() => AssertSentence(
        new InventedRun { Outcome = Outcome.Levelled, ReceiverSurface = 0.4, EndLevel = 0.4 },
        "Stops after 1 h 42 min with 1.04 m³ left: at 0.4 m it stands level with the receiving surface.",
        "Stops after 1 h 42 min with 275 gal left: at 1.31 ft it stands level with the receiving surface.");

    [Fact]
    public void A_level_asked_for() => AssertSentence(
        new InventedRun { Outcome = Outcome.TargetReached, EndLevel = 0.5, Run = new() { StopAtLevel = 0.5 } },
        "Reaches the level asked for, 0.5 m, after 1 h 42 min with 1.3 m³ left.",
        "Reaches the level asked for, 1.64 ft, after 1 h 42 min with 343 gal left.");

    [Fact]
    public void A_volume_asked_for() => AssertSentence(
        new InventedRun { Outcome = Outcome.TargetReached, EndLevel = 0.5, Run = new() { StopAtVolume = 1.3, StopAtLevel = 0.2 } },
        "Reaches the volume asked for, 1.3 m³, after 1 h 42 min; the level is 0.5 m.",
        "Reaches the volume asked for, 343 gal, after 1 h 42 min; the level is 1.64 ft.");

    [Fact]
    public void Time_is_up() => AssertSentence(
        new InventedRun { Outcome = Outcome.TimeLimit, EndLevel = 0.5, End = 43200 },
        "Not done after 12 h, the longest time given: 1.3 m³ left, at 0.5 m.",
        "Not done after 12 h, the longest time given: 343 gal left, at 1.64 ft.");

    [Fact]
    public void The_inlet_hangs_too_high() => AssertSentence(
        Never(NoStart.InletAboveLevel) with { StartLevel = 0.03 },
        "Never starts: the inlet, at 50 mm, stands above the level of 30 mm.",
        "Never starts: the inlet, at 1.97 in, stands above the level of 1.18 in.");

    [Fact]
    public void The_outlet_stands_too_high() => AssertSentence(
        Never(NoStart.NoDrivingHead) with { OutletElevation = 2.8 },
        "Never starts: the outlet, at 2.8 m, stands no lower than the level of 2.6 m.",
        "Never starts: the outlet, at 9.19 ft, stands no lower than the level of 8.53 ft.");

    [Fact]
    public void The_crest_stands_too_high() => AssertSentence(
        Never(NoStart.LiftBeyondLimit) with { Prime = new(0.01, 0.004, 0.006, 2, 10.4, 10.1, 9e4) },
        "Never starts: the crest stands 10.4 m above the level, and no column higher than 10.1 m holds together.",
        "Never starts: the crest stands 34.1 ft above the level, and no column higher than 33.1 ft holds together.");

    [Fact]
    public void A_yield_stress_holds() => AssertSentence(Never(NoStart.YieldHolds),
        "Never starts: the liquid's yield stress holds it at the level of 2.6 m.",
        "Never starts: the liquid's yield stress holds it at the level of 8.53 ft.");

    [Fact]
    public void A_valve_is_shut() => AssertSentence(Never(NoStart.ValveShut),
        "Never starts: a valve on the line is shut.",
        "Never starts: a valve on the line is shut.");

    [Fact]
    public void Every_outcome_has_a_code_that_reads_back()
    {
        Assert.Equal(
            [
                "emptied", "inlet_uncovered", "vapour_break", "air_break", "levelled", "vacuum_held", "yield_held", "balanced",
                "receiver_full", "overflowed", "target_reached", "time_limit", "never_started",
            ],
            OutcomeCodes.All);
        foreach (Outcome outcome in Enum.GetValues<Outcome>())
        {
            Assert.True(OutcomeCodes.TryParse(OutcomeCodes.Code(outcome), out Outcome read));
            Assert.Equal(outcome, read);
            Assert.NotEmpty(Verdict.Headline(outcome));
        }
        Assert.False(OutcomeCodes.TryParse("Emptied", out _));
    }

    private static InventedRun Never(NoStart reason) => new() { Outcome = Outcome.NeverStarted, NoStart = reason };

    private static void AssertSentence(InventedRun run, string metric, string us)
    {
        DrainResult result = run.Result();
        Assert.Equal(metric, Verdict.Sentence(result, new MeasureFormat(UnitSystem.Metric)));
        Assert.Equal(us, Verdict.Sentence(result, new MeasureFormat(UnitSystem.Us)));
    }
}
