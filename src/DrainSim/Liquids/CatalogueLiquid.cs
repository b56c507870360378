using DrainSim.Liquids.Correlations;

namespace DrainSim.Liquids;

/// <summary>A liquid of the built-in catalogue, at any temperature that its data cover.</summary>
public sealed record CatalogueLiquid
{
    /// <summary>
    /// How far beyond <see cref="LeastTemperature"/> and <see cref="MostTemperature"/> the data may be
    /// stretched with a warning, K. All equations are smooth there and the ends stand a little inside
    /// freezing and boiling, which site thermometers miss by as much; common practice, no source.
    /// </summary>
    public const double Margin = 5;

    /// <summary>The name in a scenario: small letters, digits and underscores.</summary>
    public required string Id { get; init; }

    /// <summary>Other names by which <see cref="LiquidLibrary.Find"/> knows it.</summary>
    public required IReadOnlyList<string> Aliases { get; init; }

    /// <summary>Name for people.</summary>
    public required string Name { get; init; }

    /// <summary>CAS registry number as printed; null where there is none.</summary>
    public string? CasNumber { get; init; }

    /// <summary>How well defined the liquid is.</summary>
    public required LiquidCategory Category { get; init; }

    /// <summary>Molar mass, kg/mol (of the vapour for fuels); null where there is none.</summary>
    public double? MolarMass { get; init; }

    /// <summary>Flash point, K; null for a liquid that does not burn.</summary>
    public double? FlashPoint { get; init; }

    /// <summary>Where the flash point is from, or why there is none.</summary>
    public required string FlashPointSource { get; init; }

    /// <summary>Whether the liquid counts as flammable at every temperature (flash point at or below 60 °C).</summary>
    public required bool IsFlammable { get; init; }

    /// <summary>Hazards that do not depend on temperature.</summary>
    public required LiquidHazards Hazards { get; init; }

    /// <summary>Where <see cref="Hazards"/> are from.</summary>
    public required string HazardSource { get; init; }

    /// <summary>Strength for which alone the data hold; null where the word means nothing for the liquid.</summary>
    public Strength? Strength { get; init; }

    /// <summary>Lowest temperature at which all properties hold, K.</summary>
    public required double LeastTemperature { get; init; }

    /// <summary>Highest temperature at which all properties hold, K.</summary>
    public required double MostTemperature { get; init; }

    /// <summary>A remark for people; null where there is none.</summary>
    public string? Note { get; init; }

    /// <summary>Density, kg/m³, with its source.</summary>
    public required PropertyCorrelation DensityCorrelation { get; init; }

    /// <summary>Viscosity, Pa·s, with its source.</summary>
    public required PropertyCorrelation ViscosityCorrelation { get; init; }

    /// <summary>Vapour pressure, Pa, with its source.</summary>
    public required PropertyCorrelation VapourPressureCorrelation { get; init; }

    /// <summary>Reid vapour pressure (37.8 °C) that is taken unless given, Pa; null for all but petrol.</summary>
    public double? ReidVapourPressure => (VapourPressureCorrelation.Equation as ReidPressure)?.Reid;

    /// <summary>Density, kg/m³.</summary>
    /// <param name="temperature">K; no further than <see cref="Margin"/> outside the range</param>
    /// <exception cref="ArgumentOutOfRangeException">the temperature is further outside</exception>
    public double Density(double temperature) => DensityCorrelation.At(Near(temperature));

    /// <summary>Dynamic viscosity, Pa·s.</summary>
    /// <param name="temperature">K; no further than <see cref="Margin"/> outside the range</param>
    /// <exception cref="ArgumentOutOfRangeException">the temperature is further outside</exception>
    public double Viscosity(double temperature) => ViscosityCorrelation.At(Near(temperature));

    /// <summary>Vapour pressure of the liquid itself, Pa absolute, without dissolved air or carbon dioxide.</summary>
    /// <param name="temperature">K; no further than <see cref="Margin"/> outside the range</param>
    /// <param name="reidVapourPressure">for petrol alone, Pa; null for that of the grade</param>
    /// <exception cref="ArgumentOutOfRangeException">the temperature is further outside</exception>
    /// <exception cref="ArgumentException">a Reid vapour pressure for a liquid that is not petrol</exception>
    public double VapourPressure(double temperature, double? reidVapourPressure = null)
    {
        double near = Near(temperature);
        if (reidVapourPressure is not { } reid)
            return VapourPressureCorrelation.At(near);
        return VapourPressureCorrelation.Equation is ReidPressure petrol
            ? (petrol with { Reid = Require.Positive(reid, "Reid vapour pressure", "Pa") }).At(near)
            : throw new ArgumentException($"{Id} has no Reid vapour pressure", nameof(reidVapourPressure));
    }

    /// <summary>The liquid at one temperature, with what there is to say about it, or the reason why not.</summary>
    /// <param name="temperature">K; any finite number</param>
    /// <param name="strength">share of the dissolved substance, 1, on the basis of <see cref="Strength"/>; null for that of the data</param>
    /// <param name="reidVapourPressure">for petrol alone, Pa; null for that of the grade</param>
    public LiquidAt At(double temperature, double? strength = null, double? reidVapourPressure = null) =>
        LiquidAt.Of(this, temperature, strength, reidVapourPressure);

    private double Near(double temperature) => Require.Within(temperature,
        LeastTemperature - Margin, MostTemperature + Margin, $"temperature of {Id}", "K");
}
