using DrainSim.Lines;

namespace DrainSim.Tests.Lines;

/// <summary>The built-in tables of a line: every trade word finds its row, every row has a source.</summary>
public sealed class LineTablesTests
{
    [Theory]
    [InlineData("bend_90", 800, 0.2)]
    [InlineData("bend_45", 500, 0.15)]
    [InlineData("bend_180", 1000, 0.3)]
    public void A_plain_bend_follows_Hoopers_long_radius_row(string word, double laminar, double turbulent)
    {
        LossLaw law = FittingTable.Find(word)!.Loss;
        Assert.Equal((LossMethod.TwoK, laminar, turbulent), (law.Method, law.LaminarConstant, law.Coefficient));
    }

    [Theory]
    [InlineData("elbow_90", 800)]
    [InlineData("elbow_45", 500)]
    [InlineData("tee_run", 200)]
    [InlineData("tee_branch", 800)]
    [InlineData("mitre_30", 500)]
    [InlineData("foot_valve", 2000)]
    public void A_row_by_equivalent_length_borrows_its_laminar_rise(string word, double laminar) =>
        Assert.Equal(laminar, FittingTable.Find(word)!.Loss.LaminarConstant);

    [Fact]
    public void Every_fitting_and_valve_that_turns_or_throttles_rises_in_laminar_flow()
    {
        var laws = FittingTable.All.Select(row => (row.Id, row.Loss)).Concat(ValveTable.All.Select(row => (row.Id, row.Loss)));
        Assert.Equal(["mitre_0"], laws.Where(row => row.Loss.LaminarConstant == 0).Select(row => row.Id));
    }

    [Theory]
    [InlineData("ball")]
    [InlineData("gate")]
    [InlineData("globe")]
    [InlineData("butterfly")]
    [InlineData("plug")]
    [InlineData("diaphragm")]
    [InlineData("angle")]
    [InlineData("check")]
    [InlineData("foot")]
    public void A_valve_of_the_trade_is_found_and_its_capacity_rises_strictly_from_shut_to_open(string word)
    {
        ValveCharacteristic curve = ValveTable.Find(word)!.Characteristic;
        Assert.Equal((0, 1), (curve.RelativeCapacity(0), curve.RelativeCapacity(1)));
        double last = 0;
        for (int i = 1; i <= 1000; i++)
        {
            double capacity = curve.RelativeCapacity(i / 1000.0);
            Assert.InRange(capacity, Math.BitIncrement(last), last + 0.02); // no step
            last = capacity;
        }
    }

    [Theory]
    [InlineData("gate", 0.5, 0.17, 4.5)]
    [InlineData("globe", 0.25, 9, 112)]
    [InlineData("diaphragm", 0.75, 2.3, 2.6)]
    public void A_throttled_valve_loses_what_the_handbook_prints(string word, double opening, double open, double throttled)
    {
        double capacity = ValveTable.Find(word)!.Characteristic.RelativeCapacity(opening);
        Assert.Equal(throttled, open / (capacity * capacity), throttled * 1e-3); // the table keeps four digits
    }

    [Theory]
    [InlineData("sharp", 0.5)]
    [InlineData("re_entrant", 0.78)]
    [InlineData("re_entrant_thin", 1)]
    [InlineData("rounded", 0.15)]
    [InlineData("rounded_r0.1", 0.09)]
    [InlineData("bellmouth", 0.04)]
    [InlineData("chamfered", 0.247)]
    [InlineData("entrance_sharp", 0.5)]
    public void An_inlet_edge_is_found_by_word_or_row(string word, double loss) =>
        Assert.Equal(loss, EdgeTable.Find(word)!.Loss);

    [Theory]
    [InlineData("smooth_hose", 5e-6)]
    [InlineData("rubber_hose", 3e-5)]
    [InlineData("suction_hose", 3e-4)]
    [InlineData("layflat", 5e-5)]
    [InlineData("pvc", 5e-6)]
    [InlineData("pe", 5e-6)]
    [InlineData("hdpe", 5e-6)]
    [InlineData("steel", 4.6e-5)]
    [InlineData("stainless", 3e-5)]
    [InlineData("cast_iron", 2.59e-4)]
    [InlineData("concrete", 1e-3)]
    [InlineData("copper", 1.5e-6)]
    [InlineData("glass", 5e-6)]
    [InlineData("galvanized_steel", 1.52e-4)]
    public void A_material_of_the_trade_has_its_roughness(string word, double roughness) =>
        Assert.Equal(roughness, MaterialTable.Find(word)!.Roughness, 1e-12);

    [Fact]
    public void A_roughness_lies_in_the_range_of_its_source() =>
        Assert.DoesNotContain(MaterialTable.All, row => // values in feet and in millimetres meet within 2 %
            row.Roughness < row.LeastRoughness / 1.02 || row.Roughness > row.MostRoughness * 1.02);

    [Theory]
    [InlineData("DN50", null, 52.48)]
    [InlineData("DN 50", "40", 52.48)]
    [InlineData("2 in", null, 52.48)]
    [InlineData("2 in", "SCH 80", 49.22)]
    [InlineData("1 1/2 in", null, 40.94)]
    [InlineData("DN100", "10S", 108.2)]
    [InlineData("HOSE_38MM", null, 38)]
    [InlineData("38 mm hose", null, 38)]
    [InlineData("2 in hose", null, 50.8)]
    [InlineData("DN50_SCH80", null, 49.22)]
    public void A_nominal_size_has_its_bore(string size, string? schedule, double millimetres) =>
        Assert.Equal(millimetres / 1000, SizeTable.Find(size, schedule)!.Bore, 1e-12);

    [Theory]
    [InlineData("DN51", null)]
    [InlineData("DN50", "30")]
    [InlineData("38 mm hose", "40")]
    public void A_size_that_is_not_listed_is_not_found(string size, string? schedule) =>
        Assert.Null(SizeTable.Find(size, schedule));

    [Fact]
    public void The_bore_of_a_steel_pipe_is_its_outside_less_two_walls() =>
        Assert.All(SizeTable.All.Where(row => row.Wall is not null), row =>
            Assert.Equal(row.OutsideDiameter!.Value - 2 * row.Wall!.Value, row.Bore, 1e-5)); // printed to 0.01 mm

    [Fact]
    public void Every_row_names_its_source()
    {
        Assert.DoesNotContain("", FittingTable.All.Select(row => row.Source).Concat(ValveTable.All.Select(row => row.Source))
            .Concat(ValveTable.All.Select(row => row.Characteristic.Source)).Concat(EdgeTable.All.Select(row => row.Source))
            .Concat(MaterialTable.All.Select(row => row.Source)).Concat(SizeTable.All.Select(row => row.Source)));
    }

    [Fact]
    public void A_name_that_is_no_row_is_not_found()
    {
        Assert.Null(FittingTable.Find("bend_91"));
        Assert.Null(ValveTable.Find("Ball"));
        Assert.Null(EdgeTable.Find(""));
        Assert.Null(MaterialTable.Find("hose"));
    }
}
