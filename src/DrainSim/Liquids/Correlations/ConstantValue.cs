namespace DrainSim.Liquids.Correlations;

/// <summary>One value for every temperature, for a vapour pressure too small to matter.</summary>
/// <param name="Value">the property, SI</param>
internal sealed record ConstantValue(double Value) : Correlation
{
    /// <inheritdoc/>
    public override double At(double temperature) => Value;
}
