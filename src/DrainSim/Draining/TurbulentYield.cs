using DrainSim.Lines;

namespace DrainSim.Draining;

/// <summary>How far the published forms for turbulent flow of a Bingham liquid lie apart.</summary>
internal static class TurbulentYield
{
    /// <summary>
    /// Share by which the friction of <see cref="DarbyMelson"/> is less than that of the run in the line's own bore, 1; 0 where
    /// the flow is not turbulent or the liquid no Bingham liquid.
    /// </summary>
    /// <param name="line">the line</param>
    /// <param name="job">the job</param>
    /// <param name="flow">flow, m³/s</param>
    public static double ShareLess(CompiledLine line, Job job, double flow)
    {
        if (job.Liquid.FlowCurve is not { YieldStress: > 0, FlowIndex: 1 } curve || flow <= 0)
            return 0;
        double laminar = FrictionFactor.Laminar(line.Hydraulics.Reynolds(flow));
        if (line.Hydraulics.Reynolds(flow) < FrictionFactor.TurbulentLimit)
            return 0;
        (double density, double bore) = (job.Liquid.Density, line.DrawOff.Line.Bore);
        double re = density * line.Hydraulics.Velocity(flow) * bore / curve.Consistency;
        double hedstrom = density * bore * bore * curve.YieldStress / (curve.Consistency * curve.Consistency);
        double taken = DodgeMetzner.FrictionFactor(re, 1, line.DrawOff.Line.Roughness / bore);
        return 1 - DarbyMelson.FrictionFactor(re, hedstrom, laminar) / taken;
    }
}
