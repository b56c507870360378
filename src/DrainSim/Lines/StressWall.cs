using DrainSim.Liquids;

namespace DrainSim.Lines;

/// <summary>Friction of a liquid that is not Newtonian, in all regimes, for one bore and roughness.</summary>
/// <remarks><code>
/// Re ≤ 2000       f = 64/Re                                         exact, see BoreStress
/// between         ln(f·q²) a straight line in ln q                   bridge, ours
/// Re ≥ 4000       Dodge–Metzner for K and n                          the yield stress is not in it
///
/// Re  8·ρ·V²/τ_w of laminar flow, 1
/// </code>
/// f·q² rises strictly with q. Turbulent stress dwarfs the yield stress: a Bingham liquid then follows the Newtonian law
/// for its plastic viscosity (B. O. A. Hedström, Ind. Eng. Chem. 44 (1952) 651–656, from memory), and that a
/// Herschel–Bulkley liquid likewise follows the power law for its K and n is a rule of ours. Where the turbulent law lies
/// below the laminar one at Re 4000 (a flow index below some 0.3, or a very high yield stress) the bridge ends where they
/// cross. The change at Re 2000 is within a third of Hanks's for Bingham liquids up to He 1e6 (R. W. Hanks, AIChE J. 9
/// (1963) 306–309, from memory).
/// </remarks>
internal sealed class StressWall
{
    private const double CrossingStep = 1.02;
    private const int MostSteps = 2000;

    private readonly BoreStress bore;
    private readonly double n;
    private readonly double roughness;
    private readonly double reynoldsAtOne;
    private readonly double bridgeStart;
    private readonly double bridgeExponent;

    /// <param name="curve">the liquid's flow curve</param>
    /// <param name="density">its density, kg/m³</param>
    /// <param name="bore">its laminar flow in the bore</param>
    /// <param name="relativeRoughness">roughness over bore, 1</param>
    public StressWall(FlowCurve curve, double density, BoreStress bore, double relativeRoughness)
    {
        (this.bore, roughness, n) = (bore, relativeRoughness, curve.FlowIndex);
        reynoldsAtOne = MetznerReed.Reynolds(curve, density, 1 / (Math.PI / 4 * bore.Bore * bore.Bore), bore.Bore);
        TurbulentFlow = FlowThatIsTurbulent();
        double q = bore.LaminarFlow;
        bridgeStart = LaminarSquare(q);
        bridgeExponent = Math.Log(TurbulentSquare(TurbulentFlow, out _) / bridgeStart) / Math.Log(TurbulentFlow / q);
    }

    /// <summary>Flow of one line from which the turbulent law holds, m³/s.</summary>
    public double TurbulentFlow { get; }

    /// <summary>f·q² above that of the yield stress, m⁶/s², and its slope by ln q.</summary>
    /// <param name="q">flow of one line, m³/s; greater than 0</param>
    /// <param name="rise">q·d(f·q²)/dq, m⁶/s²</param>
    public double Square(double q, out double rise)
    {
        double square;
        if (q <= bore.LaminarFlow)
        {
            square = bore.SquarePerStress * bore.Excess(q, out double slope);
            rise = slope * square;
            return square;
        }
        if (q < TurbulentFlow)
        {
            square = bridgeStart * Math.Pow(q / bore.LaminarFlow, bridgeExponent);
            rise = bridgeExponent * square;
        }
        else
        {
            square = TurbulentSquare(q, out rise);
        }

        return square - bore.YieldSquare;
    }

    private double TurbulentSquare(double q, out double rise)
    {
        double f = DodgeMetzner.FrictionFactor(reynoldsAtOne * Math.Pow(q, 2 - n), n, roughness, out double slope);
        double square = f * q * q;
        rise = (2 + (2 - n) * slope) * square;
        return square;
    }

    private double LaminarSquare(double q) => bore.YieldSquare + bore.SquarePerStress * bore.Excess(q, out _);

    private double FlowThatIsTurbulent()
    {
        double q = bore.TurbulentFlow, below = q;
        for (int i = 0; i < MostSteps && Lies(q); i++)
            (below, q) = (q, q * CrossingStep);
        while (q - below > 1e-14 * q) // ends: the middle of two neighbours is one of them
        {
            double middle = (below + q) / 2;
            if (middle <= below || middle >= q)
                break;
            (below, q) = Lies(middle) ? (middle, q) : (below, middle);
        }

        return q;

        bool Lies(double flow) => TurbulentSquare(flow, out _) < LaminarSquare(flow);
    }
}
