namespace DrainSim.Liquids.Correlations;

/// <summary>Viscosity of liquid water at 0.1 MPa.</summary>
/// <param name="A">a1 to a4</param>
/// <param name="B">b1 to b4</param>
/// <remarks><code>
/// μ = 1e−6 · Σ a_i · (T/300)^b_i,  i = 1 to 4                              (7)
///
/// μ  viscosity, Pa·s
/// T  temperature, K
/// </code>
/// Valid for 253.15 ≤ T ≤ 383.15 K, within 1 %.
/// Source: IAPWS SR6-08(2011), equation 7.
/// </remarks>
internal sealed record WaterViscosity(IReadOnlyList<double> A, IReadOnlyList<double> B) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature)
    {
        double sum = 0;
        for (int i = 0; i < A.Count; i++)
            sum += A[i] * Math.Pow(temperature / 300, B[i]);
        return 1e-6 * sum;
    }
}
