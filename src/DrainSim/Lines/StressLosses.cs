using DrainSim.Liquids;

namespace DrainSim.Lines;

/// <summary>Head used up along one line by a liquid that is not Newtonian, and the flow for a head.</summary>
/// <remarks><code>
/// used(k) = Σ 4·τ_y·L/(ρ·g·D) + Σ excess friction + Σ (K∞ + K1/Re)·v²/2g + α·v²/2g
/// </code>
/// The first sum is the yield head: no flow before the head exceeds it. The rest rises strictly with the flow. K1/Re of
/// fittings and valves takes the Reynolds number of 64/Re friction, less its value at rest, so that a fitting has no yield
/// head of its own: common practice, no source. The flow is found by Newton's method on the logarithms of flow and head
/// above the yield head, where every regime is near a straight line, within a bracket from 0 to the flow whose velocity
/// head and constant losses alone would use the head up.
/// </remarks>
internal sealed class StressLosses
{
    /// <summary>Head above the yield head below which nothing is taken to flow, m.</summary>
    private const double LeastHead = 1e-100;

    /// <summary>Step in ln q whose square is under the last bit: within one regime no other is needed.</summary>
    private const double LastStep = 1e-8;

    /// <summary>Step in ln q that is rounding: at a kink, where the slope may be of the wrong side, it has to come down to this.</summary>
    private const double LastBits = 1e-14;

    /// <summary>Turns that bisection alone would need, with room.</summary>
    private const int MostTurns = 400;

    private readonly double[] kinks;

    /// <summary>Lays a compiled line out for a flow curve.</summary>
    /// <param name="line">the compiled line</param>
    /// <param name="curve">the liquid's flow curve</param>
    /// <param name="density">its density, kg/m³</param>
    public StressLosses(LineCompiler line, FlowCurve curve, double density)
    {
        SlopeAtRest = curve is { YieldStress: 0, FlowIndex: > 1 } ? 0 : double.PositiveInfinity;
        LineNode[] nodes = line.Nodes;
        double[] bores = [.. nodes.Select(node => node.Bore).Distinct()];
        Bores = Array.ConvertAll(bores, bore => new BoreStress(curve, density, bore));
        Walls = [.. line.WallRoughness.Select(wall => new StressWall(
            curve, density, Bores[Array.IndexOf(bores, wall.Bore)], wall.Roughness / wall.Bore))];
        Steps = new StressStep[nodes.Length];
        double square = 0, yield = 0;
        for (int i = 0; i < Steps.Length; i++)
        {
            LossStep step = line.Steps[i];
            int bore = Array.IndexOf(bores, nodes[i].Bore);
            square += step.Square;
            yield += step.Wall >= 0 ? step.Pipe * Bores[bore].YieldSquare : 0;
            Steps[i] = new StressStep
            {
                Wall = step.Wall,
                Bore = bore,
                Pipe = step.Pipe,
                Square = step.Square,
                Laminar = step.Linear * step.ReynoldsPerFlow,
                Jet = step.Jet,
                SquareToHere = square,
                YieldToHere = yield,
            };
        }

        RegimeFlows = [.. Walls.Select(wall => wall.TurbulentFlow)
            .Concat(line.RegimeBores.Distinct().Select(bore => Bores[Array.IndexOf(bores, bore)].LaminarFlow))
            .Concat(line.WallRoughness.Any(wall => wall.Bore == nodes[^1].Bore) ? [] : [Bores[Steps[^1].Bore].TurbulentFlow])
            .Distinct().Order()];
        kinks = [.. RegimeFlows.Concat(Bores.SelectMany(bore => (double[])[bore.LaminarFlow, bore.TurbulentFlow])).Distinct().Order()];
    }

    /// <summary>One entry per distinct bore.</summary>
    public BoreStress[] Bores { get; }

    /// <summary>One entry per distinct bore and roughness of a run.</summary>
    public StressWall[] Walls { get; }

    /// <summary>What lies between the node before and each node.</summary>
    public StressStep[] Steps { get; }

    /// <summary>Flows of one line at which a run or the outlet passes a regime limit, rising, m³/s.</summary>
    public double[] RegimeFlows { get; }

    /// <summary>dH/dq at the point of moving, s/m²: infinite but for a liquid that thickens under shear from no stress on.</summary>
    public double SlopeAtRest { get; }

    /// <summary>Number of nodes.</summary>
    public int Count => Steps.Length;

    /// <summary>Head that the yield stress holds over the whole line, m.</summary>
    public double YieldHead => Steps[^1].YieldToHere;

    /// <summary>Head used up to a node, m.</summary>
    /// <param name="node">node</param>
    /// <param name="q">flow of one line, m³/s; at least 0</param>
    /// <param name="rise">q times the derivative by q, m</param>
    public double Used(int node, double q, out double rise) => Excess(node, q, out rise) + Steps[node].YieldToHere;

    /// <summary>Reynolds number in a node's bore, 1.</summary>
    /// <param name="node">node</param>
    /// <param name="q">flow of one line, m³/s; at least 0</param>
    public double Reynolds(int node, double q) => Bores[Steps[node].Bore].Reynolds(q);

    /// <summary>The flow of one line that uses up a head on the way to a node, m³/s; 0 up to the yield head.</summary>
    /// <param name="node">node</param>
    /// <param name="head">head, m</param>
    /// <param name="guess">a flow of one line nearby, m³/s; 0 when none is known</param>
    /// <param name="slope">dq/dH, m²/s; 0 where nothing flows</param>
    public double Flow(int node, double head, double guess, out double slope)
    {
        slope = 0;
        double wanted = head - Steps[node].YieldToHere;
        if (!(wanted > LeastHead))
            return 0;
        double low = 0, high = Math.Sqrt(wanted / (Steps[node].SquareToHere + Steps[node].Jet)) * (1 + 1e-9);
        double q = guess > 0 && guess < high ? guess : high, moved = double.NaN;
        for (int turn = 0; turn < MostTurns; turn++)
        {
            double excess = Excess(node, q, out double rise);
            slope = q / rise;
            if (excess > wanted)
                high = q;
            else
                low = q;
            double step = Math.Log(wanted / excess) * excess / rise;
            double next = q * Math.Exp(step);
            bool isInside = next >= low && next <= high;
            if (Math.Abs(step) < (SameRegime(q, next) ? LastStep : LastBits))
                return next;
            if (high - low <= 4e-16 * high)
                return q;
            // Across a kink two points may throw each other back and forth: a step that has not halved is replaced too.
            bool isKept = isInside && next != q && !(Math.Abs(step) > 0.5 * Math.Abs(moved));
            moved = isKept ? step : double.NaN;
            if (!isKept)
                next = low > 0 ? Math.Sqrt(low) * Math.Sqrt(high) : 1e-3 * high;
            q = next;
        }

        return q;
    }

    private double Excess(int node, double q, out double rise)
    {
        var walk = new StressWalk(this, q);
        while (walk.Node < node)
            walk.MoveNext();
        rise = walk.ExcessRise;
        return walk.Excess;
    }

    private bool SameRegime(double one, double other)
    {
        foreach (double kink in kinks)
        {
            if (one < kink != other < kink)
                return false;
        }

        return true;
    }
}
