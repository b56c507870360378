using CsCheck;
using DrainSim.Gas;
using DrainSim.Tests.Liquids;

namespace DrainSim.Tests.Gas;

public sealed class CompressibleOrificeTests
{
    private const double Atmosphere = 101325;
    private const double Band = CompressibleOrifice.LinearBand;

    private static readonly Gen<double> Pressures = Gen.Double[1e3, 3e5];

    // Half of the differences are of the order of the band.
    private static readonly Gen<double> Shares =
        Gen.OneOf(Gen.Double[0, 0.9], Gen.Double[-9, -0.1].Select(exponent => Math.Pow(10, exponent)));

    [Fact]
    public void The_mass_flow_meets_every_check_value()
    {
        var rows = CheckTable.Rows("Gas.vent-check-values.csv");
        Assert.Equal(10, rows.Count);
        Assert.Empty(rows.Select(row => row.Miss(row.Number("mass_flow_kg_s"), Ours(row))).OfType<string>());
    }

    [Fact]
    public void A_flow_is_choked_just_where_the_check_values_say_so() =>
        Assert.All(CheckTable.Rows("Gas.vent-check-values.csv"), row => Assert.Equal(row["choked"] == "yes",
            row.Number("p_downstream_Pa") / row.Number("p_upstream_Pa") <= GasOf(row).CriticalPressureRatio));

    [Fact]
    public void Swapping_the_pressures_changes_the_sign_alone() =>
        Gen.Select(Pressures, Shares).Sample((p, x) =>
            Flow(p, p * (1 - x)).MassFlow == -Flow(p * (1 - x), p).MassFlow);

    [Fact]
    public void The_flow_never_falls_with_the_first_pressure_nor_rises_with_the_second() =>
        Gen.Select(Pressures, Shares, Gen.Bool).Sample((p, x, forward) =>
        {
            GasFlow flow = forward ? Flow(p, p * (1 - x)) : Flow(p * (1 - x), p);
            return flow.FirstSlope >= 0 && flow.SecondSlope <= 0;
        });

    [Fact]
    public void The_slopes_are_those_of_the_flow() =>
        Gen.Select(Pressures, Shares, Gen.Bool).Sample((p, x, forward) =>
        {
            (double p1, double p2) = forward ? (p, p * (1 - x)) : (p * (1 - x), p);
            // A step well inside the distance over which the slope changes, but above the last bits of the pressure.
            double step = 1e-3 * Math.Max(Math.Abs(p1 - p2), p * Band);
            GasFlow flow = Flow(p1, p2);
            double first = (Flow(p1 + step, p2).MassFlow - Flow(p1 - step, p2).MassFlow) / (2 * step);
            double second = (Flow(p1, p2 + step).MassFlow - Flow(p1, p2 - step).MassFlow) / (2 * step);
            double size = Math.Max(Math.Abs(first), Math.Abs(second));
            double choke = IdealGas.Air.CriticalPressureRatio;
            // The second derivative jumps at the choking point and at the end of the band.
            double tolerance = Math.Abs(1 - x - choke) < 2e-3 || Math.Abs(x / Band - 1) < 0.01 ? 1e-2 : 2e-4;
            return Math.Abs(flow.FirstSlope - first) <= tolerance * size
                && Math.Abs(flow.SecondSlope - second) <= tolerance * size;
        });

    [Fact]
    public void Neither_flow_nor_slope_jumps_at_the_end_of_the_band()
    {
        GasFlow inside = Flow(Atmosphere, Atmosphere * (1 - Band * (1 - 1e-6)));
        GasFlow outside = Flow(Atmosphere, Atmosphere * (1 - Band * (1 + 1e-6)));
        // 2e-6 apart in pressure; the last bits of 1 atm are 1.4e-10 of the band.
        Assert.Equal(1, inside.MassFlow / outside.MassFlow, 2e-6);
        Assert.Equal(1, inside.SecondSlope / outside.SecondSlope, 1e-5);
    }

    [Fact]
    public void The_slope_at_rest_is_finite_and_five_quarters_of_the_chord() =>
        Assert.Equal(1.25, -Flow(Atmosphere, Atmosphere).SecondSlope * Band * Atmosphere
            / Flow(Atmosphere, Atmosphere * (1 - Band)).MassFlow, 1e-6);

    [Fact]
    public void The_band_shifts_the_flow_by_no_more_than_the_bound_of_its_doc() =>
        Gen.Double[0, 1].Sample(u =>
        {
            double end = Flow(Atmosphere, Atmosphere * (1 - Band)).MassFlow;
            double difference = Flow(Atmosphere, Atmosphere * (1 - u * Band)).MassFlow - end * Math.Sqrt(u);
            return difference <= 1e-6 * end && difference >= -0.204 * end;
        });

    [Fact]
    public void A_small_difference_flows_as_an_incompressible_liquid_would()
    {
        double density = IdealGas.Air.Density(Atmosphere, 293.15);
        // The expansion factor differs from 1 by 0.0003 at 50 Pa.
        Assert.Equal(1, Flow(Atmosphere, Atmosphere - 50).MassFlow / (0.61 * 1e-3 * Math.Sqrt(2 * density * 50)), 4e-4);
    }

    [Fact]
    public void A_choked_flow_does_not_feel_the_lower_pressure() =>
        Assert.Equal(Flow(Atmosphere, 50e3).MassFlow, Flow(Atmosphere, 0).MassFlow);

    [Fact]
    public void Two_sides_without_pressure_have_no_flow() => Assert.Equal(default, Flow(0, 0));

    [Fact]
    public void A_gas_by_its_molar_mass_agrees_with_the_air_of_the_standard_atmosphere() =>
        // ISO 2533:1975 has 28.964420 g/mol and R* of 8.31432 J/(mol·K), 1.7e-5 above the present one.
        Assert.Equal(287.05287, IdealGas.OfMolarMass(28.96442e-3, 1.4).SpecificGasConstant, 287 * 2e-5);

    private static GasFlow Flow(double p1, double p2) => CompressibleOrifice.Flow(p1, p2, 293.15, 1e-3, 0.61, IdealGas.Air);

    private static IdealGas GasOf(IReadOnlyDictionary<string, string> row) =>
        IdealGas.OfMolarMass(row.Number("molar_mass_g_mol") / 1000, row.Number("gamma"));

    private static double Ours(IReadOnlyDictionary<string, string> row) => CompressibleOrifice.Flow(
        row.Number("p_upstream_Pa"), row.Number("p_downstream_Pa"), row.Number("T_upstream_K"),
        Math.PI / 4 * row.Number("diameter_m") * row.Number("diameter_m"), row.Number("cd"), GasOf(row)).MassFlow;
}
