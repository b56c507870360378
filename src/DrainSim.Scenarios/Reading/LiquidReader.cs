using DrainSim.Liquids;
using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the block <c>liquid</c>: one of the built-in liquids, or one given by numbers.</summary>
internal static class LiquidReader
{
    private const string Choice = "Give a name and a temperature, or density, viscosity and vapour_pressure, not both";

    private static readonly string[] OwnNumbers = ["density", "viscosity", "kinematic_viscosity", "vapour_pressure"];

    /// <summary>The liquid; null when it is refused.</summary>
    public static Liquid? Read(BlockReader block)
    {
        bool hasNumbers = OwnNumbers.Any(block.Has);
        Liquid? liquid = block.Has("name") && !hasNumbers ? ByName(block) : ByNumbers(block, hasNumbers);
        block.Finish();
        return liquid;
    }

    private static Liquid? ByName(BlockReader block)
    {
        CatalogueLiquid? row = block.Row("name", "liquid", LiquidLibrary.Find,
            () => LiquidLibrary.All.SelectMany(liquid => liquid.Aliases.Prepend(liquid.Id)), "drainsim liquids");
        double? temperature = block.Needed("temperature", Quantities.Temperature, Allowed.Positive);
        double? strength = block.Amount("strength", Quantities.Ratio, Allowed.Share);
        double? reid = block.Amount("reid_vapour_pressure", Quantities.Pressure, Allowed.Positive);
        if (row is null || temperature is null || (block.Has("strength") && strength is null) || (block.Has("reid_vapour_pressure") && reid is null))
            return null;
        LiquidAt state = row.At(temperature.Value, strength, reid);
        if (state.IsRefused)
            block.Refuse(KeyOf(row, temperature.Value, strength), state.Refusal.TrimEnd('.'), "");
        foreach (string warning in state.Warnings)
            block.Warn(warning.Contains("Reid", StringComparison.Ordinal) ? "name" : "temperature", warning.TrimEnd('.'), "");
        return state.Liquid;
    }

    /// <summary>The key that a refusal of the catalogue is about.</summary>
    private static string KeyOf(CatalogueLiquid row, double temperature, double? strength)
    {
        if (row.At(temperature).IsRefused)
            return "temperature";
        return strength is not null && row.At(temperature, strength).IsRefused ? "strength" : "reid_vapour_pressure";
    }

    private static Liquid? ByNumbers(BlockReader block, bool hasNumbers)
    {
        if (!hasNumbers)
        {
            block.Miss("is missing", Choice, "name");
            block.Amount("temperature", Quantities.Temperature, Allowed.Positive);
            return null;
        }
        string name = block.Word("name") ?? "liquid";
        double temperature = block.AmountOr("temperature", Quantities.Temperature, Allowed.Positive, 293.15, "20 degC");
        double? density = block.Needed("density", Quantities.Density, Allowed.Positive);
        string? given = block.OnlyOne("Give one of the two", "viscosity", "kinematic_viscosity");
        double? viscosity = block.Amount("viscosity", Quantities.Viscosity, Allowed.Positive);
        double? kinematic = block.Amount("kinematic_viscosity", Quantities.KinematicViscosity, Allowed.Positive);
        double? vapour = block.Needed("vapour_pressure", Quantities.Pressure, Allowed.NotNegative);
        if (name != "liquid" && LiquidLibrary.Find(name) is { } known)
            block.Warn("name", $"the numbers given here stand, not those of the built-in {known.Id}", "Leave them out to use the built-in liquid");
        Judge(block, density, viscosity ?? kinematic * density);
        if (density is not { } rho || (viscosity ?? kinematic * rho) is not { } mu || vapour is not { } pv || given is null)
            return null;
        return block.Build(() => new Liquid
        {
            Name = name,
            Temperature = temperature,
            Density = rho,
            Viscosity = mu,
            VapourPressure = pv,
            Hazards = temperature >= LiquidAt.HotFrom ? LiquidHazards.Hot : LiquidHazards.None,
        });
    }

    /// <summary>Warns of numbers that no liquid of a yard has; common practice, no source.</summary>
    private static void Judge(BlockReader block, double? density, double? viscosity)
    {
        if (density is < 400 or > 4000)
            block.Warn("density", "few liquids are so light or so heavy", "Most lie from 600 kg/m3 to 2000 kg/m3");
        if (viscosity is < 5e-5 or > 1000)
            block.Warn(block.Has("viscosity") ? "viscosity" : "kinematic_viscosity", "few liquids are so thin or so thick",
                "Water has 1 mPa.s, honey about 10 Pa.s");
    }
}
