namespace DrainSim.Liquids.Correlations;

/// <summary>One property of a liquid as a function of temperature; a closed set, one case per published form.</summary>
internal abstract record Correlation
{
    /// <summary>0 °C on the Kelvin scale, K; exact by definition.</summary>
    protected const double IcePoint = 273.15;

    /// <summary>The pound per square inch, Pa; from the exact pound, standard gravity and inch.</summary>
    public const double PoundPerSquareInch = 0.45359237 * 9.80665 / (0.0254 * 0.0254);

    private protected Correlation()
    {
    }

    /// <summary>The property: Pa for a vapour pressure, kg/m³ for a density, Pa·s for a viscosity.</summary>
    /// <param name="temperature">liquid temperature, K; the caller keeps it near the range of the constants</param>
    public abstract double At(double temperature);
}
