using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Lines.Inlets;

namespace DrainSim.Tests.Draining;

/// <summary>A gravity drain goes on as a partly full inlet: "bore uncovered" and "empty" are two times.</summary>
public sealed class TailTests
{
    [Theory]
    [InlineData(InletFacing.Side)]
    [InlineData(InletFacing.Up)]
    public void The_bore_uncovers_before_the_tank_is_empty(InletFacing facing)
    {
        DrainResult result = Jobs.Run(Drain(facing, 0));
        DrainEvent uncovered = Assert.Single(result.Events, e => e.Code == EventCode.BoreUncovered);
        Assert.Equal(Outcome.Emptied, result.Outcome);
        Assert.True(uncovered.Time < 0.99 * result.StoppedAt);
        Assert.True(uncovered.Level > 10 * result.FinalLevel);
        Assert.Equal(1e-3, result.FinalLevel, 1e-9);
    }

    [Theory]
    [InlineData(InletFacing.Side)]
    [InlineData(InletFacing.Up)]
    public void The_tail_never_shortens_the_job(InletFacing facing) =>
        Assert.True(Jobs.Run(Drain(facing, 0)).StoppedAt > Jobs.Run(Drain(InletFacing.Down, 0)).StoppedAt);

    /// <summary>Weir flow C·h^1.5 alone: 1/√h₂ − 1/√h₁ = C/(2A)·(t₂ − t₁).</summary>
    [Fact]
    public void The_last_film_over_a_floor_drain_follows_the_weir()
    {
        DrainResult result = Jobs.Run(Drain(InletFacing.Up, 0));
        double uncovered = result.Events.Single(e => e.Code == EventCode.BoreUncovered).Time;
        Instant from = result.Trace.At((uncovered + result.StoppedAt) / 2);
        double weir = FloorOpening.SharpCrest * 2 / 3 * Math.Sqrt(2 * Site.StandardGravity) * Math.PI * 0.05;
        double time = (1 / Math.Sqrt(result.FinalLevel) - 1 / Math.Sqrt(from.Level)) * 2 * 2 / weir;
        Assert.Equal(time, result.StoppedAt - from.Time, 1e-6 * result.StoppedAt);
    }

    [Fact]
    public void A_side_outlet_above_the_floor_leaves_its_heel()
    {
        DrainResult result = Jobs.Run(Drain(InletFacing.Side, 0.2));
        Assert.Equal(Outcome.InletUncovered, result.Outcome);
        Assert.Equal(0.2 + 1e-3, result.FinalLevel, 1e-9);
    }

    private static Job Drain(InletFacing facing, double elevation)
    {
        Line line = Jobs.Orifice(0.05, 0.6);
        return Jobs.OrificeDrain(level: 1) with
        {
            DrawOffs = Jobs.Only(line with { Inlet = line.Inlet with { Facing = facing, Elevation = elevation } }),
        };
    }
}
