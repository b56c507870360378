using DrainSim.Draining;
using DrainSim.Lines;

namespace DrainSim.Tests.Draining;

/// <summary>The worst values of a run, wherever they lie.</summary>
public sealed class ExtremesTests
{
    [Fact]
    public void A_plain_siphon_flows_most_at_first_and_stands_worst_at_last()
    {
        DrainResult result = Jobs.Run(Jobs.Siphon());
        Assert.Equal((result.Trace.At(0).Flow, 0.0), (result.LargestFlow.Value, result.LargestFlow.Time));
        Assert.Equal(result.StoppedAt, result.LeastMargin.Time);
        Assert.Equal(result.Trace.At(result.StoppedAt).LowPointMargin, result.LeastMargin.Value, 1e-6);
        Assert.Equal(result.Job.Liquid.VapourPressure, result.LeastLowPointPressure.Value - result.LeastMargin.Value, 1e-6);
    }

    [Fact]
    public void The_low_point_lies_behind_the_crest_where_a_loss_stands_there()
    {
        DrainResult result = Jobs.Run(Jobs.Siphon());
        Assert.Equal(2, result.LeastMarginNode); // inlet, crest, behind the bend's loss, outlet
    }

    [Fact]
    public void The_largest_velocity_is_that_of_the_narrowest_bore()
    {
        Line line = Jobs.SiphonLine();
        Line nozzle = line with { Path = [.. line.Path, new PlainLoss { Coefficient = 0.1, Bore = 0.016 }] };
        DrainResult result = Jobs.Run(Jobs.Siphon() with { DrawOffs = Jobs.Only(nozzle) });
        Assert.Equal(result.LargestFlow.Value / (Math.PI / 4 * 0.016 * 0.016), result.LargestVelocity.Value, 1e-9);
    }

    [Fact]
    public void A_peak_between_two_steps_is_found()
    {
        var rain = new Inflow { Points = [(0, 0.0), (200, 0.02), (400, 0)] };
        DrainResult result = Jobs.Run(Jobs.OrificeDrain(level: 1) with { Inflow = rain });
        double sampled = Enumerable.Range(0, 4001).Max(i => result.Trace.At(i / 4000.0 * 500).Flow);
        Assert.Equal(sampled, result.LargestFlow.Value, 1e-6 * sampled);
        Assert.InRange(result.LargestFlow.Time, 200, 400);
    }
}
