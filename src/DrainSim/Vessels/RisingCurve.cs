namespace DrainSim.Vessels;

/// <summary>A rising function that is 0 at 0, with its slope.</summary>
internal interface IRisingCurve
{
    /// <summary>The value and the slope at x &gt; 0.</summary>
    (double Value, double Slope) At(double x);
}

/// <summary>Where a rising curve reaches a value.</summary>
/// <remarks><code>
/// x ← x · (target/V)^(1/p),   p = x·V'/V
///
/// p   local exponent of the curve, 1
/// </code>
/// Newton's method on log V against log x: exact in one step on a power law, so the tip of a cone or the
/// bottom of a lying cylinder (V ~ x³) costs no more than the middle. A step out of the bracket is
/// replaced by its midpoint.
/// </remarks>
internal static class RisingCurve
{
    // The error after a step is of the order of the step's square, hence below 1e-17 of x.
    private const double LastLogStep = 3e-9;
    private const int MostTurns = 100;

    /// <summary>The x in (0, most] at which the curve takes the value, to the last bits.</summary>
    public static double Find<T>(in T curve, double value, double start, double most)
        where T : struct, IRisingCurve
    {
        double low = 0, high = most;
        double x = start > 0 && start <= most ? start : most;
        for (int turn = 0; turn < MostTurns; turn++)
        {
            (double v, double slope) = curve.At(x);
            double logStep = Math.Log(value / v) * v / (x * slope);
            double next = x * Math.Exp(logStep);
            if (Math.Abs(logStep) <= LastLogStep)
                return Math.Min(next, most);
            if (v < value)
                low = x;
            else
                high = x;
            x = next > low && next < high ? next : low + (high - low) / 2;
        }
        return x;
    }
}
