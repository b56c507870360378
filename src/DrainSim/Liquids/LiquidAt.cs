using System.Diagnostics.CodeAnalysis;
using System.Globalization;

namespace DrainSim.Liquids;

/// <summary>What the catalogue answers for a liquid at one temperature: the liquid, or a refusal.</summary>
public sealed record LiquidAt
{
    /// <summary>Temperature from which a liquid scalds at once, K; 60 °C, common practice, no source.</summary>
    public const double HotFrom = 333.15;

    /// <summary>Least Reid vapour pressure of the equation, Pa; 1 psi.</summary>
    public const double LeastReidVapourPressure = 6895;

    /// <summary>Largest Reid vapour pressure of the equation, Pa; 20 psi.</summary>
    public const double LargestReidVapourPressure = 137895;

    /// <summary>
    /// How far a given strength may stand from that of the data, relative: the rounding of a strength
    /// written in two figures or three, which moves no property by more than its own uncertainty.
    /// </summary>
    public const double StrengthRounding = 0.005;

    private const double IcePoint = 273.15;

    private const string ByNumbers = "give density, viscosity and vapour_pressure instead of the name";

    private LiquidAt(Liquid? liquid, IReadOnlyList<string> warnings, string? refusal)
    {
        Liquid = liquid;
        Warnings = warnings;
        Refusal = refusal;
    }

    /// <summary>The liquid; null when it is refused.</summary>
    public Liquid? Liquid { get; }

    /// <summary>What is doubtful about it, one sentence each; empty when it is refused.</summary>
    public IReadOnlyList<string> Warnings { get; }

    /// <summary>Why there is no liquid, one sentence; null when there is one.</summary>
    public string? Refusal { get; }

    /// <summary>Whether there is a refusal and no liquid.</summary>
    [MemberNotNullWhen(true, nameof(Refusal))]
    [MemberNotNullWhen(false, nameof(Liquid))]
    public bool IsRefused => Refusal is not null;

    internal static LiquidAt Of(CatalogueLiquid entry, double temperature, double? strength, double? reid)
    {
        Require.Finite(temperature, "liquid temperature", "K");
        string? refusal = TemperatureRefusal(entry, temperature)
            ?? StrengthRefusal(entry, strength)
            ?? ReidRefusal(entry, reid);
        if (refusal is not null)
            return new LiquidAt(null, [], refusal);
        Liquid liquid = new()
        {
            Name = NameOf(entry, reid),
            Temperature = temperature,
            Density = entry.Density(temperature),
            Viscosity = entry.Viscosity(temperature),
            VapourPressure = entry.VapourPressure(temperature, reid),
            Hazards = HazardsAt(entry, temperature),
        };
        return new LiquidAt(liquid, WarningsFor(entry, temperature, reid), null);
    }

    private static string? TemperatureRefusal(CatalogueLiquid entry, double temperature) =>
        temperature >= entry.LeastTemperature - CatalogueLiquid.Margin
        && temperature <= entry.MostTemperature + CatalogueLiquid.Margin
            ? null
            : $"{entry.Name} at {Celsius(temperature)} degC is outside its data, which hold from "
                + $"{Celsius(entry.LeastTemperature)} to {Celsius(entry.MostTemperature)} degC; {ByNumbers}.";

    private static string? StrengthRefusal(CatalogueLiquid entry, double? strength)
    {
        if (strength is not { } given)
            return null;
        if (entry.Strength is not { } held)
            return entry.Category == LiquidCategory.Pure && given == 1 // 100 % of a pure liquid, exact as written
                ? null
                : $"{entry.Name} takes no strength; for a mixture {ByNumbers}.";
        return Math.Abs(given - held.Fraction) <= StrengthRounding * held.Fraction
            ? null
            : $"The data of {entry.Id} hold for a strength of {Short(100 * held.Fraction)} % {held.Basis} only, "
                + $"not {Short(100 * given)} %; for another {ByNumbers}.";
    }

    private static string? ReidRefusal(CatalogueLiquid entry, double? reid)
    {
        if (reid is not { } given)
            return null;
        if (entry.ReidVapourPressure is null)
            return $"{entry.Name} takes no Reid vapour pressure; only petrol does.";
        return given is >= LeastReidVapourPressure and <= LargestReidVapourPressure
            ? null
            : $"A Reid vapour pressure of {Short(given / 1000)} kPa is outside its equation, which holds from "
                + $"{Short(LeastReidVapourPressure / 1000)} to {Short(LargestReidVapourPressure / 1000)} kPa.";
    }

    private static List<string> WarningsFor(CatalogueLiquid entry, double temperature, double? reid)
    {
        List<string> warnings = [];
        if (temperature < entry.LeastTemperature)
            warnings.Add(Stretched(entry, temperature, "below", "freeze or thicken"));
        if (temperature > entry.MostTemperature)
            warnings.Add(Stretched(entry, temperature, "above", "boil or change"));
        if (reid is null && entry.ReidVapourPressure is { } taken)
            warnings.Add($"The vapour pressure of petrol depends on its grade; a Reid vapour pressure of "
                + $"{Short(taken / 1000)} kPa is taken, and grades run from 45 to 103 kPa.");
        return warnings;
    }

    private static string Stretched(CatalogueLiquid entry, double temperature, string side, string danger) =>
        $"{entry.Name} at {Celsius(temperature)} degC is {side} the range of its data, "
        + $"{Celsius(entry.LeastTemperature)} to {Celsius(entry.MostTemperature)} degC; its figures are "
        + $"extrapolated, and it may {danger}.";

    private static LiquidHazards HazardsAt(CatalogueLiquid entry, double temperature)
    {
        LiquidHazards hazards = entry.Hazards;
        if (entry.FlashPoint is { } flashPoint && temperature >= flashPoint)
            hazards |= LiquidHazards.Flammable;
        if (temperature >= HotFrom)
            hazards |= LiquidHazards.Hot;
        return hazards;
    }

    private static string NameOf(CatalogueLiquid entry, double? reid) =>
        (reid ?? entry.ReidVapourPressure) is { } pressure
            ? $"{entry.Name} (RVP {Short(pressure / 1000)} kPa)"
            : entry.Name;

    private static string Celsius(double temperature) => Short(temperature - IcePoint);

    private static string Short(double value) => value.ToString("0.##", CultureInfo.InvariantCulture);
}
