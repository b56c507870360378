namespace DrainSim.Lines.Inlets;

/// <summary>The smaller of the flow that the line can carry and the flow that its inlet lets in, without a kink.</summary>
/// <remarks><code>
/// Q = L·φ(C/L)
/// φ(r) = r for r ≤ 1 − b,   r − (r − 1 + b)²/(4·b) between,   1 for r ≥ 1 + b
///
/// L   flow of the line running full, C flow that the inlet lets in, Q flow, m³/s;  b = 0.05, 1
/// </code>
/// Continuous with its first derivatives, rising in both flows, exactly the line's flow where the inlet could pass 5 % more and
/// exactly the inlet's where it is 5 % short; at worst, at equal flows, 1.25 % below the smaller. A numerical device, no physics.
/// </remarks>
public static class FlowBlend
{
    /// <summary>Half width b of the band of C/L in which the two are blended, 1.</summary>
    public const double HalfWidth = 0.05;

    /// <summary>The blended flow, m³/s.</summary>
    /// <param name="line">flow of the line running full, m³/s; at or below 0 it is given back as it is</param>
    /// <param name="inlet">flow that the inlet lets in, m³/s; at least 0, infinite for no limit</param>
    /// <param name="lineShare">∂Q/∂L, 1; from 0 to 1</param>
    /// <param name="inletShare">∂Q/∂C, 1; from 0 to 1</param>
    public static double Lesser(double line, double inlet, out double lineShare, out double inletShare)
    {
        lineShare = 1;
        inletShare = 0;
        if (line <= 0 || inlet >= (1 + HalfWidth) * line)
            return line;
        if (inlet <= (1 - HalfWidth) * line)
        {
            lineShare = 0;
            inletShare = 1;
            return inlet;
        }
        double r = inlet / line;
        double inside = r - 1 + HalfWidth;
        double share = r - inside * inside / (4 * HalfWidth);
        inletShare = 1 - inside / (2 * HalfWidth);
        lineShare = share - r * inletShare;
        return line * share;
    }
}
