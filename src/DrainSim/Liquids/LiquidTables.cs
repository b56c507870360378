using CsvHelper;
using DrainSim.Liquids.Correlations;

namespace DrainSim.Liquids;

/// <summary>Puts the catalogue together from its four tables; temperatures in °C become kelvin here.</summary>
internal sealed class LiquidTables
{
    private const double IcePoint = 273.15;

    private readonly Dictionary<(string Liquid, string Property), CorrelationRow> correlations = EmbeddedTable
        .Rows("Liquids.liquid-correlations.csv", CorrelationRow.Read)
        .ToDictionary(row => (row.Liquid, row.Property));

    private readonly Dictionary<string, (LiquidHazards Hazards, string Source)> hazards = EmbeddedTable
        .Rows("Liquids.liquid-hazards.csv", reader =>
            (Id: reader.GetString("id"), Hazards: Hazards(reader.GetString("hazards")), Source: reader.GetString("source")))
        .ToDictionary(row => row.Id, row => (row.Hazards, row.Source));

    private readonly ILookup<string, string> aliases = EmbeddedTable
        .Rows("Liquids.liquid-aliases.csv", reader => (Alias: reader.GetString("alias"), Id: reader.GetString("id")))
        .ToLookup(row => row.Id, row => row.Alias);

    private LiquidTables()
    {
    }

    /// <summary>All liquids, in the order of the table.</summary>
    /// <exception cref="InvalidDataException">a table is at fault</exception>
    public static IReadOnlyList<CatalogueLiquid> Read()
    {
        LiquidTables tables = new();
        return EmbeddedTable.Rows("Liquids.liquids.csv", tables.Liquid);
    }

    private CatalogueLiquid Liquid(CsvReader reader)
    {
        string id = reader.GetString("id");
        double? molarMass = reader.NumberOrNull("molar_mass_g_mol") / 1000;
        bool flammable = reader.GetString("flammable") == "yes";
        Correlation water = correlations[("water", "psat")].Equation(null, null);
        PropertyCorrelation density = correlations[(id, "density")].Correlation(molarMass, null);
        return new CatalogueLiquid
        {
            Id = id,
            Aliases = [.. aliases[id]],
            Name = reader.GetString("name"),
            CasNumber = reader.TextOrNull("cas"),
            Category = Category(reader.GetString("category")),
            MolarMass = molarMass,
            FlashPoint = reader.NumberOrNull("flash_point_C") + IcePoint,
            FlashPointSource = reader.GetString("flash_point_source"),
            IsFlammable = flammable,
            Hazards = hazards[id].Hazards | (flammable ? LiquidHazards.Flammable : LiquidHazards.None),
            HazardSource = hazards[id].Source,
            Strength = reader.NumberOrNull("strength") is { } share
                ? new Strength(share, reader.GetString("strength_basis"))
                : null,
            LeastTemperature = reader.Number("min_T_C") + IcePoint,
            MostTemperature = reader.Number("max_T_C") + IcePoint,
            Note = reader.TextOrNull("note"),
            DensityCorrelation = density,
            ViscosityCorrelation = correlations[(id, "viscosity")].Correlation(molarMass, density.Equation),
            VapourPressureCorrelation = correlations[(id, "psat")].Correlation(molarMass, water),
        };
    }

    private static LiquidCategory Category(string word) => word switch
    {
        "pure" => LiquidCategory.Pure,
        "solution" => LiquidCategory.Solution,
        "commercial" => LiquidCategory.Commercial,
        _ => throw new InvalidDataException($"no category of liquids is called {word}"),
    };

    private static LiquidHazards Hazards(string words)
    {
        LiquidHazards hazards = LiquidHazards.None;
        foreach (string word in words.Split(' ', StringSplitOptions.RemoveEmptyEntries))
        {
            hazards |= word switch
            {
                "combustible" => LiquidHazards.Combustible,
                "corrosive" => LiquidHazards.Corrosive,
                "toxic" => LiquidHazards.Toxic,
                "polluting" => LiquidHazards.Polluting,
                _ => throw new InvalidDataException($"no hazard of a liquid is called {word}"),
            };
        }
        return hazards;
    }
}
