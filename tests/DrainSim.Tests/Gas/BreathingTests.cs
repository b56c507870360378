using CsCheck;
using DrainSim.Gas;

namespace DrainSim.Tests.Gas;

public sealed class BreathingTests
{
    private const double Atmosphere = 101325;
    private const double Vapour = 2339;
    private static readonly Surroundings Outside = new(Atmosphere, 293.15);
    private static readonly double DensityByPressure = 1 / (287.05287 * 293.15);

    private static readonly Gen<VentedHeadspace> Tanks =
        Gen.Select(Gen.Double[0.005, 0.3], Gen.Double[0.01, 0.2], Gen.Double[0.1, 20])
            .Select((hole, bore, length) => new VentedHeadspace
            {
                Openings = [new VentOrifice { Bore = hole }, new VentLine { Bore = bore, Length = length }],
            });

    [Fact]
    public void What_flows_in_fills_just_what_the_liquid_leaves_free() =>
        Gen.Select(Tanks, Gen.Double[-7, -1]).Sample((tank, log) =>
        {
            double outflow = Math.Pow(10, log);
            double p = Breathing.SteadyPressure(tank, outflow, Vapour, Outside, out _)!.Value;
            double flow = tank.MassFlow(p, Outside, out double slope);
            double wanted = outflow * (p - Vapour) * DensityByPressure;
            // The pressure is found to 1e-10 Pa, a few of its last bits; a wide vent's slope carries that over.
            return p < Atmosphere && Math.Abs(flow - wanted) <= 1e-9 * wanted + 3e-10 * Math.Abs(slope);
        });

    [Fact]
    public void A_tank_that_fills_stands_above_the_atmosphere() =>
        Gen.Select(Tanks, Gen.Double[-7, -3]).Sample((tank, log) =>
        {
            double inflow = Math.Pow(10, log);
            double p = Breathing.SteadyPressure(tank, -inflow, Vapour, Outside, out _)!.Value;
            double flow = tank.MassFlow(p, Outside, out double slope);
            double wanted = -inflow * (p - Vapour) * DensityByPressure;
            return p > Atmosphere && Math.Abs(flow - wanted) <= 1e-9 * Math.Abs(wanted) + 3e-10 * Math.Abs(slope);
        });

    [Fact]
    public void The_slope_is_that_of_the_pressure() =>
        Gen.Select(Tanks, Gen.Double[-3, -1], Gen.Bool).Sample((tank, log, fills) =>
        {
            double flow = Math.Pow(10, log) * (fills ? -0.1 : 1);
            double up = Breathing.SteadyPressure(tank, flow * 1.0001, Vapour, Outside, out _)!.Value;
            double down = Breathing.SteadyPressure(tank, flow * 0.9999, Vapour, Outside, out _)!.Value;
            Breathing.SteadyPressure(tank, flow, Vapour, Outside, out double slope);
            // Differences of pressures near 1e5 Pa carry about 1e-10 Pa.
            return Math.Abs(up - down - 2e-4 * flow * slope) <= 1e-5 * Math.Abs(up - down) + 1e-9;
        });

    [Fact]
    public void A_small_vacuum_is_that_of_an_incompressible_orifice()
    {
        VentedHeadspace tank = new() { Openings = [new VentOrifice { Bore = 0.05 }] };
        double p = Breathing.SteadyPressure(tank, 0.02, 0, Outside, out _)!.Value;
        double velocity = 0.02 / (0.61 * Math.PI / 4 * 0.0025);
        double expected = velocity * velocity * Atmosphere * DensityByPressure / 2;
        // 166 Pa; the air thins by 0.16 %.
        Assert.Equal(1, (Atmosphere - p) / expected, 2e-3);
    }

    [Fact]
    public void Nothing_that_flows_leaves_the_pressure_of_the_atmosphere() =>
        Tanks.Sample(tank => Breathing.SteadyPressure(tank, 0, Vapour, Outside, out double slope) == Atmosphere && slope < 0);

    [Fact]
    public void A_relief_valve_alone_cannot_let_a_tank_empty()
    {
        VentedHeadspace tank = new() { Openings = [new ReliefValve { Bore = 0.1, SetPressure = 2000, OpeningRise = 500 }] };
        Assert.Null(Breathing.SteadyPressure(tank, 1e-3, Vapour, Outside, out double slope));
        Assert.Equal(0, slope);
    }

    [Fact]
    public void A_vacuum_break_keeps_the_vacuum_between_its_two_pressures()
    {
        VentedHeadspace tank = new() { Openings = [new VacuumBreak { Bore = 0.1, SetPressure = 250, OpeningRise = 100 }] };
        double p = Breathing.SteadyPressure(tank, 1e-3, Vapour, Outside, out _)!.Value;
        Assert.InRange(Atmosphere - p, 250, 350);
    }

    [Fact]
    public void A_pinhole_cannot_let_out_more_than_its_sonic_flow()
    {
        VentedHeadspace tank = new() { Openings = [new VentOrifice { Bore = 0.001 }] };
        Assert.Null(Breathing.SteadyPressure(tank, -1, Vapour, Outside, out _));
    }

    [Fact]
    public void A_wider_vent_never_deepens_the_vacuum() =>
        Gen.Select(Gen.Double[0.002, 0.2], Gen.Double[1, 2], Gen.Double[1e-6, 0.1]).Sample((bore, wider, outflow) =>
            At(bore * wider, outflow) >= At(bore, outflow) - 1e-9);

    private static double At(double bore, double outflow) => Breathing.SteadyPressure(
        new VentedHeadspace { Openings = [new VentOrifice { Bore = bore }] }, outflow, Vapour, Outside, out _)!.Value;
}
