namespace DrainSim.Lines;

/// <summary>Loss coefficients of a change of bore, all on the velocity head in the smaller bore.</summary>
/// <remarks><code>
/// β = smaller/larger bore, θ = included angle of the cone
///
/// sudden expansion    K = (1 − β²)²                               Borda–Carnot
/// sudden contraction  K = 0.5·(1 − β²)                            Weisbach
/// cone, narrowing     K = 0.8·sin(θ/2)·(1 − β²)       θ ≤ 45°     Crane
///                     K = 0.5·(1 − β²)·√sin(θ/2)      θ > 45°
/// cone, widening      K = 2.6·sin(θ/2)·(1 − β²)²      θ ≤ 45°
///                     K = (1 − β²)²                   θ > 45°
/// </code>
/// The pieces meet within 1 % at 45° as printed. Turbulent values, used at every Reynolds number.
/// Source: Crane Technical Paper 410, formulas 1 to 4 of appendix A.
/// </remarks>
public static class BoreChange
{
    /// <summary>Included angle up to which a cone counts as slender, rad.</summary>
    public const double SlenderAngle = Math.PI / 4;

    /// <summary>K of a sudden change, 1; 0 where the bores are equal.</summary>
    /// <param name="from">bore before, m; greater than 0</param>
    /// <param name="to">bore behind, m; greater than 0</param>
    public static double Sudden(double from, double to)
    {
        double blocked = Blocked(from, to);
        return to > from ? blocked * blocked : 0.5 * blocked;
    }

    /// <summary>K of a cone, 1; 0 where the bores are equal.</summary>
    /// <param name="from">bore before, m; greater than 0</param>
    /// <param name="to">bore behind, m; greater than 0</param>
    /// <param name="angle">included angle, rad; greater than 0, at most π</param>
    public static double Cone(double from, double to, double angle)
    {
        double blocked = Blocked(from, to);
        double sine = Math.Sin(angle / 2);
        bool slender = angle <= SlenderAngle;
        if (to > from)
            return (slender ? 2.6 * sine : 1) * blocked * blocked;
        return slender ? 0.8 * sine * blocked : 0.5 * blocked * Math.Sqrt(sine);
    }

    private static double Blocked(double from, double to)
    {
        double beta = Math.Min(from, to) / Math.Max(from, to);
        return 1 - beta * beta;
    }
}
