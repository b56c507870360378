namespace DrainSim.Lines.Inlets;

/// <summary>Flow that passes through critical depth in the mouth of a round bore.</summary>
/// <remarks><code>
/// Q²/g = A³/T
/// H = y + (1 + K) · Q²/(2·g·A²) = y + (1 + K) · A/(2·T)
///
/// Q   flow, m³/s;  g  gravity, m/s²;  y  depth, T surface width, A wetted area at the control, m and m²
/// H   height of the surface in the tank above the invert of the bore, m;  K  loss coefficient of the entry edge, 1
/// </code>
/// For a bore that is level or falls, so that nothing backs up from below, and a liquid thin enough that friction over
/// the mouth is small (the Reynolds number on the depth well above 1 000); velocity even over the section. H rises
/// strictly with y, to infinity as the bore fills, so every H has one flow. Source: V. T. Chow, Open-Channel Hydraulics (1959),
/// chapters 3 and 4 (from memory).
/// </remarks>
public static class CriticalFlow
{
    private const int MostTurns = 100;

    /// <summary>The flow under a head, m³/s, and its slope; 0 for no head.</summary>
    /// <param name="head">height of the surface above the invert, m</param>
    /// <param name="bore">inside diameter, m; greater than 0</param>
    /// <param name="entryLoss">K of the entry edge, 1; at least 0</param>
    /// <param name="gravity">acceleration of gravity, m/s²; greater than 0</param>
    /// <param name="slope">dQ/dH, m²/s; 0 for no head</param>
    public static double UnderHead(double head, double bore, double entryLoss, double gravity, out double slope)
    {
        slope = 0;
        if (head <= 0)
            return 0;
        double loss = 1 + entryLoss;
        CircularSection section = new(AngleUnderHead(head / bore, loss));
        double area = bore * bore / 4 * section.Segment;
        double flow = area * Math.Sqrt(2 * gravity * (head - bore * section.Depth) / loss);
        // A·T′/T², 1/3 in a shallow trickle, falling without limit as the bore fills.
        double closing = section.Segment * section.Cosine / (2 * section.Sine * section.Sine * section.Sine);
        double widthByArea = 4 * section.Sine / (bore * section.Segment);
        slope = flow * widthByArea * (3 - closing) / (2 + loss * (1 - closing));
        return flow;
    }

    /// <summary>The depth at which a flow is critical, m; 0 for no flow, below the bore for any.</summary>
    /// <param name="flow">flow, m³/s; at least 0</param>
    /// <param name="bore">inside diameter, m; greater than 0</param>
    /// <param name="gravity">acceleration of gravity, m/s²; greater than 0</param>
    public static double Depth(double flow, double bore, double gravity)
    {
        if (flow <= 0)
            return 0;
        double square = flow * flow / (gravity * Math.Pow(bore, 5));
        double low = 0;
        double high = Math.PI;
        double angle = Math.Min(Math.Pow(216 * square, 0.125), 3);
        for (int turn = 0; turn < MostTurns; turn++)
        {
            CircularSection section = new(angle);
            double quarter = section.Segment / 4;
            double excess = quarter * quarter * quarter - square * section.Sine;
            double slope = 1.5 * quarter * quarter * section.Sine * section.Sine - square * section.Cosine;
            if (Advance(ref angle, ref low, ref high, excess, slope))
                break;
        }
        return bore * new CircularSection(angle).Depth;
    }

    // Root of (y − H)·sin φ + (1 + K)·(φ − sin φ·cos φ)/8 = 0, the head equation freed of its pole at the full bore.
    private static double AngleUnderHead(double head, double loss)
    {
        double low = 0;
        double high = Math.PI;
        double angle = Math.Min(Math.Sqrt(head / (0.25 + loss / 12)), 2.5);
        for (int turn = 0; turn < MostTurns; turn++)
        {
            CircularSection section = new(angle);
            double excess = (section.Depth - head) * section.Sine + loss * section.Segment / 8;
            double slope = section.Sine * section.Sine * (0.5 + loss / 4) + (section.Depth - head) * section.Cosine;
            if (Advance(ref angle, ref low, ref high, excess, slope))
                break;
        }
        return angle;
    }

    // One turn of Newton, halving where that leaves the bracket; true at the root.
    private static bool Advance(ref double angle, ref double low, ref double high, double excess, double slope)
    {
        if (excess > 0)
            high = angle;
        else
            low = angle;
        double step = excess / slope;
        // A step below the last bits may point out of the bracket; it is an end, not a reason to halve.
        if (Math.Abs(step) <= 1e-15 * angle)
            return true;
        double next = angle - step;
        angle = next > low && next < high ? next : (low + high) / 2;
        return high - low <= 1e-15 * high;
    }
}
