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
        Rheology? rheology = RheologyReader.Read(block);
        bool hasNumbers = OwnNumbers.Any(block.Has) || rheology is not Newtonian;
        Liquid? liquid = block.Has("name") && !hasNumbers ? ByName(block) : ByNumbers(block, hasNumbers, rheology);
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

    private static Liquid? ByNumbers(BlockReader block, bool hasNumbers, Rheology? rheology)
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
        double? viscosity = rheology is Newtonian ? Viscosity(block, density) : ApparentViscosity(block, rheology);
        double? vapour = block.Needed("vapour_pressure", Quantities.Pressure, Allowed.NotNegative);
        if (name != "liquid" && LiquidLibrary.Find(name) is { } known)
            block.Warn("name", $"the numbers given here stand, not those of the built-in {known.Id}", "Leave them out to use the built-in liquid");
        Judge(block, density, rheology is Newtonian ? viscosity : null);
        if (density is not { } rho || viscosity is not { } mu || vapour is not { } pv || rheology is null)
            return null;
        return block.Build(() => new Liquid
        {
            Name = name,
            Temperature = temperature,
            Density = rho,
            Viscosity = mu,
            Rheology = rheology,
            VapourPressure = pv,
            Hazards = temperature >= LiquidAt.HotFrom ? LiquidHazards.Hot : LiquidHazards.None,
        });
    }

    private static double? Viscosity(BlockReader block, double? density)
    {
        string? given = block.OnlyOne("Give one of the two", "viscosity", "kinematic_viscosity");
        double? viscosity = block.Amount("viscosity", Quantities.Viscosity, Allowed.Positive);
        double? kinematic = block.Amount("kinematic_viscosity", Quantities.KinematicViscosity, Allowed.Positive);
        return given is null ? null : viscosity ?? kinematic * density;
    }

    /// <summary>Shear rate at which a liquid that is not Newtonian is told to people, 1/s; common practice, no source.</summary>
    private const double ShearRate = 100;

    private static double? ApparentViscosity(BlockReader block, Rheology? rheology)
    {
        foreach (string key in (ReadOnlySpan<string>)["viscosity", "kinematic_viscosity"])
        {
            if (block.Has(key) && rheology is not null)
                block.Refuse(key, "belongs to a Newtonian liquid", "Leave it out: the rheology says how the liquid flows");
        }

        return rheology?.Curve(1).ApparentViscosity(ShearRate);
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
