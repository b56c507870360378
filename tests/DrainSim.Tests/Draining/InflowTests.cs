using DrainSim.Draining;

namespace DrainSim.Tests.Draining;

/// <summary>
/// A prism with an inflow Qi and an orifice K·√h: t = (2A/K²)·[K(√H₁ − √H₂) + Qi·ln((Qi − K√H₁)/(Qi − K√H₂))].
/// </summary>
public sealed class InflowTests
{
    private const double Area = 2;
    private static readonly double K = Jobs.OrificeFactor();

    [Fact]
    public void A_fed_tank_falls_in_the_closed_time()
    {
        const double inflow = 0.003;
        DrainResult result = Jobs.Run(Fed(Inflow.Constant(inflow), 3) with { Run = new RunSettings { StopAtLevel = 1.5 } });
        double time = Time(inflow, 3, 1.5);
        Assert.Equal(time, result.StoppedAt, 1e-6 * time);
        Assert.Equal(inflow * result.StoppedAt, result.DrainedVolume + result.LeftVolume - result.InitialVolume, 1e-9);
    }

    [Theory]
    [InlineData(3.0)]
    [InlineData(0.2)]
    public void It_balances_at_the_level_of_equal_flows_from_either_side(double start)
    {
        const double inflow = 0.006;
        DrainResult result = Jobs.Run(Fed(Inflow.Constant(inflow), start));
        double balance = inflow * inflow / (K * K);
        Assert.Equal(Outcome.Balanced, result.Outcome);
        Assert.Equal(balance, result.BalanceLevel!.Value, 1e-9);
        Assert.Equal(balance, result.FinalLevel, 2.1e-3 * balance); // flows equal within a thousandth, levels within two
        double time = Time(inflow, start, result.FinalLevel);
        Assert.Equal(time, result.StoppedAt, 1e-5 * time);
    }

    [Fact]
    public void A_tank_that_gets_too_much_runs_over_in_the_closed_time()
    {
        const double inflow = 0.02;
        DrainResult result = Jobs.Run(Fed(Inflow.Constant(inflow), 3));
        double time = Time(inflow, 3, 4);
        Assert.Equal(Outcome.Overflowed, result.Outcome);
        Assert.Equal(time, result.StoppedAt, 1e-9 * time); // no step looks over the brim, where the level stands still
        Assert.Equal(4, result.FinalLevel, 1e-9);
        Assert.Contains(result.Warnings, warning => warning.Code == WarningCode.NeverEmpties);
    }

    [Fact]
    public void A_table_of_inflow_balances_to_the_last_drop()
    {
        var rain = new Inflow { Points = [(0, 0), (60, 0.004), (61, 0.001), (300, 0)] };
        DrainResult result = Jobs.Run(Fed(rain, 2));
        double arrived = rain.Volume(0, result.StoppedAt);
        Assert.Equal(Outcome.Emptied, result.Outcome);
        Assert.Equal(60 * 0.002 + 0.0025 + 239 * 0.0005, arrived, 1e-12);
        Assert.Equal(result.InitialVolume + arrived, result.DrainedVolume + result.LeftVolume, 1e-9);
    }

    [Fact]
    public void A_shower_that_is_over_ends_in_a_drain_of_the_closed_time()
    {
        var rain = new Inflow { Points = [(0, 0.03), (20, 0.03), (20.001, 0)] };
        DrainResult result = Jobs.Run(Fed(rain, 1));
        double level = result.Trace.At(20.001).Level;
        double time = 20.001 + 2 * Area / K * (Math.Sqrt(level) - Math.Sqrt(1e-3));
        Assert.Equal(time, result.StoppedAt, 1e-6 * time);
        Assert.Equal(20, result.LargestFlow.Time, 0.01);
    }

    [Fact]
    public void A_tank_levels_with_the_water_outside_once_the_rain_is_over()
    {
        var rain = new Inflow { Points = [(0, 0.003), (60, 0.003), (60.001, 0)] };
        DrainResult result = Jobs.Run(Fed(rain, 2) with { DrawOffs = Jobs.Only(Jobs.Orifice(0.05, 0.6), surface: 0.5) });
        double head = result.Trace.At(60.001).Level - 0.5;
        double time = 60.001 + 2 * Area / K * (Math.Sqrt(head) - Math.Sqrt(1e-3));
        Assert.Equal(Outcome.Levelled, result.Outcome);
        Assert.Equal(time, result.StoppedAt, 1e-6 * time);
    }

    private static double Time(double inflow, double from, double to) => 2 * Area / (K * K)
        * (K * (Math.Sqrt(from) - Math.Sqrt(to)) + inflow * Math.Log((inflow - K * Math.Sqrt(from)) / (inflow - K * Math.Sqrt(to))));

    private static Job Fed(Inflow inflow, double level) => Jobs.OrificeDrain(Area, 4, level) with { Inflow = inflow };
}
