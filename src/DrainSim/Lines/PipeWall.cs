namespace DrainSim.Lines;

/// <summary>The friction law of <see cref="FrictionFactor"/> for one wall, with what it needs worked out once.</summary>
/// <remarks><code>
/// x = 1/√f:  F(x) = x + c·ln(w) = 0,  w = a + b·x,  a = k/3.7,  b = 2.51/Re,  c = 2/ln 10
/// start (Haaland):  x = −1.8·log10( (k/3.7)^1.11 + 6.9/Re )
/// first (Halley):   x ← x − 2·F·F'/(2·F'² − F·F''),  F' = 1 + c·b/w,  F'' = −c·b²/w², both multiplied by w²
/// then (Newton):    x ← x − F/F'
/// slope:            d ln f/d ln Re = −2·c·b/(w + c·b)
/// </code>
/// The start is within 1 % of x; the first turn cubes the error and the second squares what is left, to the last
/// bits. The second logarithm is the first one and a short series, and divisions are few: this is the inner loop.
/// Source of the start: S. E. Haaland, J. Fluids Eng. 105 (1983) 89–90, doi:10.1115/1.3240948.
/// </remarks>
internal readonly struct PipeWall
{
    private const double C = 2 / 2.302585092994045684;
    private const double HaalandScale = -1.8 / 2.302585092994045684;
    private const double LaminarEnd = FrictionFactor.LaminarProduct / FrictionFactor.LaminarLimit;

    private readonly double a;
    private readonly double haaland;
    private readonly double bridgeSlope;

    /// <summary>Works out what the law needs.</summary>
    /// <param name="relativeRoughness">roughness over bore, 1; at least 0, less than 1</param>
    /// <param name="reynoldsPerFlow">Reynolds number per flow of one line, s/m³</param>
    public PipeWall(double relativeRoughness, double reynoldsPerFlow)
    {
        a = relativeRoughness / 3.7;
        haaland = Math.Pow(a, 1.11);
        ReynoldsPerFlow = reynoldsPerFlow;
        LargestTurbulent = Turbulent(FrictionFactor.TurbulentLimit, out _);
        bridgeSlope = (LargestTurbulent - LaminarEnd) / (FrictionFactor.TurbulentLimit - FrictionFactor.LaminarLimit);
        Least = Math.Min(FrictionFactor.FullyRough(relativeRoughness), LaminarEnd);
    }

    /// <summary>Reynolds number per flow of one line, s/m³.</summary>
    public double ReynoldsPerFlow { get; }

    /// <summary>The factor at Re 4000, the largest beyond the laminar limit, 1.</summary>
    public double LargestTurbulent { get; }

    /// <summary>
    /// What the factor never falls below, 1: its limit at infinite Re or, on a very rough wall, the end of laminar flow.
    /// </summary>
    public double Least { get; }

    /// <summary>The Darcy friction factor, 1, and its slope d ln f/d ln Re.</summary>
    public double Factor(double re, out double slope)
    {
        if (re >= FrictionFactor.TurbulentLimit)
            return Turbulent(re, out slope);
        if (re <= FrictionFactor.LaminarLimit)
        {
            slope = -1;
            return FrictionFactor.LaminarProduct / re;
        }
        double f = LaminarEnd + bridgeSlope * (re - FrictionFactor.LaminarLimit);
        slope = bridgeSlope * re / f;
        return f;
    }

    /// <summary>The Colebrook–White factor, 1, and its slope d ln f/d ln Re.</summary>
    public double Turbulent(double re, out double slope)
    {
        double inverse = 1 / re;
        double b = 2.51 * inverse;
        double cb = C * b;
        double start = HaalandScale * Math.Log(haaland + 6.9 * inverse);
        double w = a + b * start;
        double log = Math.Log(w);
        double residual = start + C * log;
        double first = w + cb;
        double move = 2 * residual * first * w / (2 * first * first + residual * cb * b);
        double x = start - move;
        log += LogOnePlus(-move * (b / w));
        w = a + b * x;
        double r = 1 / (w + cb);
        x -= (x + C * log) * w * r;
        slope = -2 * cb * r;
        return 1 / (x * x);
    }

    /// <summary>ln(1 + d), by its series where d is as small as the start's error makes it.</summary>
    private static double LogOnePlus(double d)
    {
        if (Math.Abs(d) > 0.01)
            return Math.Log(1 + d);
        double square = d * d;
        double tail = 1.0 / 3 - d * 0.25 + square * (1.0 / 5 - d * (1.0 / 6) + square * (1.0 / 7));
        return d - 0.5 * square + square * d * tail;
    }
}
