using DrainSim.Liquids;

namespace DrainSim.Lines;

/// <summary>Laminar flow of a liquid with any flow curve in one bore: wall stress, Reynolds number, velocity head.</summary>
/// <remarks><code>
/// q = A·(D/2)·n·K^(−1/n)·s^(1+1/n)·( s²/(3n+1) + 2·τ_y·s/(2n+1) + τ_y²/(n+1) )/τ_w³        s = τ_w − τ_y
/// Re = 8·ρ·V²/τ_w,  so that f = 64/Re
///
/// q    flow of one line, m³/s           τ_w  shear stress at the wall, Pa
/// A    area of the bore, m²             s    its excess over the yield stress, Pa
/// D    bore, m                          V    mean velocity q/A, m/s
/// </code>
/// Exact: the integral of the velocity profile of a Herschel–Bulkley liquid in a round pipe, without its cancelling
/// differences. With n = 1 it is the equation of Buckingham (1921) and Reiner (1926),
/// 8V/D = τ_w/μ_p·(1 − 4/3·φ + φ⁴/3) with φ = τ_y/τ_w, with τ_y = 0 that of Metzner and Reed. It is solved for s by Newton's
/// method in logarithms, in which q(s) rises with a slope from 1/n to 1 + 1/n and bends down: from the power law's s, which
/// is too small, the steps go up to the root and never past it.
/// <para>
/// Velocity head α·V²/2g: laminar α = 3(3n+1)²/((2n+1)(5n+3)), exact for a power law and 2 for n = 1; with a yield stress the
/// flatter profile has less, so that this is the most. Held to 2, it falls from Re 2000 to 1 at Re 4000 as a power of the
/// flow, by which α·V² rises for every n. Formula: R. Darby, Chemical Engineering Fluid Mechanics (2001), table 5-1 (from
/// memory; it is the integral of the profile's cube).
/// </para>
/// </remarks>
internal sealed class BoreStress
{
    private const double LastStep = 1e-8;
    private const int MostTurns = 100;

    private readonly double n;
    private readonly double yield;
    private readonly double logScale;
    private readonly double laminarAlpha;
    private readonly double alphaExponent;

    /// <param name="curve">the liquid's flow curve</param>
    /// <param name="density">its density, kg/m³</param>
    /// <param name="bore">bore, m</param>
    public BoreStress(FlowCurve curve, double density, double bore)
    {
        (n, yield, Bore) = (curve.FlowIndex, curve.YieldStress, bore);
        double area = Math.PI / 4 * bore * bore;
        logScale = Math.Log(area * bore / 2 * n) - Math.Log(curve.Consistency) / n;
        SquarePerStress = 8 * area * area / density;
        LaminarFlow = FlowAt(FrictionFactor.LaminarLimit);
        TurbulentFlow = FlowAt(FrictionFactor.TurbulentLimit);
        laminarAlpha = Math.Min(2, 3 * (3 * n + 1) * (3 * n + 1) / ((2 * n + 1) * (5 * n + 3)));
        alphaExponent = -Math.Log(laminarAlpha) / Math.Log(TurbulentFlow / LaminarFlow);
    }

    /// <summary>The bore, m.</summary>
    public double Bore { get; }

    /// <summary>f·q² of a wall stress of 1 Pa, m⁶/(s²·Pa).</summary>
    public double SquarePerStress { get; }

    /// <summary>f·q² of the yield stress, m⁶/s²: what a run uses up at the point of moving.</summary>
    public double YieldSquare => SquarePerStress * yield;

    /// <summary>Flow of one line at Re 2000, m³/s.</summary>
    public double LaminarFlow { get; }

    /// <summary>Flow of one line at Re 4000, m³/s.</summary>
    public double TurbulentFlow { get; }

    /// <summary>Excess s of the wall stress in laminar flow, Pa, and its slope d ln s/d ln q.</summary>
    /// <param name="q">flow of one line, m³/s; greater than 0</param>
    /// <param name="slope">from n to n/(n + 1), 1</param>
    public double Excess(double q, out double slope)
    {
        double target = Math.Log(q) - logScale;
        double u = n * (target + Math.Log(3 * n + 1));
        slope = n;
        for (int turn = 0; yield > 0 && turn < MostTurns; turn++)
        {
            double step = (target - LogFlow(u, out double rise)) / rise;
            slope = 1 / rise;
            u += step;
            if (Math.Abs(step) < LastStep)
                break;
        }

        return Math.Exp(u);
    }

    /// <summary>The Reynolds number 8·ρ·V²/τ_w, 1.</summary>
    /// <param name="q">flow of one line, m³/s; at least 0</param>
    public double Reynolds(double q) =>
        q == 0 ? 0 : FrictionFactor.LaminarProduct * q * q / (SquarePerStress * (yield + Excess(q, out _)));

    /// <summary>α, 1, and its slope dα/d ln q.</summary>
    /// <param name="q">flow of one line, m³/s; at least 0</param>
    /// <param name="slope">at most 0, 1</param>
    public double KineticFactor(double q, out double slope)
    {
        slope = 0;
        if (q <= LaminarFlow)
            return laminarAlpha;
        if (q >= TurbulentFlow)
            return 1;
        double alpha = laminarAlpha * Math.Pow(q / LaminarFlow, alphaExponent);
        slope = alphaExponent * alpha;
        return alpha;
    }

    /// <summary>Flow of one line at a Reynolds number, m³/s.</summary>
    private double FlowAt(double re)
    {
        double target = Math.Log(re * SquarePerStress / FrictionFactor.LaminarProduct), u = Math.Log(Math.Max(yield, 1e-3));
        for (int turn = 0; turn < MostTurns; turn++)
        {
            double logFlow = LogFlow(u, out double rise), s = Math.Exp(u);
            double step = (target + Math.Log(yield + s) - 2 * (logFlow + logScale)) / (2 * rise - s / (yield + s));
            u += step;
            if (Math.Abs(step) < LastStep)
                break;
        }

        return Math.Exp(LogFlow(u, out _) + logScale);
    }

    /// <summary>ln q less its scale at u = ln s, and its slope d ln q/du.</summary>
    private double LogFlow(double u, out double rise)
    {
        double s = Math.Exp(u), wall = yield + s;
        double square = s * s / (3 * n + 1), cross = 2 * yield * s / (2 * n + 1), plug = yield * yield / (n + 1);
        double sum = square + cross + plug;
        rise = 1 + 1 / n + (2 * square + cross) / sum - 3 * s / wall;
        return (1 + 1 / n) * u + Math.Log(sum) - 3 * Math.Log(wall);
    }
}
