using DrainSim.Lines;
using DrainSim.Liquids;
using static DrainSim.Tests.Lines.LinesForTests;

namespace DrainSim.Tests.Lines;

/// <summary>What each kind of path item adds to the head that a flow uses, against its formula worked out here.</summary>
public sealed class LineItemsTests
{
    private const double Bore = 0.05;
    private static readonly Liquid Oil = new() { Name = "oil", Density = 900, Viscosity = 0.09, VapourPressure = 0 };

    [Theory]
    [InlineData(0.1, 1)] // widening: (1 − 1/4)² on the bore before
    [InlineData(0.025, 16)] // narrowing: 0.5·(1 − 1/4) on the bore behind, where the velocity head is 16 times as much
    public void A_sudden_change_counts_on_the_smaller_bore(double bore, double headRatio)
    {
        double k = bore > Bore ? 0.5625 : 0.375;
        double jet = Math.Pow(Bore / bore, 4);
        Assert.Equal(k * headRatio + jet, InVelocityHeads(new PlainLoss { Bore = bore, Coefficient = 0 }), 1e-12);
    }

    [Theory]
    [InlineData(0.1, 1)]
    [InlineData(0.025, 16)]
    public void A_reducer_counts_on_the_smaller_bore(double bore, double headRatio)
    {
        double sine = Math.Sin(Math.PI / 18);
        double k = bore > Bore ? 2.6 * sine * 0.5625 : 0.8 * sine * 0.75;
        double jet = Math.Pow(Bore / bore, 4);
        Assert.Equal(k * headRatio + jet, InVelocityHeads(new Reducer { Bore = bore, Angle = Math.PI / 9 }), 1e-12);
    }

    [Fact]
    public void A_reducer_to_the_same_bore_costs_nothing() =>
        Assert.Equal(1, InVelocityHeads(new Reducer { Angle = 1 }), 1e-12);

    [Fact]
    public void Fittings_in_a_row_count_each_with_their_laminar_rise()
    {
        var fitting = new Fitting { Kind = FittingTable.Find("bend_90")!, Count = 3 };
        double turbulent = 0.2 * (1 + 0.0254 / Bore);
        Assert.Equal(1 + 3 * (800 / 1e5 + turbulent), InVelocityHeads(fitting), 1e-12);
        Assert.Equal(2 + 3 * (800 / 50.0 + turbulent), InVelocityHeads(fitting, reynolds: 50), 1e-11);
    }

    [Fact]
    public void A_throttled_valve_counts_with_its_capacity_squared()
    {
        ValveKind gate = ValveTable.Find("gate")!;
        double open = 300 / 1e5 + 8 * LossLaw.CraneFactor(Bore);
        double capacity = gate.Characteristic.RelativeCapacity(0.5);
        Assert.Equal(1 + open, InVelocityHeads(new Valve { Kind = gate }), 1e-12);
        Assert.Equal(1 + open / (capacity * capacity), InVelocityHeads(new Valve { Kind = gate, Opening = 0.5 }), 1e-11);
    }

    [Fact]
    public void A_flow_coefficient_takes_the_place_of_the_table()
    {
        var valve = new Valve { Kind = ValveTable.Find("gate")!, FlowCoefficient = 20 };
        double k = 1.598876e9 * Math.Pow(Bore, 4) / 400;
        Assert.Equal(1 + 300 / 1e5 + k, InVelocityHeads(valve), k * 1e-6); // the constant is printed to seven digits
    }

    [Fact]
    public void A_run_has_its_own_bore_and_wall()
    {
        double f = FrictionFactor.Darcy(2e5, 0.002);
        double own = 16 * (0.375 + f * 100 + 1);
        Assert.Equal(own, InVelocityHeads(new StraightRun { Bore = 0.025, Length = 2.5, Rise = 0, Roughness = 5e-5 }), own * 1e-14);
    }

    [Theory]
    [InlineData(FrictionFactor.LaminarLimit)]
    [InlineData(FrictionFactor.TurbulentLimit)]
    public void A_kink_between_the_guess_and_the_flow_costs_no_digits(double limit)
    {
        LineHydraulics line = Siphon.Compile(Oil);
        foreach (double apart in new[] { 1e-3, 1e-6, 1e-8, -1e-8, -1e-6, -1e-3 })
        {
            double flow = limit * (1 + apart) / line.Reynolds(1);
            double guess = limit * (1 - apart) / line.Reynolds(1);
            Assert.Equal(1, line.Flow(line.HeadLoss(flow), guess) / flow, 1e-14);
        }
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(-1)]
    [InlineData(1e-300)]
    [InlineData(1e9)]
    public void A_guess_from_nowhere_does_no_harm(double guess)
    {
        LineHydraulics line = Siphon.Compile();
        Assert.Equal(1, line.Flow(2, guess) / line.Flow(2, 0), 1e-15);
    }

    /// <summary>Head that a line of one item uses, in velocity heads of its first bore, the jet's among them.</summary>
    private static double InVelocityHeads(PathItem item, double reynolds = 1e5)
    {
        LineHydraulics line = new Line
        {
            Bore = Bore,
            Roughness = 0,
            Inlet = new() { Elevation = 0, EdgeLoss = 0 },
            Path = [item],
        }.Compile(Oil);
        double flow = reynolds / line.Reynolds(1);
        double velocity = line.Velocity(flow);
        return line.HeadLoss(flow) / (velocity * velocity / (2 * Gravity));
    }
}
