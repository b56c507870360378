namespace DrainSim.Draining;

/// <summary>The last flow that a line was solved for, from which the next search begins.</summary>
/// <remarks><code>
/// q ≈ q₀·(1 + m·r + m·(m − 1)/2·r²)     r = H/H₀ − 1,  m = (H₀/q₀)·dq/dH
///
/// q₀  flow under the head H₀, m³/s, m;  dq/dH its slope, m²/s
/// </code>
/// Within a regime the flow is near a power of the head, and the first terms of that power's series are within some 1e-5 of the
/// flow at the next stage of a step: one evaluation of the losses less than from the last flow itself.
/// </remarks>
/// <param name="Flow">flow, m³/s; 0 where none is known</param>
/// <param name="Head">driving head that it belongs to, m; 0 where only the flow is known</param>
/// <param name="Slope">dq/dH there, m²/s</param>
internal readonly record struct KnownFlow(double Flow, double Head = 0, double Slope = 0)
{
    /// <summary>Largest change of the head, as a share, for which the series is used.</summary>
    private const double Widest = 0.5;

    /// <summary>A flow near that under another head, m³/s.</summary>
    /// <param name="head">driving head, m</param>
    public double Near(double head)
    {
        if (!(Head > 0) || !(Flow > 0))
            return Flow;
        double r = (head - Head) / Head;
        if (!(Math.Abs(r) < Widest))
            return Flow;
        double m = Slope * Head / Flow;
        return Flow * (1 + m * r * (1 + (m - 1) / 2 * r));
    }
}
