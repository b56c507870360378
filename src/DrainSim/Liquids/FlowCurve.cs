namespace DrainSim.Liquids;

/// <summary>Shear stress over shear rate of a liquid whose stress depends on the rate alone.</summary>
/// <remarks><code>
/// τ = τ_y + K·γ̇^n        for τ above τ_y; nothing is sheared below it
///
/// τ    shear stress, Pa
/// γ̇    shear rate, 1/s
/// </code>
/// Holds all four rheologies: Newtonian for τ_y = 0 and n = 1, power law for τ_y = 0, Bingham for n = 1.
/// Source: W. H. Herschel and R. Bulkley, Kolloid-Zeitschrift 39 (1926) 291–300 (from memory).
/// </remarks>
/// <param name="YieldStress">τ_y, Pa; 0 where any stress moves the liquid</param>
/// <param name="Consistency">K, Pa·s^n; greater than 0</param>
/// <param name="FlowIndex">n, 1; less than 1 for a liquid that shear thins</param>
public readonly record struct FlowCurve(double YieldStress, double Consistency, double FlowIndex)
{
    /// <summary>Whether the stress is in proportion to the rate; the consistency is then the viscosity.</summary>
    public bool IsNewtonian => YieldStress == 0 && FlowIndex == 1; // exact: any other number is another liquid

    /// <summary>Shear stress at a shear rate, Pa.</summary>
    /// <param name="rate">shear rate, 1/s; at least 0</param>
    public double Stress(double rate) => YieldStress + Consistency * Math.Pow(rate, FlowIndex);

    /// <summary>Stress over rate, Pa·s: the viscosity that the liquid seems to have.</summary>
    /// <param name="rate">shear rate, 1/s; greater than 0</param>
    public double ApparentViscosity(double rate) => Stress(rate) / rate;
}
