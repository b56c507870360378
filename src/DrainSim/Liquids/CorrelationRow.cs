using System.Globalization;
using CsvHelper;
using DrainSim.Liquids.Correlations;

namespace DrainSim.Liquids;

/// <summary>One row of the table of correlations: an equation by name, its constants, range and source.</summary>
internal sealed record CorrelationRow
{
    private const int MostConstants = 10;

    /// <summary>Id of the liquid.</summary>
    public required string Liquid { get; init; }

    /// <summary><c>psat</c>, <c>density</c> or <c>viscosity</c>.</summary>
    public required string Property { get; init; }

    private string EquationName { get; init; } = "";

    private double[] C { get; init; } = [];

    private double LeastTemperature { get; init; }

    private double MostTemperature { get; init; }

    private double Uncertainty { get; init; }

    private string Source { get; init; } = "";

    /// <summary>The row on which the reader stands.</summary>
    /// <exception cref="InvalidDataException">a cell is at fault</exception>
    public static CorrelationRow Read(CsvReader reader)
    {
        List<double> constants = [];
        for (int i = 1; i <= MostConstants; i++)
        {
            if (reader.NumberOrNull(string.Create(CultureInfo.InvariantCulture, $"c{i}")) is not { } c)
                break;
            constants.Add(c);
        }
        return new CorrelationRow
        {
            Liquid = reader.GetString("liquid"),
            Property = reader.GetString("property"),
            EquationName = reader.GetString("equation"),
            C = [.. constants],
            LeastTemperature = reader.Number("T_min_K"),
            MostTemperature = reader.Number("T_max_K"),
            Uncertainty = reader.Number("uncertainty_pct") / 100,
            Source = reader.GetString("source"),
        };
    }

    /// <summary>The property of the row.</summary>
    /// <param name="molarMass">kg/mol, for a row that counts in moles; else null</param>
    /// <param name="base">what the row stands on: the oil's density, the vapour pressure of water; else null</param>
    /// <exception cref="InvalidDataException">the row names no equation, or one that needs what is null</exception>
    public PropertyCorrelation Correlation(double? molarMass, Correlation? @base) => new(Equation(molarMass, @base))
    {
        EquationName = EquationName,
        LeastTemperature = LeastTemperature,
        MostTemperature = MostTemperature,
        Uncertainty = Uncertainty,
        Source = Source,
    };

    /// <inheritdoc cref="Correlation"/>
    public Correlation Equation(double? molarMass, Correlation? @base) => (EquationName, molarMass, @base) switch
    {
        ("IF97_30", _, _) => new SaturatedWaterPressure(C),
        ("KELL1975", _, _) => new KellDensity(C[..6], C[6]),
        ("IAPWS_SR6_MU", _, _) => new WaterViscosity(C[..4], C[4..]),
        ("WATER_FACTOR", _, { } water) => new FractionOfWaterPressure(C[0], water),
        ("POLY_T", _, _) => new TemperaturePolynomial(C),
        ("LNPOLY_T", _, _) => new ExponentialPolynomial(C),
        ("SEAWATER_MU", _, _) => new SeawaterViscosity(C[0]),
        ("DIPPR101", _, _) => new Dippr101(C[0], C[1], C[2], C[3], C[4]),
        ("DIPPR105", { } m, _) => new Dippr105(C[0], C[1], C[2], C[3], m),
        ("WAGNER25", _, _) => new WagnerPressure(C[0], C[1], C[2], C[3], C[4], C[5]),
        ("PPDS2_RHO", _, _) => new Ppds2Density(C[0], C[1], C[2], C[3], C[4], C[5]),
        ("PPDS9", _, _) => new Ppds9Viscosity(C[0], C[1], C[2], C[3], C[4]),
        ("VOGEL", _, _) => new VogelEquation(C[0], C[1], C[2]),
        ("WALTHER", _, { } density) => new WaltherViscosity(C[0], C[1], density),
        ("API_RVP", _, _) => new ReidPressure(C[0] * Correlations.Correlation.PoundPerSquareInch, C[1]),
        ("AP42_AB", _, _) => new StockPressure(C[0], C[1]),
        ("API_VCF", _, _) => new PetroleumDensity(C[0], C[1], C[2]),
        ("CONSTANT", _, _) => new ConstantValue(C[0]),
        _ => throw new InvalidDataException($"{Liquid}, {Property}: the equation {EquationName} cannot be set up"),
    };
}
