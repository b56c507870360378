using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Liquids;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using DrainSim.Vessels;

namespace DrainSim.Tests.Reports;

public sealed class CautionsTests
{
    [Theory]
    [InlineData(LiquidHazards.Flammable, "flammable")]
    [InlineData(LiquidHazards.Combustible, "combustible")]
    [InlineData(LiquidHazards.Hot, "hot")]
    [InlineData(LiquidHazards.Corrosive, "corrosive")]
    [InlineData(LiquidHazards.Toxic, "toxic")]
    [InlineData(LiquidHazards.Polluting, "polluting")]
    public void Each_hazard_of_the_liquid_brings_its_caution(LiquidHazards hazard, string code)
    {
        Assert.Contains(code, Codes(new InventedRun { Hazards = hazard }));
        Assert.DoesNotContain(code, Codes(new InventedRun()));
    }

    [Fact]
    public void A_line_that_climbs_above_its_inlet_is_never_started_by_mouth()
    {
        Assert.Contains("never_by_mouth", Codes(new InventedRun()));
        Assert.DoesNotContain("never_by_mouth", Codes(new InventedRun { CrestElevation = 0.04 }));
    }

    [Fact]
    public void An_earth_bank_is_drawn_down_with_care_and_a_tank_is_a_confined_space()
    {
        Job tank = new InventedRun().Job;
        Job pond = tank with { Vessel = new Basin { BottomLength = 20, BottomWidth = 10, SideSlope = 2, Depth = 3 } };
        Assert.Contains("earth_dam_drawdown", Codes(pond));
        Assert.DoesNotContain("confined_space", Codes(pond));
        Assert.Contains("confined_space", Codes(tank));
    }

    [Fact]
    public void A_tank_that_cannot_breathe_freely_may_collapse()
    {
        Job tank = new InventedRun().Job;
        Assert.Contains("vacuum_collapse", Codes(tank with { Headspace = new ClosedHeadspace() }));
        Assert.DoesNotContain("vacuum_collapse", Codes(tank));
    }

    [Fact]
    public void Every_list_ends_with_what_the_program_may_not_do() =>
        Assert.Equal("authorises_nothing", Codes(new InventedRun { Hazards = LiquidHazards.Toxic })[^1]);

    [Fact]
    public void Flammable_speaks_of_bonding_a_slow_start_and_ignition()
    {
        Job job = new InventedRun { Hazards = LiquidHazards.Flammable }.Job;
        string text = Cautions.For(job, new MeasureFormat(UnitSystem.Metric))[0].Text;
        Assert.Contains("bond", text, StringComparison.Ordinal);
        Assert.Contains("slowly", text, StringComparison.Ordinal);
        Assert.Contains("ignition", text, StringComparison.Ordinal);
    }

    private static string[] Codes(InventedRun run) => Codes(run.Job);

    private static string[] Codes(Job job) =>
        [.. Cautions.For(job, new MeasureFormat(UnitSystem.Metric)).Select(caution => caution.Code)];
}
