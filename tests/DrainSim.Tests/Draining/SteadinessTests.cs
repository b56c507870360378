using DrainSim.Draining;
using DrainSim.Lines;

namespace DrainSim.Tests.Draining;

/// <summary>The quasi-steady picture is checked, and the reader warned where it is not fair.</summary>
public sealed class SteadinessTests
{
    /// <summary>Of an orifice the surface's velocity head is (Cd·a/A)² of the head at every level.</summary>
    [Theory]
    [InlineData(0.05, false)]
    [InlineData(0.8, true)]
    public void The_surface_velocity_is_weighed_against_the_head(double bore, bool warns)
    {
        DrainResult result = Jobs.Run(Jobs.OrificeDrain(bore: bore));
        double share = 0.6 * Math.PI / 4 * bore * bore / 2;
        Assert.Equal(share * share, result.Steadiness.SurfaceVelocityRatio, 1e-6 * share * share);
        Assert.Equal(warns, result.Warnings.Any(w => w.Code == WarningCode.SurfaceVelocityMatters));
    }

    /// <summary>L·v/(g·H) goes with 1/√H: it is largest at the end, where the head is least.</summary>
    [Theory]
    [InlineData(2.0, 2.0, false)]
    [InlineData(0.02, 2000.0, true)]
    public void The_inertia_of_the_line_is_weighed_against_the_job(double area, double length, bool warns)
    {
        Line pipe = Jobs.Orifice(0.05, 0.6) with { Path = [new StraightRun { Length = length, Rise = -1 }] };
        Job job = Jobs.OrificeDrain(area) with { DrawOffs = Jobs.Only(pipe) };
        DrainResult result = Jobs.Run(job);
        Instant last = result.Trace.At(result.StoppedAt);
        double inertia = length * last.Velocity / (Site.StandardGravity * last.Head) / result.StoppedAt;
        Assert.Equal(inertia, result.Steadiness.InertiaRatio, 1e-6 * inertia);
        Assert.Equal(warns, result.Warnings.Any(w => w.Code == WarningCode.InertiaMatters));
    }

    [Fact]
    public void The_share_of_the_transition_is_the_time_between_its_limits()
    {
        DrainResult result = Jobs.Run(Jobs.Siphon() with
        {
            Liquid = Jobs.Water with { Viscosity = 0.009 },
            DrawOffs = Jobs.Only(Jobs.SiphonLine(40)),
            Level = 2.5,
            Run = new RunSettings { Until = 1e6 },
        });
        double enters = result.Events.Single(e => e.Code == EventCode.LeftTurbulent).Time;
        double leaves = result.Events.FirstOrDefault(e => e.Code == EventCode.BecameLaminar) is { Number: > 0 } e ? e.Time : result.StoppedAt;
        Assert.Equal((leaves - enters) / result.StoppedAt, result.Steadiness.TransitionShare, 1e-9);
        Assert.Contains(result.Warnings, w => w.Code == WarningCode.TransitionFlow);
    }
}
