using DrainSim.Liquids.Correlations;

namespace DrainSim.Liquids;

/// <summary>One property of a catalogue liquid against temperature, with where it is from and how good it is.</summary>
public sealed record PropertyCorrelation
{
    internal PropertyCorrelation(Correlation equation)
    {
        Equation = equation;
    }

    /// <summary>The equation with its constants.</summary>
    internal Correlation Equation { get; init; }

    /// <summary>Name of the form of equation in the table, such as <c>DIPPR101</c>.</summary>
    public required string EquationName { get; init; }

    /// <summary>Lowest temperature of the constants, K.</summary>
    public required double LeastTemperature { get; init; }

    /// <summary>Highest temperature of the constants, K.</summary>
    public required double MostTemperature { get; init; }

    /// <summary>Estimated relative uncertainty within that range, 1: 0.05 for 5 %.</summary>
    public required double Uncertainty { get; init; }

    /// <summary>Publication of the constants, or the words that say there is none.</summary>
    public required string Source { get; init; }

    /// <summary>The property: Pa for a vapour pressure, kg/m³ for a density, Pa·s for a viscosity.</summary>
    /// <param name="temperature">liquid temperature, K; outside the range it is extrapolated</param>
    public double At(double temperature) => Equation.At(temperature);
}
