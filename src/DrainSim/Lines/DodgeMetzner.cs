namespace DrainSim.Lines;

/// <summary>Turbulent friction of a power-law liquid.</summary>
/// <remarks><code>
/// 1/√f' = 4·n^−0.75·log10( Re·f'^(1−n/2) ) − 0.4·n^−1.2
///
/// f'  Fanning friction factor, 1; f = 4·f' is Darcy's
/// Re  Metzner–Reed number, 1
/// n   flow index, 1
/// </code>
/// Measured for a smooth wall, n from 0.36 to 1 and Re up to 36 000; drawn on beyond. With n = 1 it is within 0.1 % of
/// Colebrook–White. A rough wall enters as Colebrook and White let it enter: with x = 1/√f and S(x) the right side over 2,
/// <code>x = −2·log10( k/3.7 + 10^(−S(x)/2) )        k = ε/D</code>
/// which for k = 0 is the law above and for a large Re the fully rough limit, whatever the liquid. The form is that of
/// A. P. Szilas, E. Bobok and L. Navratil, Rheol. Acta 20 (1981) 487–496 (from memory).
/// Source: D. W. Dodge and A. B. Metzner, AIChE J. 5 (1959) 189–204.
/// </remarks>
public static class DodgeMetzner
{
    private const double Ln10 = 2.302585092994045684;

    /// <summary>Share of x below which a Newton step leaves an error, its square, under the last bit.</summary>
    private const double LastStep = 1e-8;

    /// <summary>Turns after which the search ends; some six are needed.</summary>
    private const int MostTurns = 100;

    /// <summary>The Darcy friction factor, 1, at any Reynolds number.</summary>
    /// <param name="reynolds">Metzner–Reed number, 1; from some thousands up</param>
    /// <param name="flowIndex">n, 1; greater than 0, less than 2</param>
    /// <param name="relativeRoughness">k, 1; at least 0, less than 1</param>
    public static double FrictionFactor(double reynolds, double flowIndex, double relativeRoughness) =>
        FrictionFactor(reynolds, flowIndex, relativeRoughness, out _);

    /// <summary>The Darcy friction factor, 1, and its slope d ln f/d ln Re.</summary>
    internal static double FrictionFactor(double re, double n, double k, out double slope)
    {
        double a = 2 * Math.Pow(n, -0.75), b = 0.2 * Math.Pow(n, -1.2), rough = k / 3.7;
        double x = Math.Max(1, 1.8 * Math.Log10(re / 6.9)), rise = 1, share = 1;
        for (int turn = 0; turn < MostTurns; turn++)
        {
            double s = a * (Math.Log10(re) - (2 - n) * Math.Log10(2 * x)) - b;
            double smooth = Math.Exp(-Ln10 / 2 * s);
            share = smooth / (rough + smooth);
            double residual = x + (rough == 0 ? -s : 2 / Ln10 * Math.Log(rough + smooth));
            rise = 1 + share * a * (2 - n) / (x * Ln10);
            double next = Math.Max(x / 4, x - residual / rise);
            double step = next - x;
            x = next;
            if (Math.Abs(step) < LastStep * x)
                break;
        }

        slope = -2 * share * a / (Ln10 * x * rise);
        return 1 / (x * x);
    }
}
