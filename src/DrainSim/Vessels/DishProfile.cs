namespace DrainSim.Vessels;

/// <summary>The measures of a torispherical head on a shell of one radius.</summary>
/// <remarks><code>
/// sin α = (R − k)/(C − k)            α   angle of the crown's edge from the axis, rad
/// d = C − √[(C − k)² − (R − k)²]     d   depth, m
/// x_k = C·(1 − cos α)                x_k height of the knuckle circle above the apex, m
/// ρ_k = C·sin α                      ρ_k radius of the knuckle circle, m
/// e = C·cos α                        e   from the centre of the crown to the plane of the knuckle circle, m
///
/// R, C, k   radius of the shell, the crown and the knuckle, m
/// </code>
/// Differences of near-equal lengths are rearranged into sums.
/// </remarks>
internal sealed class DishProfile
{
    /// <summary>Works the measures out; the caller has checked 0 ≤ k &lt; R ≤ C.</summary>
    public DishProfile(double shell, double crown, double knuckle)
    {
        Shell = shell;
        Crown = crown;
        Knuckle = knuckle;
        double sine = (shell - knuckle) / (crown - knuckle);
        double offset = Math.Sqrt((crown - shell) * (crown + shell - 2 * knuckle));
        double cosine = offset / (crown - knuckle);
        Depth = (shell * shell + 2 * knuckle * (crown - shell)) / (crown + offset);
        KnuckleHeight = crown * sine * sine / (1 + cosine);
        KnuckleCircle = crown * sine;
        CentreDistance = crown * cosine;
        KnuckleRise = knuckle * cosine;
        KnuckleWidth = knuckle * cosine * cosine / (1 + sine);
    }

    /// <summary>R, m.</summary>
    public double Shell { get; }

    /// <summary>C, m.</summary>
    public double Crown { get; }

    /// <summary>k, m.</summary>
    public double Knuckle { get; }

    /// <summary>d, m.</summary>
    public double Depth { get; }

    /// <summary>x_k, m.</summary>
    public double KnuckleHeight { get; }

    /// <summary>ρ_k, m.</summary>
    public double KnuckleCircle { get; }

    /// <summary>e, m.</summary>
    public double CentreDistance { get; }

    /// <summary>From the knuckle circle to the tangent line, k·cos α, m.</summary>
    public double KnuckleRise { get; }

    /// <summary>From the knuckle circle to the shell, R − ρ_k = k·(1 − sin α), m.</summary>
    public double KnuckleWidth { get; }
}
