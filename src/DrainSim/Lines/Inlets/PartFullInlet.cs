using System.Diagnostics;

namespace DrainSim.Lines.Inlets;

/// <summary>What the inlet of a gravity drain lets in while the liquid no longer covers it well.</summary>
/// <remarks>
/// A closed set: the cases live beside this file. For a line that never rises above its inlet; a siphon whose inlet uncovers
/// has taken air. Depths count from the case's own floor: the invert of a side opening, the rim of a floor opening, the
/// floor under a dip leg. All flows are those of one bore.
/// <para>
/// A bore runs full again when the surface stands 0.2 to 0.5 bores above its top: "submerged" is a headwater of 1.2 to 1.5 times the
/// height of a culvert (V. T. Chow, Open-Channel Hydraulics, 1959, section 17; from memory). Over that band the limit is let go, to
/// infinity, so that a well covered inlet leaves the line's own flow untouched.
/// </para>
/// </remarks>
public abstract record PartFullInlet
{
    private const double ReleaseBegins = 0.2;
    private const double ReleaseEnds = 0.5;

    private protected PartFullInlet()
    {
    }

    /// <summary>Inside diameter of the inlet, m; greater than 0.</summary>
    public required double Bore { get; init => field = Require.Positive(value, "inlet bore", "m"); }

    /// <summary>The inlet of a line.</summary>
    /// <param name="facing">which way it looks</param>
    /// <param name="bore">inside diameter, m; greater than 0</param>
    /// <param name="edgeLoss">loss coefficient of the edge, 1; at least 0</param>
    /// <param name="floorClearance">height of a rim that looks down above the floor, m; greater than 0; not used for the others</param>
    /// <exception cref="ArgumentOutOfRangeException">a value is outside its range</exception>
    public static PartFullInlet Of(InletFacing facing, double bore, double edgeLoss, double floorClearance) => facing switch
    {
        InletFacing.Side => new SideOpening { Bore = bore, EdgeLoss = edgeLoss },
        InletFacing.Up => new FloorOpening { Bore = bore },
        InletFacing.Down => new DipLegOverFloor { Bore = bore, Clearance = floorClearance },
        _ => throw new UnreachableException($"no inlet faces {facing}"),
    };

    /// <summary>Most flow that the inlet lets in, m³/s; 0 for no depth, never falling with it, infinite once well covered.</summary>
    /// <param name="depth">depth of liquid over the case's floor, m</param>
    /// <param name="gravity">acceleration of gravity, m/s²; greater than 0</param>
    /// <param name="slope">dQ/dh, m²/s; 0 for no depth and where the flow is infinite</param>
    public abstract double Limit(double depth, double gravity, out double slope);

    /// <summary>Flow of the drain: the smaller of the line's own and the inlet's, blended as in <see cref="FlowBlend"/>, m³/s.</summary>
    /// <param name="depth">depth of liquid over the case's floor, m</param>
    /// <param name="gravity">acceleration of gravity, m/s²; greater than 0</param>
    /// <param name="lineFlow">flow of one line running full, m³/s</param>
    /// <param name="lineSlope">its slope by the depth, m²/s</param>
    /// <param name="slope">dQ/dh, m²/s</param>
    public double Flow(double depth, double gravity, double lineFlow, double lineSlope, out double slope)
    {
        double limit = Limit(depth, gravity, out double limitSlope);
        double flow = FlowBlend.Lesser(lineFlow, limit, out double lineShare, out double inletShare);
        slope = lineShare * lineSlope + inletShare * limitSlope;
        return flow;
    }

    // Divides by 1 − s²·(3 − 2·s), s from 0 to 1 over the band of cover in which the bore comes to run full.
    private protected double Release(double flow, double cover, ref double slope)
    {
        double s = (cover / Bore - ReleaseBegins) / (ReleaseEnds - ReleaseBegins);
        if (s <= 0)
            return flow;
        double left = (1 - s) * (1 - s) * (1 + 2 * s);
        if (s >= 1 || left < 1e-9)
        {
            slope = 0;
            return double.PositiveInfinity;
        }
        double leftByDepth = -6 * s * (1 - s) / (Bore * (ReleaseEnds - ReleaseBegins));
        slope = (slope - flow * leftByDepth / left) / left;
        return flow / left;
    }
}
