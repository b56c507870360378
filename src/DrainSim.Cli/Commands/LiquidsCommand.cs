using System.CommandLine;
using System.CommandLine.Parsing;
using DrainSim.Cli.Terminal;
using DrainSim.Liquids;
using DrainSim.Reports.Measures;
using DrainSim.Scenarios.Units;

namespace DrainSim.Cli.Commands;

/// <summary>Shows the built-in liquids with their properties at one temperature.</summary>
internal sealed class LiquidsCommand : TableCommand
{
    private const double IcePoint = 273.15;
    private const double UsualTemperature = IcePoint + 20;

    private readonly Option<double?> temperature = new("--temperature", "-t")
    {
        Description = "Temperature of the figures, with its unit, such as '40 degC' or '104 degF'; 20 degC unless given.",
        HelpName = "temperature",
        CustomParser = ReadTemperature,
    };

    public LiquidsCommand() : base("liquids", "Shows the built-in liquids, their properties and hazards.")
    {
        Options.Add(temperature);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<Example> Examples =>
    [
        new("drainsim liquids", "Shows the liquids with their properties at 20 °C."),
        new("drainsim liquids --temperature '-5 degC'", "Shows them on a cold night."),
        new("drainsim liquids --csv > liquids.csv", "Writes them for a spreadsheet, with all sources."),
    ];

    /// <inheritdoc/>
    protected override ColumnTable Table(ParseResult parsed)
    {
        double kelvin = parsed.GetValue(temperature) ?? UsualTemperature;
        var table = new ColumnTable(
            new Column { Title = "liquid", Key = "id" },
            new Column { Title = "what it is", Key = "name", IsWrapped = true },
            new Column { Key = "other_names" },
            new Column { Key = "temperature_degC" },
            new Column { Title = "kg/m³", IsNumber = true },
            new Column { Title = "mPa·s", IsNumber = true },
            new Column { Title = "kPa", IsNumber = true },
            new Column { Key = "density_kg_m3" },
            new Column { Key = "viscosity_Pa_s" },
            new Column { Key = "vapour_pressure_Pa" },
            new Column { Title = "°C, from", Key = "least_temperature_degC", IsNumber = true },
            new Column { Title = "to", Key = "most_temperature_degC", IsNumber = true },
            new Column { Key = "flash_point_degC" },
            new Column { Title = "hazards", Key = "hazards", IsWrapped = true },
            new Column { Key = "density_source" },
            new Column { Key = "viscosity_source" },
            new Column { Key = "vapour_pressure_source" },
            new Column { Key = "flash_point_source" },
            new Column { Key = "hazard_source" },
            new Column { Key = "note" });
        foreach (CatalogueLiquid liquid in LiquidLibrary.All)
            table.Add(Row(liquid, kelvin));
        table.Notes.Add($"Density, viscosity and vapour pressure at {new MeasureFormat(UnitSystem.Metric).Temperature(kelvin)}; "
            + "empty where the liquid's data do not reach.");
        table.Notes.Add("Sources and flash points: drainsim liquids --csv");
        return table;
    }

    private static string[] Row(CatalogueLiquid liquid, double kelvin)
    {
        Liquid? at = liquid.At(kelvin).Liquid;
        LiquidHazards hazards = at?.Hazards ?? liquid.Hazards;
        return
        [
            liquid.Id,
            liquid.Name,
            string.Join(' ', liquid.Aliases),
            Celsius(kelvin),
            at is null ? "" : MeasureFormat.Number(Math.Round(at.Density, 1)),
            at is null ? "" : MeasureFormat.Number(1000 * at.Viscosity),
            at is null ? "" : MeasureFormat.Number(at.VapourPressure / 1000),
            Exact(at?.Density),
            Exact(at?.Viscosity),
            Exact(at?.VapourPressure),
            Celsius(liquid.LeastTemperature),
            Celsius(liquid.MostTemperature),
            Celsius(liquid.FlashPoint),
            hazards == LiquidHazards.None ? "" : HazardWords(hazards),
            liquid.DensityCorrelation.Source,
            liquid.ViscosityCorrelation.Source,
            liquid.VapourPressureCorrelation.Source,
            liquid.FlashPointSource,
            liquid.HazardSource,
            liquid.Note ?? "",
        ];
    }

    private static string HazardWords(LiquidHazards hazards) => string.Join(", ",
        Enum.GetValues<LiquidHazards>()
            .Where(hazard => hazard != LiquidHazards.None && hazards.HasFlag(hazard))
            .Select(hazard => hazard.ToString().ToLowerInvariant()));

    private static string Celsius(double? kelvin) =>
        kelvin is { } value ? Exact(Math.Round(value - IcePoint, 6)) : "";

    private static double? ReadTemperature(ArgumentResult result)
    {
        QuantityReading reading = QuantityText.Read(result.Tokens.Single().Value, Quantities.Temperature);
        if (reading.IsRefused)
            result.AddError($"--temperature: {reading.Fault}. {reading.Accepted}");
        return reading.Value;
    }
}
