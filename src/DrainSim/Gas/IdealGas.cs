namespace DrainSim.Gas;

/// <summary>A gas by the two numbers that its flow depends on.</summary>
public sealed record IdealGas
{
    /// <summary>Molar gas constant, J/(mol·K); CODATA 2018, exact by definition.</summary>
    public const double MolarGasConstant = 8.31446261815324;

    /// <summary>Dry air: R as in ISO 2533:1975 (molar mass 28.96442 g/mol), heat capacity ratio as there.</summary>
    public static IdealGas Air { get; } = new() { SpecificGasConstant = 287.05287, HeatCapacityRatio = 1.4 };

    /// <summary>Gas constant of a kilogram R, J/(kg·K); greater than 0.</summary>
    public required double SpecificGasConstant
    {
        get;
        init => field = Require.Positive(value, "specific gas constant", "J/(kg.K)");
    }

    /// <summary>Heat capacity at constant pressure over that at constant volume k, 1; 1.01 to 2.</summary>
    public required double HeatCapacityRatio
    {
        get;
        init
        {
            field = Require.Within(value, 1.01, 2, "heat capacity ratio", "");
            CriticalPressureRatio = Math.Pow(2 / (value + 1), value / (value - 1));
        }
    }

    /// <summary>Downstream over upstream pressure at which an orifice chokes, (2/(k+1))^(k/(k−1)), 1.</summary>
    public double CriticalPressureRatio { get; private init; }

    /// <summary>A gas by its molar mass.</summary>
    /// <param name="molarMass">molar mass, kg/mol; greater than 0</param>
    /// <param name="heatCapacityRatio">k, 1; 1.01 to 2</param>
    public static IdealGas OfMolarMass(double molarMass, double heatCapacityRatio) => new()
    {
        SpecificGasConstant = MolarGasConstant / Require.Positive(molarMass, "molar mass", "kg/mol"),
        HeatCapacityRatio = heatCapacityRatio,
    };

    /// <summary>Density, kg/m³.</summary>
    /// <param name="pressure">absolute pressure, Pa</param>
    /// <param name="temperature">temperature, K; greater than 0</param>
    public double Density(double pressure, double temperature) => pressure / (SpecificGasConstant * temperature);
}
