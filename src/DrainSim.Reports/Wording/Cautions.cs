using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Liquids;
using DrainSim.Reports.Measures;
using DrainSim.Vessels;

namespace DrainSim.Reports.Wording;

/// <summary>The cautions for safe use that a job calls for, the gravest first.</summary>
/// <remarks>Common practice in short, no source; local codes and licensed practice stand above each of them.</remarks>
public static class Cautions
{
    /// <summary>The line that closes every list.</summary>
    public static Caution Closing { get; } = new("authorises_nothing",
        "DrainSim informs; it authorises nothing. Local codes, the site's permit and licensed practice decide.");

    /// <summary>Velocity up to which a flammable liquid is started, m/s: API RP 2003 and IEC TS 60079-32-1, from memory.</summary>
    private const double SlowStart = 1;

    /// <summary>Velocity that a flammable liquid never passes, m/s: the same, from memory.</summary>
    private const double FullFlow = 7;

    /// <summary>The cautions for a job before it is run, <see cref="Closing"/> last.</summary>
    /// <param name="job">the job</param>
    /// <param name="format">writes the measures</param>
    public static IReadOnlyList<Caution> For(Job job, MeasureFormat format) => For(job, format, null);

    /// <summary>The cautions for a job that was run, <see cref="Closing"/> last.</summary>
    /// <param name="result">what the run found</param>
    /// <param name="format">writes the measures</param>
    public static IReadOnlyList<Caution> For(DrainResult result, MeasureFormat format) =>
        For(result.Job, format, result.LargestVelocity.Value);

    private static List<Caution> For(Job job, MeasureFormat format, double? velocity)
    {
        LiquidHazards hazards = job.Liquid.Hazards;
        var cautions = new List<Caution>();
        if (hazards.HasFlag(LiquidHazards.Flammable) && velocity > SlowStart)
            cautions.Add(Charging(velocity.Value, format));
        AddLiquid(cautions, hazards, format, job.Liquid.Temperature);
        if (new LineProfile(job.Line).IsSiphon)
        {
            cautions.Add(new("never_by_mouth",
                "Never start a siphon by mouth. Fill the line first, or use a priming pump or bulb."));
        }
        if (job.Vessel is Basin)
        {
            cautions.Add(new("earth_dam_drawdown",
                "A fast drawdown can bring down an earth bank or dam. Keep the rate that its engineer "
                + "or the dam authority allows, and watch the slopes."));
        }
        else
        {
            cautions.Add(new("confined_space",
                "A tank or sump is a confined space: nobody goes in without a permit, a gas test and a watch outside."));
        }
        if (job.Headspace is ConfinedHeadspace)
        {
            cautions.Add(new("vacuum_collapse",
                "A tank that cannot breathe is crushed by a small vacuum. See that its vent is open and large enough "
                + "before the valve is."));
        }
        if (!hazards.HasFlag(LiquidHazards.Polluting))
        {
            cautions.Add(new("release",
                "Know where the outlet leads. What leaves the site may need a consent, plain water too."));
        }
        cautions.Add(Closing);
        return cautions;
    }

    private static Caution Charging(double velocity, MeasureFormat format)
    {
        string full = velocity > FullFlow ? $" and past the {format.Velocity(FullFlow)} that they never allow" : "";
        return new("static_charge",
            $"It runs at up to {format.Velocity(velocity)}. API RP 2003 and IEC TS 60079-32-1 ask for a slow start, no more than "
            + $"{format.Velocity(SlowStart)} until the outlet is covered, and for less than {format.Velocity(FullFlow)} after it, less "
            + $"still in wide bores{full}. This is a reminder, no permission: throttle as your standard says.");
    }

    private static void AddLiquid(
        List<Caution> cautions, LiquidHazards hazards, MeasureFormat format, double temperature)
    {
        if (hazards.HasFlag(LiquidHazards.Flammable))
        {
            cautions.Add(new("flammable",
                "Flammable: bond and ground tank, hose and receiver, start slowly until the outlet is covered, "
                + "no splashing, no source of ignition in reach of the vapour."));
        }
        else if (hazards.HasFlag(LiquidHazards.Combustible))
        {
            cautions.Add(new("combustible",
                "Combustible: keep flames, hot work and hot surfaces away; a mist of it burns below its flash point."));
        }
        if (hazards.HasFlag(LiquidHazards.Hot))
        {
            cautions.Add(new("hot",
                $"Hot ({format.Temperature(temperature)}): it scalds. A hose rated for it, covered skin, face shield; "
                + "hoses soften and may collapse at the crest."));
        }
        if (hazards.HasFlag(LiquidHazards.Corrosive))
        {
            cautions.Add(new("corrosive",
                "Corrosive: hose and joints must suit it. Gloves, face shield, and running water at hand."));
        }
        if (hazards.HasFlag(LiquidHazards.Toxic))
        {
            cautions.Add(new("toxic",
                "Toxic: keep out of its vapour and off the skin. Closed transfer, breathing protection as its data sheet says."));
        }
        if (hazards.HasFlag(LiquidHazards.Polluting))
        {
            cautions.Add(new("polluting",
                "Harms soil, water or a sewer: outlet into a tight receiver, drains covered, spill kit ready, "
                + "somebody at the outlet all the time."));
        }
    }
}
