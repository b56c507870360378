using CsCheck;
using DrainSim.Lines;
using static DrainSim.Tests.Lines.LinesForTests;

namespace DrainSim.Tests.Lines;

/// <summary>Nodes, geometry, pressures and the low point of a compiled line.</summary>
public sealed class LinePressureTests
{
    private const double Atmosphere = 101325;

    [Fact]
    public void The_steady_flow_leaves_the_outlet_at_the_receivers_pressure() =>
        Gen.Select(AnyLine, AnyLiquid, Gen.Double[0.01, 30]).Sample((line, liquid, head) =>
        {
            LineHydraulics compiled = line.Compile(liquid);
            var pressures = new double[compiled.NodeCount];
            double surface = compiled.OutletElevation + head;
            compiled.Pressures(compiled.Flow(head, 0), surface, Atmosphere, pressures);
            double scale = Atmosphere + liquid.Density * Gravity * (Math.Abs(surface) + 400);
            return Math.Abs(pressures[^1] - Atmosphere) < 1e-11 * scale;
        });

    [Fact]
    public void The_low_point_is_the_least_node_before_the_outlet() =>
        Gen.Select(AnyLine, AnyLiquid, Gen.Double[-5, 14]).Sample((line, liquid, logRe) =>
        {
            LineHydraulics compiled = line.Compile(liquid);
            var pressures = new double[compiled.NodeCount];
            double flow = FlowAt(compiled, logRe);
            compiled.Pressures(flow, 5, Atmosphere, pressures);
            double low = compiled.LowPointPressure(flow, 5, Atmosphere, out int node);
            double least = pressures.Take(Math.Max(1, pressures.Length - 1)).Min();
            return low == pressures[node] && low == least;
        });

    [Fact]
    public void The_low_point_never_rises_with_the_flow() =>
        Gen.Select(AnyLine, AnyLiquid, Gen.Double[0, 14]).Sample((line, liquid, logRe) =>
        {
            LineHydraulics compiled = line.Compile(liquid);
            double flow = FlowAt(compiled, logRe);
            double atFlow = compiled.LowPointPressure(flow, 5, 0, out _);
            double atMore = compiled.LowPointPressure(flow * 1.5, 5, 0, out _);
            return atMore <= atFlow;
        });

    [Fact]
    public void The_kept_flow_holds_the_low_point_at_the_pressure_asked_for() =>
        Gen.Select(AnyLine, AnyLiquid, Gen.Double[0, 14], Gen.Double[0.001, 0.999]).Sample((line, liquid, logRe, share) =>
        {
            LineHydraulics compiled = line.Compile(liquid);
            double most = FlowAt(compiled, logRe);
            double still = compiled.LowPointPressure(0, 5, Atmosphere, out _);
            double least = still - share * (still - compiled.LowPointPressure(most, 5, Atmosphere, out _));
            double kept = compiled.FlowKeepingLowPoint(least, 5, Atmosphere, most);
            double low = compiled.LowPointPressure(kept, 5, Atmosphere, out _);
            double scale = Math.Abs(still) + Math.Abs(least) + liquid.Density * Gravity * 500;
            return kept <= most && Math.Abs(low - least) < 1e-13 * scale;
        }, iter: 1000);

    [Fact]
    public void The_kept_flow_is_all_that_was_wanted_when_the_low_point_allows_it() =>
        Assert.Equal(1e-3, Siphon.Compile().FlowKeepingLowPoint(2339, 2.6, Atmosphere, 1e-3));

    [Fact]
    public void A_static_lift_beyond_the_pressure_leaves_no_flow() =>
        Assert.Equal(0, Siphon.Compile().FlowKeepingLowPoint(Atmosphere, 2.6, Atmosphere, 1e-3));

    [Fact]
    public void The_nodes_stand_behind_every_item_and_on_both_sides_of_a_bore_change()
    {
        LineHydraulics line = (Siphon with
        {
            Path =
            [
                new StraightRun { Name = "inner_leg", Length = 3, Rise = 2.5 },
                new StraightRun { Name = "outer_leg", Length = 5, Rise = -4, Bore = 0.019 },
                new Reducer { Bore = 0.05, Angle = 0.3 },
            ],
        }).Compile();
        LineNode[] nodes = [.. Enumerable.Range(0, line.NodeCount).Select(line.Node)];
        Assert.Equal(["inlet", "inner_leg", "bore 38 mm to 19 mm", "outer_leg", "reducer"], nodes.Select(node => node.Name));
        Assert.Equal([0.05, 2.55, 2.55, -1.45, -1.45], nodes.Select(node => Math.Round(node.Elevation, 12)));
        Assert.Equal([0, 3, 3, 8, 8], nodes.Select(node => node.Distance));
        Assert.Equal([0.038, 0.038, 0.019, 0.019, 0.05], nodes.Select(node => node.Bore));
        Assert.Equal(NodePlace.BehindBoreChange, nodes[2].Place);
    }

    [Fact]
    public void A_sudden_widening_gains_back_pressure_by_Borda_and_Carnot()
    {
        LineHydraulics line = new Line
        {
            Bore = 0.05,
            Roughness = 0,
            Inlet = new() { Elevation = 0, EdgeLoss = 0 },
            Path = [new PlainLoss { Coefficient = 0 }, new PlainLoss { Coefficient = 0, Bore = 0.1 }, new PlainLoss { Coefficient = 0 }],
        }.Compile();
        double flow = 0.01;
        var pressures = new double[line.NodeCount];
        line.Pressures(flow, 1, Atmosphere, pressures);
        double before = flow / (Math.PI / 4 * 0.05 * 0.05);
        double behind = before / 4;
        double expected = 998.2 * behind * (before - behind); // momentum balance
        Assert.Equal(expected, pressures[2] - pressures[1], expected * 1e-10);
    }

    [Fact]
    public void The_crest_parts_the_line_into_its_legs()
    {
        LineHydraulics line = (Siphon with { Parallel = 2 }).Compile();
        double area = Math.PI / 4 * 0.038 * 0.038;
        Assert.Equal(3.15, line.CrestElevation, 1e-12);
        Assert.Equal(1, line.CrestIndex);
        Assert.True(line.RisesAboveInlet);
        Assert.Equal(-1.5, line.OutletElevation, 1e-12);
        Assert.Equal(9.2, line.TotalLength, 1e-12);
        Assert.Equal(2 * area * 9.2, line.LineVolume, 1e-12);
        Assert.Equal(2 * area * 3.2, line.InnerLegVolume, 1e-12);
        Assert.Equal(2 * area * 6, line.OuterLegVolume, 1e-12);
        Assert.Equal(2 * area, line.OutletArea, 1e-15);
        Assert.Equal(9.2 / (Gravity * 2 * area), line.Inertance, 1e-6);
        Assert.Equal(9.2 * line.Velocity(2e-3) / (Gravity * 2), line.InertiaTime(2e-3, 2), 1e-12);
    }

    [Fact]
    public void A_line_that_falls_all_the_way_does_not_rise_above_its_inlet() =>
        Assert.False((Siphon with { Path = [new StraightRun { Length = 3, Rise = -3 }] }).Compile().RisesAboveInlet);

    [Fact]
    public void The_low_point_may_lie_behind_the_crest()
    {
        LineHydraulics line = (Siphon with
        {
            Path =
            [
                new StraightRun { Length = 3.2, Rise = 3 },
                new PlainLoss { Coefficient = 30 },
                new StraightRun { Length = 5, Rise = -4.5 },
            ],
        }).Compile();
        line.LowPointPressure(line.Flow(4, 0), 2.6, Atmosphere, out int node);
        Assert.Equal((1, 2), (line.CrestIndex, node));
    }
}
