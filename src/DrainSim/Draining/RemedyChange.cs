using System.Diagnostics;
using DrainSim.Gas;
using DrainSim.Lines;
using DrainSim.Vessels;

namespace DrainSim.Draining;

/// <summary>How each kind of remedy changes a job, and over which range it is tried.</summary>
internal static class RemedyChange
{
    /// <summary>Largest change of elevation that is tried, m.</summary>
    private const double LargestDrop = 64;

    /// <summary>Largest loss coefficient that is tried as a throttle, 1.</summary>
    private const double LargestLoss = 1e6;

    /// <summary>Bore of the widest vent that is tried, m.</summary>
    private const double WidestVent = 1;

    /// <summary>Whether a change is settled by the ratio of the bracket's ends rather than by their distance.</summary>
    public static bool IsRatio(RemedyKind kind) => kind is RemedyKind.ThrottleOutlet or RemedyKind.WidenVent;

    /// <summary>The change that is tried first.</summary>
    public static double First(RemedyKind kind) => kind switch
    {
        RemedyKind.ThrottleOutlet => 1,
        RemedyKind.WidenVent => 1e-3,
        _ => 2e-3,
    };

    /// <summary>The largest change that is tried.</summary>
    public static double Most(Job job, RemedyKind kind) => kind switch
    {
        RemedyKind.ThrottleOutlet => LargestLoss,
        RemedyKind.WidenVent => WidestVent,
        RemedyKind.LessInflow => 1,
        RemedyKind.LowerCrest => CrestRoom(job),
        RemedyKind.LowerInlet => job.Line.Inlet.Elevation,
        _ => LargestDrop,
    };

    /// <summary>The job with a change.</summary>
    /// <returns>null where it cannot be changed so</returns>
    public static Job? Apply(Job job, RemedyKind kind, double change) => kind switch
    {
        RemedyKind.LowerOutlet or RemedyKind.LowerReceiver => WithLine(job, LineChanges.WithLowerOutlet(job.Line, change), change),
        RemedyKind.LowerCrest => WithLine(job, LineChanges.WithLowerCrest(job.Line, change), 0),
        RemedyKind.LowerInlet => WithLine(job, LineChanges.WithLowerInlet(job.Line, change), 0),
        RemedyKind.ThrottleOutlet => WithLine(job, LineChanges.WithThrottle(job.Line, change), 0),
        RemedyKind.WidenVent => WithVent(job, change),
        RemedyKind.LessInflow => WithInflow(job, 1 - change),
        RemedyKind.HigherBrim => WithBrim(job, change),
        _ => throw new UnreachableException(kind.ToString()),
    };

    /// <summary>What the changed thing is then, as <see cref="Remedy.Value"/> tells it.</summary>
    public static double ValueAfter(Job job, RemedyKind kind, double change)
    {
        var hydraulics = new LineHydraulics(job.Line, job.Liquid, job.Site.Gravity);
        return kind switch
        {
            RemedyKind.LowerOutlet or RemedyKind.LowerReceiver => hydraulics.OutletElevation - change,
            RemedyKind.LowerCrest => hydraulics.CrestElevation - change,
            RemedyKind.LowerInlet => hydraulics.InletElevation - change,
            RemedyKind.LessInflow => (1 - change) * job.Inflow!.Points.Max(point => point.Flow),
            RemedyKind.HigherBrim => job.DrawOffs.Select(drawOff => drawOff.Receiver).OfType<ReceivingTank>().First().BrimDepth + change,
            _ => change,
        };
    }

    private static Job? WithLine(Job job, Line? line, double receiverDrop)
    {
        if (line is null)
            return null;
        DrawOff first = job.DrawOffs[0] with { Line = line };
        if (receiverDrop > 0)
            first = first with { Receiver = Lowered(first.Receiver, receiverDrop) };
        return job with { DrawOffs = [first, .. job.DrawOffs.Skip(1)] };
    }

    private static Receiver? Lowered(Receiver? receiver, double drop) => receiver switch
    {
        FixedSurface water => water with { Elevation = water.Elevation - drop },
        ReceivingTank tank => tank with { Bottom = tank.Bottom - drop },
        _ => receiver,
    };

    private static Job? WithVent(Job job, double bore)
    {
        Opening vent = new VentOrifice { Bore = bore };
        return job.Headspace switch
        {
            VentedHeadspace vented => job with { Headspace = vented with { Openings = [.. vented.Openings, vent] } },
            ClosedHeadspace closed => job with
            {
                Headspace = new VentedHeadspace
                {
                    PolytropicExponent = closed.PolytropicExponent,
                    InitialPressure = closed.InitialPressure,
                    Openings = [vent],
                },
            },
            _ => null,
        };
    }

    private static Job? WithInflow(Job job, double share) => job.Inflow is { } inflow
        ? job with { Inflow = share > 0 ? new Inflow { Points = [.. inflow.Points.Select(p => (p.Time, share * p.Flow))] } : null }
        : null;

    private static Job? WithBrim(Job job, double rise)
    {
        var drawOffs = new List<DrawOff>();
        foreach (DrawOff drawOff in job.DrawOffs)
        {
            ReceivingTank? higher = drawOff.Receiver is ReceivingTank tank ? Higher(tank, tank.BrimDepth + rise) : null;
            if (drawOff.Receiver is ReceivingTank && higher is null)
                return null;
            drawOffs.Add(higher is null ? drawOff : drawOff with { Receiver = higher });
        }

        return job with { DrawOffs = drawOffs };
    }

    /// <summary>
    /// The receiver with its walls as high as its new brim, carried on straight up where they end lower; null for one that closes
    /// over itself, as a drum or a sphere does.
    /// </summary>
    private static ReceivingTank? Higher(ReceivingTank tank, double brim)
    {
        double missing = brim - tank.Vessel.Height;
        if (missing <= 0)
            return tank with { Brim = brim };
        if (tank.Vessel.Area(tank.Vessel.Height) <= 0)
            return null;
        double width = 2 * Math.Sqrt(tank.Vessel.Area(tank.Vessel.Height * (1 - 1e-9)) / Math.PI);
        Vessel collar = new VerticalCylinder { Diameter = Math.Max(width, 1e-3), ShellHeight = missing, Bottom = new Flat(), Top = new Flat() };
        return tank with { Brim = brim, Vessel = new Stack { Sections = [tank.Vessel, collar] } };
    }

    /// <summary>How far the crest can come down, m: to the rim where the line hangs over it, else to the inlet.</summary>
    private static double CrestRoom(Job job)
    {
        var hydraulics = new LineHydraulics(job.Line, job.Liquid, job.Site.Gravity);
        double rim = job.Vessel.Height, crest = hydraulics.CrestElevation;
        return crest - (crest >= rim ? rim : hydraulics.InletElevation);
    }
}
