namespace DrainSim.Lines;

/// <summary>Finds the flow of one line that uses up a head on the way to a node.</summary>
/// <remarks>
/// Newton's method on y = ln(used) over u = ln q, where every term is a straight line of slope 1 to 3.4 in its
/// regime, so that few turns are needed from anywhere. From the second turn on, the curvature of the cubic through
/// the last two points and their slopes is added:
/// <code>
/// step = m1·t + (2·m1 + m0 − 3·Δu/h)·t²/h        m = du/dy,  t = ln(head/used),  h = y1 − y0
/// </code>
/// Around it stands a bracket from two quadratics that bound the loss from below (f at least 64/Re, and at least
/// its least value; α at least 1) and from above (f at most 64/Re + f(4000); α at most 2). A step that leaves the
/// bracket is replaced by its geometric middle. Within one regime the error left by a step is below (t0·t1)², t at
/// the two points, without a second point below t²: where that is under the last bit the loss is not evaluated again.
/// Where the loss rises less than in proportion (a jet just below Re 4000) its curvature is great, and more is asked.
/// </remarks>
internal static class FlowSearch
{
    /// <summary>Root of some last bits of a double; a 24th of its square, the cubic's error, is less than one.</summary>
    private const double LastBitRoot = 5e-8;

    /// <summary>Widest pair of points, in ln(used), whose cubic is trusted.</summary>
    private const double WidestPair = 0.5;

    /// <summary>Head below which nothing is taken to flow, m.</summary>
    private const double LeastHead = 1e-100;

    /// <summary>Turns that bisection alone would need, with room.</summary>
    private const int MostTurns = 200;

    /// <summary>The flow of one line, m³/s; 0 for no head.</summary>
    /// <param name="losses">the line</param>
    /// <param name="node">node up to which the head is used</param>
    /// <param name="head">head, m</param>
    /// <param name="guess">a flow of one line nearby, m³/s; 0 when none is known</param>
    /// <param name="slope">dq/dH, m²/s; 0 where nothing flows</param>
    public static double Flow(LineLosses losses, int node, double head, double guess, out double slope)
    {
        slope = 0;
        if (!(head > LeastHead))
            return 0;
        (double low, double high) = Bracket(losses.Steps[node], head);
        double q = guess > low && guess < high ? guess : Math.Sqrt(low * high);
        double moved = double.NaN, before = 0, beforeInverse = 0, beforeT = 0;
        for (int turn = 0; turn < MostTurns; turn++)
        {
            double used = losses.Used(node, q, out double rise);
            slope = q / rise;
            if (used > head)
                high = q;
            else
                low = q;
            double inverse = used / rise;
            double t = LogRatio(head, used);
            double step = inverse * t;
            double h = beforeT - t;
            bool paired = double.IsFinite(moved) && Math.Abs(beforeT) < WidestPair && h != 0
                && SameRegime(losses.Kinks, before, q);
            if (paired)
                step += (2 * inverse + beforeInverse - 3 * moved / h) * t * t / h;
            double next = q * Exp(step);
            bool inside = next >= low && next <= high;
            double left = Math.Abs(paired ? t * beforeT : t);
            double small = inverse > 1 ? LastBitRoot * LastBitRoot : LastBitRoot;
            if (inside && left < small && SameRegime(losses.Kinks, q, next))
                return next;
            if (high - low <= 4e-16 * high)
                return q;
            // Across a kink two points may throw each other back and forth: a step that has not halved is replaced too.
            bool stalls = turn > 2 && Math.Abs(step) > 0.5 * Math.Abs(moved);
            (moved, before, beforeInverse, beforeT) = (step, q, inverse, t);
            if (!inside || next == q || stalls)
                (moved, next) = (double.NaN, Math.Sqrt(low * high));
            q = next;
        }
        return q;
    }

    /// <summary>Flows between which the answer lies, loosened by more than the rounding of the bounds.</summary>
    private static (double Low, double High) Bracket(in LossStep to, double head)
    {
        double laminar = to.LinearToHere + to.LaminarToHere;
        double least = to.SquareToHere + to.Jet;
        double most = to.SquareToHere + 2 * to.Jet + to.LargestToHere;
        double low = Root(most, laminar, head);
        double high = Math.Min(Root(least, laminar, head), Root(least + to.LeastToHere, to.LinearToHere, head));
        return (low * (1 - 1e-9), high * (1 + 1e-9));
    }

    /// <summary>The positive root of a·q² + b·q = head, in the form that does not cancel.</summary>
    private static double Root(double a, double b, double head) =>
        2 * head / (b + Math.Sqrt(b * b + 4 * a * head));

    /// <summary>ln(head/used), by its series near 1, where the logarithm would lose digits.</summary>
    private static double LogRatio(double head, double used)
    {
        double e = (head - used) / used;
        return Math.Abs(e) < 0.01 ? e * (1 - e * (0.5 - e * (1.0 / 3 - e * 0.25))) : Math.Log(head / used);
    }

    /// <summary>e^x, by its series for the short steps of the last turns.</summary>
    private static double Exp(double x) =>
        Math.Abs(x) < 0.01 ? 1 + x * (1 + x * (0.5 + x * (1.0 / 6 + x / 24))) : Math.Exp(x);

    private static bool SameRegime(double[] kinks, double one, double other)
    {
        foreach (double kink in kinks)
        {
            if (one < kink != other < kink)
                return false;
        }
        return true;
    }
}
