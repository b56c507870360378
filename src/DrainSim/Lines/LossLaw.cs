namespace DrainSim.Lines;

/// <summary>Loss coefficient of one fitting or open valve on the velocity head in its own bore.</summary>
/// <remarks><code>
/// K = K1/Re + K∞
///
/// K∞ = p                        constant
/// K∞ = p·f_T                    equivalent length; f_T = 0.25/log10(ε/(3.7·D))², ε = 0.04572 mm
/// K∞ = p·(1 + 1/ID)             two-K, ID inside diameter in inches
/// K∞ = p·(1 + Kd/NPS^0.3)       three-K, NPS nominal size in inches
/// </code>
/// The two-K and three-K rows bring their own K1. A row with a turbulent coefficient alone borrows the K1 of the
/// two-K class of the same kind, which keeps its printed K at high Reynolds numbers; that rule is ours.
/// A bore in inches stands for the nominal size, which a hose has not.
/// Sources: W. B. Hooper, Chem. Eng., 24 August 1981, 96–100; R. Darby, Chem. Eng. 106 no. 7 (1999) 101 and
/// 108 no. 4 (2001) 127; Crane Technical Paper 410.
/// </remarks>
public sealed record LossLaw
{
    private const double Inch = 0.0254;
    private const double CraneRoughness = 4.572e-5;

    /// <summary>The turbulent formula.</summary>
    public required LossMethod Method { get; init; }

    /// <summary>K1 of the laminar rise K1/Re, 1; 0 for a coefficient that does not depend on Re.</summary>
    public double LaminarConstant { get; init => field = Require.NotNegative(value, "laminar constant K1", ""); }

    /// <summary>The turbulent formula's p: K, L/D, K∞ or Ki, 1; at least 0.</summary>
    public required double Coefficient { get; init => field = Require.NotNegative(value, "loss coefficient", ""); }

    /// <summary>Kd of the three-K formula, in^0.3; 0 elsewhere.</summary>
    public double SizeConstant { get; init => field = Require.NotNegative(value, "size constant Kd", ""); }

    /// <summary>The part K∞ that stays at high Reynolds numbers, 1.</summary>
    /// <param name="bore">inside diameter, m; greater than 0</param>
    public double Turbulent(double bore) => Method switch
    {
        LossMethod.Constant => Coefficient,
        LossMethod.EquivalentLength => Coefficient * CraneFactor(bore),
        LossMethod.TwoK => Coefficient * (1 + Inch / bore),
        LossMethod.ThreeK => Coefficient * (1 + SizeConstant / Math.Pow(bore / Inch, 0.3)),
        _ => throw new System.Diagnostics.UnreachableException(Method.ToString()),
    };

    /// <summary>K at a Reynolds number, 1.</summary>
    /// <param name="reynolds">Reynolds number in the bore, 1; greater than 0</param>
    /// <param name="bore">inside diameter, m; greater than 0</param>
    public double At(double reynolds, double bore) => LaminarConstant / reynolds + Turbulent(bore);

    /// <summary>Crane's f_T, the fully rough friction factor of clean commercial steel pipe, 1.</summary>
    /// <param name="bore">inside diameter, m; greater than 0.1 mm</param>
    public static double CraneFactor(double bore) => FrictionFactor.FullyRough(CraneRoughness / bore);
}
