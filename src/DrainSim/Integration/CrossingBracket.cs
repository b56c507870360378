namespace DrainSim.Integration;

/// <summary>Narrows an interval over which a function changes sign to two neighbouring doubles, or to 2^−64 of itself
/// where the root is so near to zero that doubles lie closer: the ITP method (interpolate, truncate, project).</summary>
/// <remarks>
/// The caller evaluates the function, so nothing is captured or allocated: ask <see cref="TryNext"/> for a
/// point, hand its value to <see cref="Narrow"/>, until there is none. It needs at most one evaluation more than
/// bisection, whatever the function, and about a dozen where it is smooth. The end is the width of the
/// bracket, never the size of a value, so values of any scale are located alike; that and the strict bound
/// are why this is not MathNet's Brent, whose limit is on the value too and whose argument is a delegate.
/// Source: I. F. D. Oliveira, R. H. C. Takahashi, ACM Trans. Math. Softw. 47 (2021) article 5,
/// doi:10.1145/3423597, with κ1 = 0.2/(b − a), κ2 = 2, n0 = 1.
/// </remarks>
internal struct CrossingBracket
{
    private const double TruncationShare = 0.2;
    private const int MostHalvings = 64;

    private readonly double resolution;
    private readonly double truncation;
    private readonly double leastWidth;
    private readonly bool isRising;
    private double radius;
    private double near;
    private double nearValue;
    private double farValue;

    /// <summary>A bracket.</summary>
    /// <param name="near">its lower end</param>
    /// <param name="nearValue">value there; of the opposite sign to the far one, or NaN where it is not known</param>
    /// <param name="far">its upper end</param>
    /// <param name="farValue">value there; not NaN</param>
    /// <param name="isRising">whether the far side is above zero; zero itself counts as the far side</param>
    public CrossingBracket(double near, double nearValue, double far, double farValue, bool isRising)
    {
        (this.near, this.nearValue, Far, this.farValue, this.isRising) = (near, nearValue, far, farValue, isRising);
        double largest = Math.Max(Math.Abs(near), Math.Abs(far));
        resolution = Math.BitIncrement(largest) - largest;
        double width = far - near;
        truncation = TruncationShare / width;
        leastWidth = Math.ScaleB(width, -MostHalvings);
        int bisections = (int)Math.Ceiling(Math.Log2(Math.Max(width / resolution, 1)));
        radius = resolution * Math.ScaleB(1, bisections);   // half a bracket of n0 = 1 bisection more
    }

    /// <summary>The upper end: the function has changed its sign there, or is zero.</summary>
    public double Far { get; private set; }

    /// <summary>The next point to evaluate at; false when the ends are close enough.</summary>
    public bool TryNext(out double x)
    {
        double width = Far - near;
        double middle = near + width / 2;
        x = middle;
        if (width <= leastWidth || !(middle > near && middle < Far))
            return false;
        double interpolated = near + width * (nearValue / (nearValue - farValue));
        if (double.IsFinite(interpolated))
            x = Projected(interpolated, middle, width);
        radius /= 2;
        if (!(x > near && x < Far))
            x = middle;
        return true;
    }

    /// <summary>Takes the value at the point asked for; NaN counts as the near side.</summary>
    public void Narrow(double x, double value)
    {
        if (isRising ? value >= 0 : value <= 0)
            (Far, farValue) = (x, value);
        else
            (near, nearValue) = (x, value);
    }

    private readonly double Projected(double interpolated, double middle, double width)
    {
        double side = Math.Sign(middle - interpolated);
        double step = Math.Max(truncation * width * width, resolution);
        double truncated = step <= Math.Abs(middle - interpolated) ? interpolated + side * step : middle;
        double reach = Math.Max(radius - width / 2, 0);
        return Math.Abs(truncated - middle) <= reach ? truncated : middle - side * reach;
    }
}
