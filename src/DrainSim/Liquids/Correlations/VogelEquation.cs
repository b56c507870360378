namespace DrainSim.Liquids.Correlations;

/// <summary>The Vogel–Fulcher–Tammann form, for viscosities; with B negative Antoine's, for vapour pressures.</summary>
/// <param name="A">1</param>
/// <param name="B">K</param>
/// <param name="C">K</param>
/// <remarks><code>
/// ln y = A + B/(T + C)
///
/// y  viscosity, Pa·s, or vapour pressure, Pa
/// T  temperature, K; above −C
/// </code>
/// The source and the range of the constants stand in the table's row.
/// Source of the form: H. Vogel, Physikalische Zeitschrift 22 (1921) 645–646; C. Antoine, Comptes
/// Rendus 107 (1888) 681–684.
/// </remarks>
internal sealed record VogelEquation(double A, double B, double C) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature) => Math.Exp(A + B / (temperature + C));
}
