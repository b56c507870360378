using CsCheck;
using DrainSim.Lines;
using DrainSim.Liquids;
using static DrainSim.Tests.Lines.LinesForTests;

namespace DrainSim.Tests.Lines;

/// <summary>Flow and head of whole lines of liquids that are not Newtonian, as laws over random ones.</summary>
public sealed class RheologyLineTests
{
    private static readonly Gen<Liquid> AnyStrangeLiquid = Gen.Select(
        Gen.Double[600, 1900], Gen.OneOf(Gen.Const(0.0), Gen.Double[-4, 4].Select(Math.Exp)), Gen.Double[-6, 2], Gen.Double[0.1, 1.5],
        (density, yield, logK, n) => Water with
        {
            Density = density,
            Rheology = new HerschelBulkley { YieldStress = yield, Consistency = Math.Exp(logK), FlowIndex = n },
        });

    [Fact]
    public void The_flow_of_the_head_of_a_flow_is_that_flow() =>
        Gen.Select(AnyLine, AnyStrangeLiquid, Gen.Double[-8, 10], Gen.Double[-3, 3]).Sample((line, liquid, logFlow, off) =>
        {
            LineHydraulics compiled = line.Compile(liquid);
            double flow = Math.Abs(logFlow) < 0.5 ? compiled.RegimeFlows[0] : Math.Exp(logFlow) * compiled.RegimeFlows[0]; // at the kink too
            double head = compiled.HeadLoss(flow, out double slope);
            // known no better than the head's last bits over the slope in logarithms
            double tolerance = 1e-13 + 1e-13 * head / (slope * flow);
            Assert.Equal(1, compiled.Flow(head, 0) / flow, tolerance);
            Assert.Equal(1, compiled.Flow(head, flow * Math.Exp(off)) / flow, tolerance);
        }, iter: 2000);

    [Fact]
    public void More_flow_always_uses_more_head() =>
        Gen.Select(AnyLine, AnyStrangeLiquid, Gen.Double[-8, 10], Gen.Double[-6, 0]).Sample((line, liquid, logFlow, logMore) =>
        {
            LineHydraulics compiled = line.Compile(liquid);
            double flow = Math.Exp(logFlow) * compiled.RegimeFlows[0];
            return compiled.HeadLoss(flow * (1 + Math.Exp(logMore))) > compiled.HeadLoss(flow);
        }, iter: 2000);

    [Fact]
    public void The_slopes_are_the_derivatives() =>
        Gen.Select(AnyLine, AnyStrangeLiquid, Gen.Double[-4, 8]).Sample((line, liquid, logFlow) =>
        {
            LineHydraulics compiled = line.Compile(liquid);
            double flow = Math.Exp(logFlow) * compiled.RegimeFlows[0], d = 1e-5;
            double head = compiled.HeadLoss(flow, out double slope);
            double above = compiled.HeadLoss(flow * (1 + d), out double aboveSlope), below = compiled.HeadLoss(flow * (1 - d), out double belowSlope);
            double turn = (Math.Abs(aboveSlope - slope) + Math.Abs(slope - belowSlope)) / slope; // of a curve, and of a kink between the two
            Assert.Equal(1, (above - below) / (2 * d * flow) / slope, 1e-7 + turn + 1e-10 * head / (slope * flow));
        }, iter: 500);

    [Fact]
    public void Nothing_flows_up_to_the_yield_head()
    {
        Liquid liquid = Water with { Rheology = new Bingham { YieldStress = 10, PlasticViscosity = 0.03 } };
        LineHydraulics line = Siphon.Compile(liquid);
        double yield = 4 * 10 * 9.2 / (998.2 * Gravity * 0.038); // fittings and the valve have none
        Assert.Equal(yield, line.YieldHead, 1e-14);
        Assert.Equal(0, line.Flow(yield * (1 - 1e-12), 0));
        Assert.True(line.Flow(yield * (1 + 1e-12), 0) > 0);
        Assert.Equal(0, Siphon.Compile().YieldHead);
    }

    [Fact]
    public void Cutting_a_run_in_two_changes_nothing() =>
        Gen.Select(Gen.Double[0.01, 0.99], AnyStrangeLiquid, Gen.Double[-6, 3]).Sample((share, liquid, logHead) =>
        {
            var run = (StraightRun)Siphon.Path[2];
            Line cut = Siphon with
            {
                Path = [Siphon.Path[0], Siphon.Path[1], run with { Length = share * run.Length }, run with { Length = (1 - share) * run.Length, Rise = 0 }, Siphon.Path[3]],
            };
            LineHydraulics whole = Siphon.Compile(liquid);
            double head = whole.YieldHead + Math.Exp(logHead);
            Assert.Equal(1, cut.Compile(liquid).Flow(head, 0) / whole.Flow(head, 0), 1e-11);
        });

    [Fact]
    public void Finding_a_flow_allocates_nothing()
    {
        LineHydraulics line = Siphon.Compile(Water with { Rheology = new HerschelBulkley { YieldStress = 3, Consistency = 0.2, FlowIndex = 0.7 } });
        double sum = line.Flow(3, 0) + line.LowPointPressure(1e-3, 2, 1e5, out _);
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int i = 0; i < 100; i++)
            sum += line.Flow(2 + 0.01 * i, 0) + line.LowPointPressure(1e-5 * i, 2, 1e5, out _);
        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
        Assert.True(sum > 0);
    }
}
