using CsCheck;
using DrainSim.Lines;
using DrainSim.Lines.Inlets;

namespace DrainSim.Tests.Lines.Inlets;

public sealed class PartFullInletTests
{
    private const double G = 9.80665;

    private static readonly Gen<PartFullInlet> Inlets =
        Gen.Select(Gen.Int[0, 2].Select(facing => (InletFacing)facing),
                Gen.Double[0.01, 0.6], Gen.Double[0, 1], Gen.Double[0.05, 2])
            .Select((facing, bore, loss, clearance) => PartFullInlet.Of(facing, bore, loss, clearance * bore));

    [Fact]
    public void No_depth_lets_nothing_in() =>
        Gen.Select(Inlets, Gen.Double[-1, 0]).Sample((inlet, depth) =>
            inlet.Limit(depth, G, out double slope) == 0 && slope == 0 && inlet.Limit(0, G, out _) == 0);

    [Fact]
    public void The_limit_never_falls_with_the_depth() =>
        Gen.Select(Inlets, Gen.Double[0, 3], Gen.Double[0, 0.1]).Sample((inlet, share, more) =>
            inlet.Limit((share + more) * inlet.Bore, G, out double slope) is var deeper && slope >= 0
            && deeper >= inlet.Limit(share * inlet.Bore, G, out _) * (1 - 1e-12));

    [Fact]
    public void The_slope_is_that_of_the_limit() =>
        Gen.Select(Inlets, Gen.Double[0.001, 1.5]).Sample((inlet, share) =>
        {
            double depth = share * inlet.Bore;
            double step = 1e-6 * depth;
            double flow = inlet.Limit(depth, G, out double slope);
            double up = inlet.Limit(depth + step, G, out _);
            // Far into the release the limit is a pole that no line reaches.
            if (double.IsInfinity(up) || up * depth > 1e3 * flow * inlet.Bore || slope * depth > 200 * flow)
                return true;
            double chord = (up - inlet.Limit(depth - step, G, out _)) / (2 * step);
            return Math.Abs(chord - slope) <= 1e-3 * slope;
        });

    [Fact]
    public void The_slope_of_the_blended_flow_is_its_own() =>
        Gen.Select(Inlets, Gen.Double[0.01, 3], Gen.Double[0.05, 2]).Sample((inlet, share, speed) =>
        {
            double depth = share * inlet.Bore;
            double step = 1e-6 * depth;
            double Line(double h) => speed * inlet.Bore * inlet.Bore * Math.Sqrt(2 * G * (h + 0.1));
            double Flow(double h) => inlet.Flow(h, G, Line(h), Line(h) / (2 * (h + 0.1)), out _);
            inlet.Flow(depth, G, Line(depth), Line(depth) / (2 * (depth + 0.1)), out double slope);
            double chord = (Flow(depth + step) - Flow(depth - step)) / (2 * step);
            // Where the inlet's slope is steep against the step the second derivative shows.
            return Math.Abs(chord - slope) <= 1e-3 * slope + 1e-6 * Flow(depth) / depth;
        });

    [Fact]
    public void A_well_covered_inlet_leaves_the_flow_of_the_line_to_the_last_bit() =>
        Gen.Select(Inlets, Gen.Double[2.6, 50]).Sample((inlet, share) =>
        {
            double line = 0.3 * inlet.Bore * inlet.Bore * Math.Sqrt(2 * G * share * inlet.Bore);
            return inlet.Flow(share * inlet.Bore, G, line, 1, out double slope) == line && slope == 1;
        });

    [Fact]
    public void A_side_opening_below_its_crown_runs_at_critical_depth()
    {
        SideOpening side = new() { Bore = 0.1, EdgeLoss = 0 };
        double area = Math.PI / 800;
        Assert.Equal(Math.Sqrt(G * area * area * area / 0.1), side.Limit(0.05 + Math.PI / 160, G, out _), 1e-14);
    }

    [Theory]
    [InlineData(0.1199)]
    [InlineData(0.1201)]
    public void A_side_opening_is_let_go_from_1_2_bores_without_a_jump(double depth)
    {
        SideOpening side = new() { Bore = 0.1 };
        double critical = CriticalFlow.UnderHead(depth, 0.1, 0.5, G, out _);
        Assert.Equal(1, side.Limit(depth, G, out _) / critical, 1e-4);
    }

    [Fact]
    public void A_side_opening_is_no_limit_from_1_5_bores() =>
        Assert.Equal(double.PositiveInfinity, new SideOpening { Bore = 0.1 }.Limit(0.1501, G, out _));

    [Fact]
    public void A_floor_opening_is_a_weir_round_its_rim()
    {
        // C·(2/3)·√(2g) is 1.778 √m/s for 0.602, times π·0.1 m and 0.02^1.5.
        Assert.Equal(0.602 * 2 / 3 * Math.Sqrt(2 * G) * Math.PI * 0.1 * Math.Pow(0.02, 1.5),
            new FloorOpening { Bore = 0.1 }.Limit(0.02, G, out _), 1e-15);
    }

    [Fact]
    public void A_dip_leg_far_from_the_floor_is_critical_depth_round_its_rim()
    {
        // q = √g·((2/3)·h)^1.5 along a rim of π·D.
        double expected = Math.Sqrt(G) * Math.Pow(0.02 * 2 / 3, 1.5) * Math.PI * 0.1;
        Assert.Equal(1, new DipLegOverFloor { Bore = 0.1, Clearance = 0.05 }.Limit(0.02, G, out _) / expected, 1e-13);
    }

    [Fact]
    public void A_narrow_slot_is_a_sluice_gate()
    {
        DipLegOverFloor leg = new() { Bore = 0.1, Clearance = 0.002 };
        double jet = 0.611 * 0.002;
        double expected = Math.PI * 0.1 * jet * Math.Sqrt(2 * G * 0.02) / Math.Sqrt(1 + jet / 0.02);
        // The surface stands 18 mm over the rim, below the 20 mm where the limit begins to be let go.
        Assert.Equal(1, leg.Limit(0.02, G, out _) / expected, 1e-13);
    }

    [Theory]
    [InlineData(0.25, 0.40)]
    [InlineData(0.1, 9.56)]
    [InlineData(0.5, 0)]
    public void The_loss_of_a_slot_is_a_sudden_expansion(double clearance, double loss) =>
        // [1/(4·0.611·c/D) − 1]² by hand, two decimals.
        Assert.Equal(loss, DipLegOverFloor.SlotLoss(1, clearance), 0.01);

    [Fact]
    public void A_lower_rim_never_lets_in_more() =>
        Gen.Select(Gen.Double[0.01, 1], Gen.Double[0, 1], Gen.Double[0, 0.2]).Sample((clearance, share, depth) =>
            new DipLegOverFloor { Bore = 1, Clearance = clearance * share + 1e-3 }.Limit(depth, G, out _)
            <= new DipLegOverFloor { Bore = 1, Clearance = clearance + 1e-3 }.Limit(depth, G, out _) * (1 + 1e-12));

    [Fact]
    public void A_dip_leg_that_stands_on_the_floor_is_refused() => Assert.Equal(
        "floor clearance must be greater than 0 m, got 0 m",
        Assert.Throws<ArgumentOutOfRangeException>(() => PartFullInlet.Of(InletFacing.Down, 0.1, 0.5, 0)).Message);

    [Fact]
    public void The_limits_take_no_memory()
    {
        PartFullInlet[] inlets =
        [
            new SideOpening { Bore = 0.1 }, new FloorOpening { Bore = 0.1 }, new DipLegOverFloor { Bore = 0.1, Clearance = 0.02 },
        ];
        double sum = Walk(inlets);
        long before = GC.GetAllocatedBytesForCurrentThread();
        sum += Walk(inlets);
        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
        Assert.True(double.IsFinite(sum));
    }

    private static double Walk(PartFullInlet[] inlets)
    {
        double sum = 0;
        foreach (PartFullInlet inlet in inlets)
        {
            for (int step = 0; step < 100; step++)
                sum += inlet.Flow(0.002 * step, G, 0.01, 0.1, out double slope) + slope;
        }
        return sum;
    }
}
