using CsCheck;
using DrainSim.Gas;
using DrainSim.Tests.Liquids;

namespace DrainSim.Tests.Gas;

public sealed class StandardAtmosphereTests
{
    [Fact]
    public void The_pressure_meets_its_check_values()
    {
        var rows = CheckTable.Rows("Gas.atmosphere-check-values.csv");
        Assert.Equal(22, rows.Count);
        Assert.Empty(rows.Select(row => row.Miss(
            row.Number("pressure_Pa"), StandardAtmosphere.Pressure(row.Number("geometric_altitude_m")))).OfType<string>());
    }

    [Fact]
    public void The_temperature_meets_its_check_values() =>
        Assert.Empty(CheckTable.Rows("Gas.atmosphere-check-values.csv")
            .Where(row => row["temperature_K"].Length > 0)
            .Select(row => row.Miss(
                row.Number("temperature_K"), StandardAtmosphere.Temperature(row.Number("geometric_altitude_m"))))
            .OfType<string>());

    [Fact]
    public void At_sea_level_the_air_is_standard()
    {
        Assert.Equal(101325, StandardAtmosphere.Pressure(0));
        Assert.Equal(288.15, StandardAtmosphere.Temperature(0));
    }

    /// <summary>dp/dz = −ρ·g with ρ = p/(R·T) and gravity gn·(r/(r + z))², the balance behind the formula;
    /// a central difference over 2 m is good to 1e-8.</summary>
    [Fact]
    public void The_pressure_carries_the_weight_of_the_air_above() =>
        Gen.Double[-490, 10_990].Sample(z =>
        {
            double slope = (StandardAtmosphere.Pressure(z + 1) - StandardAtmosphere.Pressure(z - 1)) / 2;
            double gravity = 9.80665 * Math.Pow(6_356_766 / (6_356_766 + z), 2);
            double weight = StandardAtmosphere.Pressure(z) / (287.05287 * StandardAtmosphere.Temperature(z)) * gravity;
            return Math.Abs(slope / -weight - 1) < 1e-7;
        });

    [Theory]
    [InlineData(-501)]
    [InlineData(11_001)]
    [InlineData(double.NaN)]
    public void An_altitude_outside_the_layer_is_an_error_that_names_it(double altitude)
    {
        var error = Assert.Throws<ArgumentOutOfRangeException>(() => StandardAtmosphere.Pressure(altitude));
        Assert.StartsWith("altitude must be from -500 to 11000 m", error.Message, StringComparison.Ordinal);
    }
}
