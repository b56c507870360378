namespace DrainSim.Lines;

/// <summary>Darcy friction factor of a Newtonian liquid in a round pipe.</summary>
/// <remarks><code>
/// Re ≤ 2000         f = 64/Re                                     Hagen–Poiseuille
/// 2000 &lt; Re &lt; 4000  f linear in Re from 0.032 to f(4000)          bridge, ours
/// Re ≥ 4000         1/√f = −2·log10( k/3.7 + 2.51/(Re·√f) )       Colebrook–White
///
/// f   Darcy friction factor, 1 (four times Fanning's)
/// Re  Reynolds number on the bore, 1
/// k   relative roughness ε/D, 1; measured up to 0.05, drawn on above it
/// </code>
/// Continuous, and the loss f·Re² rises strictly with Re throughout. Real flow between the limits is unsteady
/// and depends on the inlet; the bridge stands for its upper side.
/// Source: C. F. Colebrook, J. Inst. Civ. Engrs 11 (1939) 133–156.
/// </remarks>
public static class FrictionFactor
{
    /// <summary>Reynolds number up to which the flow is taken as laminar, 1.</summary>
    public const double LaminarLimit = 2000;

    /// <summary>Reynolds number from which the flow is taken as turbulent, 1.</summary>
    public const double TurbulentLimit = 4000;

    /// <summary>f·Re of laminar flow in a round pipe, 1.</summary>
    public const double LaminarProduct = 64;

    /// <summary>The Darcy friction factor in its regime, 1.</summary>
    /// <param name="reynolds">Reynolds number, 1; greater than 0</param>
    /// <param name="relativeRoughness">roughness over bore, 1; at least 0, less than 1</param>
    public static double Darcy(double reynolds, double relativeRoughness) =>
        new PipeWall(relativeRoughness, 1).Factor(reynolds, out _);

    /// <summary>The laminar friction factor 64/Re, 1, at any Reynolds number.</summary>
    /// <param name="reynolds">Reynolds number, 1; greater than 0</param>
    public static double Laminar(double reynolds) => LaminarProduct / reynolds;

    /// <summary>The Colebrook–White friction factor, 1, solved to the last bits, at any Reynolds number.</summary>
    /// <param name="reynolds">Reynolds number, 1; from some hundreds up</param>
    /// <param name="relativeRoughness">roughness over bore, 1; at least 0, less than 1</param>
    public static double ColebrookWhite(double reynolds, double relativeRoughness) =>
        new PipeWall(relativeRoughness, 1).Turbulent(reynolds, out _);

    /// <summary>The limit of Colebrook–White at infinite Reynolds number, 1/√f = −2·log10(k/3.7); 0 when smooth.</summary>
    /// <param name="relativeRoughness">roughness over bore, 1; at least 0, less than 1</param>
    public static double FullyRough(double relativeRoughness)
    {
        double inverseRoot = -2 * Math.Log10(relativeRoughness / 3.7);
        return 1 / (inverseRoot * inverseRoot);
    }
}
