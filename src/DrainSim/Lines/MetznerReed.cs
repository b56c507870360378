using DrainSim.Liquids;

namespace DrainSim.Lines;

/// <summary>Reynolds number of a power-law liquid in a round pipe, so made that laminar friction is 64/Re.</summary>
/// <remarks><code>
/// Re = ρ·V^(2−n)·D^n / ( 8^(n−1)·K·((3n+1)/(4n))^n )
///
/// ρ  density, kg/m³        V  mean velocity, m/s      D  bore, m
/// K  consistency, Pa·s^n   n  flow index, 1
/// </code>
/// Exact for laminar flow. A yield stress is not in it.
/// Source: A. B. Metzner and J. C. Reed, AIChE J. 1 (1955) 434–440.
/// </remarks>
public static class MetznerReed
{
    /// <summary>The Reynolds number, 1.</summary>
    /// <param name="curve">the liquid's flow curve, of which K and n count</param>
    /// <param name="density">ρ, kg/m³; greater than 0</param>
    /// <param name="velocity">V, m/s; greater than 0</param>
    /// <param name="bore">D, m; greater than 0</param>
    public static double Reynolds(FlowCurve curve, double density, double velocity, double bore)
    {
        double n = curve.FlowIndex;
        return density * Math.Pow(velocity, 2 - n) * Math.Pow(bore, n)
            / (Math.Pow(8, n - 1) * curve.Consistency * Math.Pow((3 * n + 1) / (4 * n), n));
    }
}
