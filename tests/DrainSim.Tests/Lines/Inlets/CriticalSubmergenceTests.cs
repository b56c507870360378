using CsCheck;
using DrainSim.Lines;
using DrainSim.Lines.Inlets;
using DrainSim.Tests.Liquids;

namespace DrainSim.Tests.Lines.Inlets;

public sealed class CriticalSubmergenceTests
{
    private const double Gravity = 9.80665;

    private static readonly Gen<InletFacing> Facings = Gen.Int[0, 2].Select(facing => (InletFacing)facing);

    [Fact]
    public void Every_form_meets_its_check_values()
    {
        var rows = CheckTable.Rows("Lines.Inlets.submergence-check-values.csv");
        Assert.Equal(12, rows.Count);
        Assert.Empty(rows.Select(row => row.Miss(row.Number("submergence_m"), SubmergenceTable.Find(row["formula_id"])!
            .Depth(row.Number("velocity_m_s"), row.Number("diameter_m"), Gravity))).OfType<string>());
    }

    [Fact]
    public void Every_form_of_the_table_is_evaluated_and_has_a_source() =>
        Assert.All(SubmergenceTable.All, row =>
        {
            Assert.InRange(row.Depth(2, 0.1, Gravity), 0.01, 1);
            Assert.NotEmpty(row.Source);
            Assert.NotEmpty(row.Equation);
        });

    [Fact]
    public void The_table_has_nine_forms() => Assert.Equal(9, SubmergenceTable.All.Count);

    [Fact]
    public void An_inlet_of_100_mm_at_2_m_per_s_needs_0_564_m_by_the_hydraulic_institute() =>
        // A worked example on a web page on pump intakes after ANSI/HI 9.8, printed with three digits.
        Assert.Equal(0.564, SubmergenceTable.Find("hi_9_8")!.Depth(2, 0.1, 9.81), 5e-4);

    [Fact]
    public void Three_litres_per_second_dip_43_mm_over_a_drain_of_50_mm() =>
        // Our evaluation by hand of Lubin and Springer's form, H/a = 0.69·(Q²/(g·a⁵))^0.2, two digits.
        Assert.Equal(0.043, SubmergenceTable.Find("lubin_springer")!.Depth(3e-3 / (Math.PI / 4 * 0.0025), 0.05, 9.81), 5e-4);

    [Theory]
    [InlineData(InletFacing.Down, "hi_9_8 reddy_pickford knauss prosser", null)]
    [InlineData(InletFacing.Side, "hi_9_8 gordon_symmetric gordon_lateral reddy_pickford knauss", "craya_side")]
    [InlineData(InletFacing.Up, "hi_9_8 reddy_pickford knauss", "lubin_springer")]
    public void Each_facing_has_its_own_forms(InletFacing facing, string design, string? pullThrough)
    {
        CriticalSubmergence submergence = new(facing);
        Assert.Equal(design, string.Join(' ', submergence.Design.Select(row => row.Id)));
        Assert.Equal(pullThrough, submergence.PullThrough?.Id);
    }

    [Fact]
    public void A_suppressor_lowers_the_least_depth_alone()
    {
        SubmergenceBand bare = new CriticalSubmergence(InletFacing.Up).At(2, 0.1, Gravity);
        SubmergenceBand crossed = new CriticalSubmergence(InletFacing.Up, hasSuppressor: true).At(2, 0.1, Gravity);
        Assert.True(crossed.Least < bare.Least);
        Assert.Equal(bare.Most, crossed.Most);
    }

    [Fact]
    public void The_depths_of_a_side_inlet_count_from_its_lowest_edge()
    {
        SubmergenceBand band = new CriticalSubmergence(InletFacing.Side).At(2.5, 0.3, Gravity);
        Assert.Equal(0.15 + 0.2179962, band.PullThrough!.Value, 1e-6);
        Assert.Equal(0.3 + 1.305699, band.Most, 1e-6);
    }

    [Fact]
    public void The_band_is_what_its_forms_say_over_the_rim()
    {
        SubmergenceBand band = new CriticalSubmergence(InletFacing.Down).At(1, 0.1, Gravity);
        Assert.Equal(0.15, band.Least, 1e-12);
        Assert.Equal(0.3322563, band.Most, 1e-6);
        Assert.Null(band.PullThrough);
    }

    [Fact]
    public void A_faster_flow_never_needs_less_depth() =>
        Gen.Select(Facings, Gen.Double[0, 5], Gen.Double[0, 1], Gen.Double[0.01, 1]).Sample((facing, v, more, d) =>
        {
            CriticalSubmergence submergence = new(facing);
            SubmergenceBand slow = submergence.At(v, d, Gravity);
            SubmergenceBand fast = submergence.At(v + more, d, Gravity);
            return slow.Least <= fast.Least && slow.Most <= fast.Most && slow.Least <= slow.Most
                && !(slow.PullThrough > fast.PullThrough);
        });
}
