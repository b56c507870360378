using CsCheck;
using DrainSim.Gas;

namespace DrainSim.Tests.Gas;

public sealed class PressureValveTests
{
    private const double Atmosphere = 101325;
    private static readonly Surroundings Outside = new(Atmosphere, 293.15);
    private static readonly ReliefValve Relief = new() { Bore = 0.08, SetPressure = 2000, OpeningRise = 500 };
    private static readonly VacuumBreak Vacuum = new() { Bore = 0.08, SetPressure = 250, OpeningRise = 100 };
    private static readonly VentOrifice Hole = new() { Bore = 0.08 };

    [Fact]
    public void A_relief_valve_only_ever_lets_gas_out() =>
        Gen.Double[-2e4, 2e4].Sample(over => Relief.MassFlow(Atmosphere + over, Outside, out _) is var flow
            && (over > 2000 ? flow < 0 : flow == 0));

    [Fact]
    public void A_vacuum_break_only_ever_lets_air_in() =>
        Gen.Double[-2e4, 2e4].Sample(under => Vacuum.MassFlow(Atmosphere - under, Outside, out _) is var flow
            && (under > 250 ? flow > 0 : flow == 0));

    [Theory]
    [InlineData(2250, 0.5)]
    [InlineData(2500, 1)]
    [InlineData(9000, 1)]
    public void The_open_share_of_the_bore_flows_like_a_hole(double over, double share) =>
        Assert.Equal(share * Hole.MassFlow(Atmosphere + over, Outside, out _),
            Relief.MassFlow(Atmosphere + over, Outside, out _), 1e-12);

    [Fact]
    public void A_valve_begins_to_open_without_a_jump() =>
        Assert.InRange(Vacuum.MassFlow(Atmosphere - 250.001, Outside, out _), 1e-9, 1e-5);

    [Fact]
    public void The_slope_is_that_of_the_flow() =>
        Gen.Double[-4000, 4000].Where(AwayFromTheKinks).Sample(over =>
        {
            double slopes = 0;
            double Sum(double p) => Relief.MassFlow(p, Outside, out _) + Vacuum.MassFlow(p, Outside, out _);
            Relief.MassFlow(Atmosphere + over, Outside, out double relief);
            Vacuum.MassFlow(Atmosphere + over, Outside, out double vacuum);
            slopes = relief + vacuum;
            double chord = (Sum(Atmosphere + over + 0.01) - Sum(Atmosphere + over - 0.01)) / 0.02;
            return slopes <= 0 && Math.Abs(chord - slopes) <= 1e-6 * Math.Abs(slopes) + 1e-12;
        });

    [Fact]
    public void The_flow_never_rises_with_the_pressure() =>
        Gen.Select(Gen.Double[-4000, 4000], Gen.Double[1e-4, 500]).Sample((over, more) =>
            Relief.MassFlow(Atmosphere + over + more, Outside, out _) <= Relief.MassFlow(Atmosphere + over, Outside, out _)
            && Vacuum.MassFlow(Atmosphere + over + more, Outside, out _) <= Vacuum.MassFlow(Atmosphere + over, Outside, out _));

    [Fact]
    public void A_valve_that_opens_in_no_range_is_refused() => Assert.Equal(
        "full-open less set pressure must be greater than 0 Pa, got 0 Pa",
        Assert.Throws<ArgumentOutOfRangeException>(() => Relief with { OpeningRise = 0 }).Message);

    private static bool AwayFromTheKinks(double over) =>
        new[] { 2000, 2500, -250, -350, 0.0 }.All(kink => Math.Abs(over - kink) > 0.1);
}
