using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;

namespace DrainSim.Tests.Reports;

public sealed class EventWordingTests
{
    private static readonly MeasureFormat Metric = new(UnitSystem.Metric);

    [Theory]
    [InlineData(EventCode.TenthGone, 3, "tenth_gone", "30 % of the volume is gone")]
    [InlineData(EventCode.LeftTurbulent, 4000, "left_turbulent", "the flow leaves the turbulent range (Re 4000)")]
    [InlineData(EventCode.BecameLaminar, 2000, "became_laminar", "the flow becomes laminar (Re 2000)")]
    [InlineData(EventCode.VapourLimitBegins, 0, "vapour_limit_begins",
        "the low point reaches the vapour pressure; from here the flow is held there")]
    [InlineData(EventCode.InletUncovered, 0, "inlet_uncovered", "air reaches the inlet")]
    public void An_event_says_what_happened(EventCode code, double number, string expectedCode, string text)
    {
        Assert.Equal(expectedCode, ReportCodes.Of(code));
        Assert.Equal(text, EventWording.Text(new DrainEvent(1, code, 1, 1, number), new InventedRun().Job));
    }

    [Fact]
    public void Every_member_has_a_code_and_a_text()
    {
        Job plain = new InventedRun().Job;
        Job job = plain with { Timeline = [new Act { Time = 60, After = plain, Text = "the valve is set to 50 %" }] };
        Assert.All(Enum.GetValues<EventCode>(), code =>
        {
            Assert.Matches("^[a-z_]+$", ReportCodes.Of(code));
            Assert.NotEmpty(EventWording.Text(new DrainEvent(1, code, 1, 1, 1), job));
        });
        Assert.All(Enum.GetValues<WarningCode>(), code =>
        {
            Assert.Matches("^[a-z_]+$", ReportCodes.Of(code));
            Assert.EndsWith(".", EventWording.Text(new RunWarning(code, 0.1), Metric), StringComparison.Ordinal);
        });
        Assert.All(Enum.GetValues<NoStart>(), reason => Assert.Matches("^[a-z_]+$", ReportCodes.Of(reason)));
    }

    [Theory]
    [InlineData(RemedyKind.LowerOutlet,
        "Lowering the outlet by 0.35 m (to −1.2 m) would let it run on: run so, it goes down to the inlet, at 50 mm, in 2 h 30 min.")]
    [InlineData(RemedyKind.LowerCrest,
        "Lowering the crest by 0.35 m (to −1.2 m) would let it run on: run so, it goes down to the inlet, at 50 mm, in 2 h 30 min.")]
    [InlineData(RemedyKind.ThrottleOutlet,
        "Throttling at the outlet by a loss coefficient of 0.35 would let it run on: run so, it goes down to the inlet, at 50 mm, in 2 h 30 min.")]
    public void A_remedy_says_by_how_much_and_what_came_of_it(RemedyKind kind, string text) =>
        Assert.Equal(text, EventWording.Text(new Remedy(kind, 0.35, -1.2, Outcome.InletUncovered, 9000, 0.05), Metric));
}
