using CsCheck;
using DrainSim.Lines;
using DrainSim.Liquids;
using static DrainSim.Tests.Lines.LinesForTests;

namespace DrainSim.Tests.Lines;

/// <summary>Flow and head of a compiled line, as laws over random lines, liquids and flows.</summary>
public sealed class LineFlowTests
{
    /// <summary>ln Re from a creeping trickle to a burst main.</summary>
    private static readonly Gen<double> LogReynolds =
        Gen.OneOf(Gen.Double[-10, 18], Gen.Double[Math.Log(1990), Math.Log(4010)]);

    [Fact]
    public void The_flow_of_the_head_of_a_flow_is_that_flow() =>
        Gen.Select(AnyLine, AnyLiquid, LogReynolds, Gen.Double[-3, 3]).Sample((line, liquid, logRe, off) =>
        {
            LineHydraulics compiled = line.Compile(liquid);
            double flow = FlowAt(compiled, logRe);
            double head = compiled.HeadLoss(flow, out double slope);
            // A flow is known no better than its head's last bits over the exponent of the law, which is near 2
            // but less than 1 just below Re 4000, where the jet's velocity head stops rising.
            double tolerance = 1e-13 / Math.Min(1, slope * flow / head);
            return Math.Abs(compiled.Flow(head, 0) / flow - 1) < tolerance
                && Math.Abs(compiled.Flow(head, flow * Math.Exp(off)) / flow - 1) < tolerance;
        }, iter: 2000);

    [Fact]
    public void More_flow_always_uses_more_head() =>
        Gen.Select(AnyLine, AnyLiquid, LogReynolds, Gen.Double[-10, 0]).Sample((line, liquid, logRe, logMore) =>
        {
            LineHydraulics compiled = line.Compile(liquid);
            double flow = FlowAt(compiled, logRe);
            return compiled.HeadLoss(flow * (1 + Math.Exp(logMore))) > compiled.HeadLoss(flow);
        }, iter: 2000);

    [Fact]
    public void The_slopes_are_the_derivatives() =>
        Gen.Select(AnyLine, AnyLiquid, Gen.Double[-10, 18]).Sample((line, liquid, logRe) =>
        {
            LineHydraulics compiled = line.Compile(liquid);
            double flow = FlowAt(compiled, logRe);
            double head = compiled.HeadLoss(flow, out double slope);
            double d = 1e-5;
            if (compiled.RegimeFlows.Any(kink => Math.Abs(kink / flow - 1) < 2 * d))
                return true;
            double measured = (compiled.HeadLoss(flow * (1 + d)) - compiled.HeadLoss(flow * (1 - d))) / (2 * d * flow);
            compiled.Flow(head, flow, out double inverse);
            return Math.Abs(measured / slope - 1) < 1e-6 && Math.Abs(inverse * slope - 1) < 1e-6;
        });

    [Fact]
    public void A_rougher_longer_or_more_obstructed_line_never_passes_more() =>
        Gen.Select(Gen.Double[0, 1e-3], Gen.Double[0, 10], Gen.Double[0, 5], AnyLiquid, Gen.Double[-12, 3]).Sample(
            (roughness, length, loss, liquid, logHead) =>
            {
                double head = Math.Exp(logHead);
                double plain = Siphon.Compile(liquid).Flow(head, 0) * (1 + 1e-14);
                Line rough = Siphon with { Roughness = Siphon.Roughness + roughness };
                Line longer = Siphon with { Path = [.. Siphon.Path, new StraightRun { Length = length + 1e-6, Rise = 0 }] };
                Line blocked = Siphon with { Path = [.. Siphon.Path, new PlainLoss { Coefficient = loss }] };
                return new[] { rough, longer, blocked }.All(line => line.Compile(liquid).Flow(head, 0) <= plain);
            });

    [Fact]
    public void Cutting_a_run_in_two_changes_nothing() =>
        Gen.Select(Gen.Double[0.01, 0.99], AnyLiquid, Gen.Double[-12, 3]).Sample((share, liquid, logHead) =>
        {
            var run = (StraightRun)Siphon.Path[2];
            Line cut = Siphon with
            {
                Path =
                [
                    Siphon.Path[0], Siphon.Path[1],
                    run with { Length = share * run.Length, Rise = share * run.Rise },
                    run with { Length = (1 - share) * run.Length, Rise = (1 - share) * run.Rise },
                    Siphon.Path[3],
                ],
            };
            double whole = Siphon.Compile(liquid).Flow(Math.Exp(logHead), 0);
            return Math.Abs(cut.Compile(liquid).Flow(Math.Exp(logHead), 0) / whole - 1) < 1e-13;
        });

    [Fact]
    public void Parallel_lines_carry_as_many_times_the_flow_of_one() =>
        Gen.Select(AnyLine, AnyLiquid, Gen.Double[-12, 3], Gen.Int[2, 9]).Sample((line, liquid, logHead, n) =>
        {
            double head = Math.Exp(logHead);
            double one = (line with { Parallel = 1 }).Compile(liquid).Flow(head, 0);
            return Math.Abs((line with { Parallel = n }).Compile(liquid).Flow(head, 0) / (n * one) - 1) < 1e-14;
        });

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    [InlineData(1e-300)]
    public void No_head_gives_no_flow(double head) => Assert.Equal(0, Siphon.Compile().Flow(head, 1e-3));

    [Fact]
    public void A_shut_valve_passes_nothing()
    {
        LineHydraulics shut = (Siphon with { Path = [.. Siphon.Path, new Valve { Kind = ValveTable.Find("gate")!, Opening = 0 }] }).Compile();
        Assert.True(shut.IsShut);
        Assert.Equal(0, shut.Flow(2, 1e-3));
        Assert.Equal(double.PositiveInfinity, shut.HeadLoss(1e-6));
        Assert.Equal(0, shut.FlowKeepingLowPoint(0, 2, 1e5, 1));
    }

    [Fact]
    public void An_empty_path_is_an_orifice()
    {
        LineHydraulics orifice = new Line { Bore = 0.05, Roughness = 0, Inlet = new() { Elevation = 0, EdgeLoss = 0.5 }, Path = [] }.Compile();
        double velocity = Math.Sqrt(2 * Gravity * 2 / 1.5);
        Assert.Equal(velocity, orifice.Velocity(orifice.Flow(2, 0)), velocity * 1e-15);
        Assert.Equal(1, orifice.NodeCount);
    }

    [Fact]
    public void A_long_laminar_line_follows_Hagen_and_Poiseuille()
    {
        Liquid oil = new() { Name = "oil", Density = 900, Viscosity = 1, VapourPressure = 0 };
        LineHydraulics line = new Line
        {
            Bore = 0.05,
            Roughness = 1e-4,
            Inlet = new() { Elevation = 0, EdgeLoss = 0 },
            Path = [new StraightRun { Length = 1e6, Rise = 0 }],
        }.Compile(oil);
        double expected = Math.PI * 900 * Gravity * 10 * Math.Pow(0.05, 4) / (128 * 1 * 1e6);
        Assert.Equal(expected, line.Flow(10, 0), expected * 1e-9); // the jet's velocity head is that small
    }

    [Fact]
    public void The_velocities_are_in_the_own_and_in_the_narrowest_bore()
    {
        LineHydraulics line = (Siphon with { Parallel = 2, Path = [.. Siphon.Path, new Reducer { Bore = 0.019, Angle = 0.5 }] }).Compile();
        Assert.Equal(1e-3 / 2 / (Math.PI / 4 * 0.038 * 0.038), line.Velocity(1e-3), 1e-12);
        Assert.Equal(4, line.LargestVelocity(1e-3) / line.Velocity(1e-3), 1e-12);
        Assert.Equal(line.Velocity(1e-3) * 0.038 * 998.2 / 1.002e-3, line.Reynolds(1e-3), 1e-8);
        Assert.Equal([1000, 2000, 4000], line.RegimeFlows.Select(line.Reynolds).Select(re => Math.Round(re, 9)).Order());
    }

    [Fact]
    public void A_rough_wall_wider_than_its_bore_is_refused()
    {
        var refused = Assert.Throws<ArgumentOutOfRangeException>(() => (Siphon with { Roughness = 0.04 }).Compile());
        Assert.Equal("roughness must be less than the bore of 0.038 m, got 0.04 m", refused.Message);
    }

    [Fact]
    public void Solving_allocates_nothing()
    {
        LineHydraulics line = Siphon.Compile();
        Span<double> pressures = stackalloc double[line.NodeCount];
        for (int turn = 0; ; turn++)
        {
            long before = GC.GetAllocatedBytesForCurrentThread();
            double flow = line.Flow(2.5, 0, out _);
            flow += line.HeadLoss(flow, out _) + line.LowPointPressure(flow, 2.5, 101325, out _);
            flow += line.FlowKeepingLowPoint(9e4, 2.5, 101325, 1e-2);
            line.Pressures(flow, 2.5, 101325, pressures);
            long allocated = GC.GetAllocatedBytesForCurrentThread() - before;
            if (turn < 1)
                continue; // the first turn may compile
            Assert.Equal(0, allocated);
            return;
        }
    }
}
