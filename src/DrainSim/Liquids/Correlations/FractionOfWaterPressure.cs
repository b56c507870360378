namespace DrainSim.Liquids.Correlations;

/// <summary>Vapour pressure of a watery solution by its water activity.</summary>
/// <param name="Activity">a, water activity, 1; taken as the same at all temperatures</param>
/// <param name="Water">vapour pressure of pure water</param>
/// <remarks><code>
/// p = a · p_w(T)
///
/// p, p_w  vapour pressure of the solution and of water, Pa
/// </code>
/// Holds where nothing but water evaporates. The source and the range of each a stand in the table's row.
/// </remarks>
internal sealed record FractionOfWaterPressure(double Activity, Correlation Water) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature) => Activity * Water.At(temperature);
}
