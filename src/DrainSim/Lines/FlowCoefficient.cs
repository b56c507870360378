namespace DrainSim.Lines;

/// <summary>Between a valve's measured flow coefficient and its loss coefficient.</summary>
/// <remarks><code>
/// K = 1.598876e9·D⁴/Kv²      (2e5/1000·(π/4)²·3600² = 1.5988764e9)
///
/// K   loss coefficient on the velocity head in the bore, 1
/// D   bore, m
/// Kv  flow of water, m³/h, at a loss of 1 bar and 1000 kg/m³
/// </code>
/// Source: the definition of Kv, IEC 60534-1.
/// </remarks>
public static class FlowCoefficient
{
    /// <summary>Kv over Cv: US gal/min at 1 psi into m³/h at 1 bar, 1.</summary>
    /// <remarks>0.2271247/√0.06894757 = 0.8650; both at the same density.</remarks>
    public const double KvPerCv = 0.864978;

    private static readonly double Scale = 200 * (Math.PI / 4) * (Math.PI / 4) * 3600 * 3600;

    /// <summary>Loss coefficient K, 1.</summary>
    /// <param name="kv">flow coefficient Kv, m³/h at 1 bar; greater than 0</param>
    /// <param name="bore">bore on whose velocity head K counts, m; greater than 0</param>
    public static double Loss(double kv, double bore) => Scale * bore * bore * bore * bore / (kv * kv);
}
