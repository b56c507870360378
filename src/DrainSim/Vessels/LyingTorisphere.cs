using MathNet.Numerics.Integration;

namespace DrainSim.Vessels;

/// <summary>A torispherical head at the end of a lying shell, fitted once to working precision.</summary>
/// <remarks><code>
/// A = 2·∫ z dx over 0 ≤ x ≤ w,   w² = R² − y²,   y = R − h,   ρ² = x² + y²
/// z = √(C² − ρ²) − (C − d)     on the crown, ρ ≤ ρ_k
/// z = √(k² − (ρ − c)²)         on the knuckle, ρ > ρ_k;   c = R − k
/// V = ∫ A dh
///
/// x   across, from the vertical plane of the axis, m
/// y   below the axis, m
/// z   along the axis, outwards from the tangent plane, m
/// </code>
/// The area has a singularity of power 5/2 where the surface first touches the crown, at y = ρ_k. So it is
/// fitted in two zones: below in h, above in t with y = ρ_k·cos t, in which it is smooth. The crown's part
/// of A is in closed form, the knuckle's by Gauss–Legendre after x = w − (w − x_k)·s², which removes the
/// root at the wall. Other letters as in <see cref="DishProfile"/>.
/// </remarks>
internal sealed class LyingTorisphere : LyingHead
{
    private const double SeriesEnds = 0.25;
    private static readonly GaussLegendreRule Gauss = new(0, 1, 32);

    private readonly DishProfile dish;
    private readonly double crownLevel;
    private readonly FittedVolume? belowCrown;
    private readonly FittedVolume acrossCrown;

    public LyingTorisphere(DishProfile dish)
    {
        this.dish = dish;
        crownLevel = dish.KnuckleWidth;
        bool hasKnuckle = crownLevel > 0;
        if (hasKnuckle)
        {
            FittedQuantity below = new(KnuckleAreaPerHeight, _ => 1, AreaPower: 1, RisePower: 0);
            belowCrown = new FittedVolume(crownLevel, startVolume: 0, below);
        }
        FittedQuantity across = hasKnuckle
            ? new FittedQuantity(AreaAtAngle, t => dish.KnuckleCircle * Math.Sin(t), AreaPower: 0, RisePower: 0)
            : new FittedQuantity(CapAreaPerCube, t => dish.Shell * Math.Sin(t) / t, AreaPower: 3, RisePower: 1);
        acrossCrown = new FittedVolume(Math.PI / 2, belowCrown?.Volume(crownLevel) ?? 0, across);
    }

    public override double? Kink => crownLevel > 0 ? crownLevel : null;

    public override double Volume(double h, double phi) =>
        belowCrown is not null && h <= crownLevel ? belowCrown.Volume(h) : acrossCrown.Volume(AngleAt(h));

    public override double Area(double h) =>
        belowCrown is not null && h <= crownLevel ? belowCrown.Area(h) : acrossCrown.Area(AngleAt(h));

    private double AngleAt(double h)
    {
        double share = (h - crownLevel) / (2 * (dish.Shell - crownLevel));
        return 2 * Math.Asin(Math.Sqrt(Math.Min(share, 0.5)));
    }

    private double KnuckleAreaPerHeight(double h) => KnuckleArea(h, halfCrown: 0) / h;

    private double AreaAtAngle(double t)
    {
        double half = Math.Sin(t / 2);
        double h = crownLevel + 2 * dish.KnuckleCircle * half * half;
        double halfCrown = dish.KnuckleCircle * Math.Sin(t);
        return CrownArea(halfCrown) + KnuckleArea(h, halfCrown);
    }

    private double CapAreaPerCube(double t) => CrownArea(dish.Shell * Math.Sin(t)) / (t * t * t);

    // 2·∫ [√(B² − x²) − (C − d)] dx up to x_k, with B² = e² + x_k² and e = (C − d) + the knuckle's rise.
    private double CrownArea(double halfCrown)
    {
        double e = dish.CentreDistance;
        double r = halfCrown / e;
        double cap = r < SeriesEnds
            ? e * e * ChordSeries.Sum(r, -r * r)
            : (e * e + halfCrown * halfCrown) * Math.Atan2(halfCrown, e) - e * halfCrown;
        return 2 * dish.KnuckleRise * halfCrown + cap;
    }

    // R − ρ = (w − x)·(w + x)/(R + ρ), without cancellation in a thin knuckle; likewise w − x_k.
    private double KnuckleArea(double h, double halfCrown)
    {
        double y = dish.Shell - h;
        double w = Math.Sqrt(h * (2 * dish.Shell - h));
        double span = halfCrown > 0 ? dish.KnuckleWidth * (dish.Shell + dish.KnuckleCircle) / (w + halfCrown) : w;
        double sum = 0;
        for (int i = 0; i < Gauss.Order; i++)
        {
            double s = Gauss.GetAbscissa(i);
            double x = w - span * s * s;
            double rho = Math.Sqrt(x * x + y * y);
            double gap = span * s * s * (w + x) / (dish.Shell + rho);
            sum += Gauss.GetWeight(i) * s * s * Math.Sqrt((w + x) * (2 * dish.Knuckle - gap) / (dish.Shell + rho));
        }
        return 4 * span * Math.Sqrt(span) * sum;
    }
}
