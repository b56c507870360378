using DrainSim.Lines;

namespace DrainSim.Draining;

/// <summary>Whether a line can carry a flow at the first instant, and what it needs for it.</summary>
internal static class StartCheck
{
    /// <summary>Why a line does not flow; null when it does.</summary>
    /// <param name="job">the job</param>
    /// <param name="line">one of its lines</param>
    /// <param name="gas">pressure on the liquid at the start, Pa absolute</param>
    public static NoStart? Refusal(Job job, CompiledLine line, double gas)
    {
        double head = line.Head(job.Level, gas, delivered: 0);
        // A drain that the liquid may yet rise to, or that is yet to be changed, waits; a siphon cannot.
        bool waits = line.HasTail && (job.Inflow is not null || job.Timeline.Any());
        bool runsBack = head < -job.Run.SettledWithin && line.IsSubmerged(0);
        return line switch
        {
            { Hydraulics.IsShut: true } when !job.Timeline.Any() => NoStart.ValveShut,
            _ when waits => null,
            _ when job.Level <= line.Hydraulics.InletElevation => NoStart.InletAboveLevel,
            _ when !runsBack && head <= job.Run.SettledWithin => NoStart.NoDrivingHead,
            _ when line.Hydraulics.YieldHead > 0 && line.MovingHead(job.Level, gas, 0) <= job.Run.SettledWithin => NoStart.YieldHolds,
            { Filling: not null } when line.FrontHead(0, job.Level, gas, 0) <= 0 => NoStart.NoPrime,
            { Filling: { } filling } when line.FrontHead(0, job.Level, gas, 0) <= filling.YieldHead(0, 0) => NoStart.YieldHolds,
            _ when line.Margin(0, job.Level, gas) <= 0 => NoStart.LiftBeyondLimit,
            _ => null,
        };
    }

    /// <summary>What the line needs before it runs; null where it never rises above its inlet.</summary>
    /// <param name="job">the job</param>
    /// <param name="line">one of its lines</param>
    public static PrimeReport? Prime(Job job, CompiledLine line)
    {
        LineHydraulics hydraulics = line.Hydraulics;
        if (!hydraulics.RisesAboveInlet)
            return null;
        double lift = hydraulics.CrestElevation - job.Level, bore = line.DrawOff.Line.Bore;
        double dip = Math.Min(job.Level - hydraulics.InletElevation, hydraulics.Node(hydraulics.CrestIndex).Distance);
        return new PrimeReport(
            hydraulics.LineVolume,
            hydraulics.InnerLegVolume,
            hydraulics.OuterLegVolume,
            job.Level,
            lift,
            (job.Site.AtmosphericPressure - line.Threshold) / line.SpecificWeight,
            Math.Max(0, lift * line.SpecificWeight),
            line.DrawOff.Front,
            bore <= WidestByHand && dip > 0 ? (int)Math.Min(MostDips, Math.Ceiling(LengthToFill(hydraulics, job.Level) / dip)) : null);
    }

    /// <summary>Widest hose that a hand caps, m; common practice, no source.</summary>
    private const double WidestByHand = 0.05;

    /// <summary>Fills beyond which nobody counts, 1.</summary>
    private const double MostDips = 1000;

    /// <summary>
    /// Length of line from the inlet to the place behind the crest at which the front stands at the level, m: filled so far, the
    /// line runs by itself. The whole length where it never falls to the level.
    /// </summary>
    private static double LengthToFill(LineHydraulics hydraulics, double level)
    {
        for (int i = hydraulics.CrestIndex + 1; i < hydraulics.NodeCount; i++)
        {
            (LineNode from, LineNode to) = (hydraulics.Node(i - 1), hydraulics.Node(i));
            if (to.Elevation > level)
                continue;
            double share = from.Elevation <= level ? 0 : (from.Elevation - level) / (from.Elevation - to.Elevation);
            return from.Distance + share * (to.Distance - from.Distance);
        }

        return hydraulics.TotalLength;
    }
}
