namespace DrainSim.Vessels;

/// <summary>A torispherical head as the bottom of an upright shell.</summary>
/// <remarks><code>
/// crown,   h ≤ x_k:  V = π·h²·(3C − h)/3,   A = π·h·(2C − h)
/// knuckle, h > x_k:  V = V(x_k) + π·[G(u_k) − G(d − h)],   A = π·(c + √(k² − u²))²,   u = d − h
/// G(u) = (c² + k²)·u − u³/3 + c·[u·√(k² − u²) + k²·arcsin(u/k)]
///
/// c     radius of the knuckle's centre circle R − k, m
/// u_k   height of the knuckle k·cos α, m
/// </code>
/// The volume of revolution of the two arcs; other letters as in <see cref="DishProfile"/>.
/// </remarks>
internal sealed class StandingTorisphere : StandingHead
{
    private readonly double crown;
    private readonly double knuckle;
    private readonly double centreCircle;
    private readonly double knuckleHeight;
    private readonly double crownVolume;
    private readonly double sphereVolume;
    private readonly double profileAtCrown;

    public StandingTorisphere(DishProfile dish)
        : base(dish.Depth, VolumeOf(dish))
    {
        crown = dish.Crown;
        knuckle = dish.Knuckle;
        centreCircle = dish.Shell - dish.Knuckle;
        knuckleHeight = dish.KnuckleRise > 0 ? dish.KnuckleHeight : dish.Depth;
        crownVolume = CrownVolume(dish);
        sphereVolume = 4.0 / 3 * Math.PI * crown * crown * crown;
        profileAtCrown = KnuckleIntegral(dish.KnuckleRise, centreCircle, knuckle);
    }

    public override double? Kink => knuckleHeight < Depth ? knuckleHeight : null;

    public override double Volume(double h) =>
        h <= knuckleHeight
            ? Math.PI / 3 * h * h * (3 * crown - h)
            : crownVolume + Math.PI * (profileAtCrown - KnuckleIntegral(Depth - h, centreCircle, knuckle));

    public override double Area(double h)
    {
        if (h <= knuckleHeight)
            return Math.PI * h * (2 * crown - h);
        double u = Depth - h;
        double r = centreCircle + Math.Sqrt(Math.Max((knuckle - u) * (knuckle + u), 0));
        return Math.PI * r * r;
    }

    public override double Level(double volume)
    {
        if (volume <= 0)
            return 0;
        if (volume <= crownVolume)
            return Math.Min(2 * crown * SphericalCap.HeightShare(volume / sphereVolume), knuckleHeight);
        double start = knuckleHeight + (Depth - knuckleHeight) * (volume - crownVolume) / (Capacity - crownVolume);
        return RisingCurve.Find(new Curve(this), volume, start, Depth);
    }

    private static double VolumeOf(DishProfile dish) =>
        CrownVolume(dish) + Math.PI * KnuckleIntegral(dish.KnuckleRise, dish.Shell - dish.Knuckle, dish.Knuckle);

    private static double CrownVolume(DishProfile dish) =>
        Math.PI / 3 * dish.KnuckleHeight * dish.KnuckleHeight * (3 * dish.Crown - dish.KnuckleHeight);

    private static double KnuckleIntegral(double u, double c, double k) =>
        k == 0
            ? 0
            : (c * c + k * k) * u - u * u * u / 3
                + c * (u * Math.Sqrt(Math.Max((k - u) * (k + u), 0)) + k * k * Math.Asin(Math.Min(u / k, 1)));

    private readonly struct Curve(StandingTorisphere head) : IRisingCurve
    {
        public (double Value, double Slope) At(double x) => (head.Volume(x), head.Area(x));
    }
}
