using System.Globalization;
using CsCheck;
using DrainSim.Reports.Measures;

namespace DrainSim.Tests.Reports;

public sealed class MeasureFormatTests
{
    private static readonly MeasureFormat Metric = new(UnitSystem.Metric);
    private static readonly MeasureFormat Us = new(UnitSystem.Us);

    [Theory]
    [InlineData(0, "0 s")]
    [InlineData(0.1234, "0.123 s")]
    [InlineData(9.999, "10 s")]
    [InlineData(12.3, "12.3 s")]
    [InlineData(59.94, "59.9 s")]
    [InlineData(59.96, "1 min")]
    [InlineData(61, "1 min 1 s")]
    [InlineData(2825, "47 min 5 s")]
    [InlineData(3599.4, "59 min 59 s")]
    [InlineData(3599.6, "1 h")]
    [InlineData(6125, "1 h 42 min")]
    [InlineData(11520, "3 h 12 min")]
    [InlineData(86369, "23 h 59 min")]
    [InlineData(86371, "1 d")]
    [InlineData(187200, "2 d 4 h")]
    [InlineData(30 * 86400.0, "30 d")]
    public void A_duration_is_told_in_the_words_of_people(double seconds, string expected) =>
        Assert.Equal(expected, MeasureFormat.Duration(seconds));

    [Theory]
    [InlineData(0.05, "50 mm", "1.97 in")]
    [InlineData(0.0999, "99.9 mm", "3.93 in")]
    [InlineData(0.12, "0.12 m", "4.72 in")]
    [InlineData(0.3048, "0.305 m", "1 ft")]
    [InlineData(-1.2, "−1.2 m", "−3.94 ft")]
    [InlineData(12.345, "12.3 m", "40.5 ft")]
    [InlineData(1234.5, "1235 m", "4050 ft")]
    public void A_length_has_three_figures(double metres, string metric, string us) =>
        AssertBoth(metres, metric, us, (format, value) => format.Length(value));

    [Theory]
    [InlineData(0.312, "312 L", "82.4 gal")]
    [InlineData(0.0021, "2.1 L", "0.555 gal")]
    [InlineData(0.9996, "1 m³", "264 gal")]
    [InlineData(11.76, "11.8 m³", "3107 gal")]
    public void A_volume_has_three_figures(double cubicMetres, string metric, string us) =>
        AssertBoth(cubicMetres, metric, us, (format, value) => format.Volume(value));

    [Theory]
    [InlineData(40e-3 / 60, "40 L/min", "10.6 gpm")]
    [InlineData(2.3456e-3, "2.35 L/s", "37.2 gpm")]
    [InlineData(0.25, "900 m³/h", "3963 gpm")]
    public void A_flow_has_three_figures(double flow, string metric, string us) =>
        AssertBoth(flow, metric, us, (format, value) => format.Flow(value));

    [Theory]
    [InlineData(101325, "101.3 kPa", "14.7 psi")]
    [InlineData(2064, "2.06 kPa", "0.299 psi")]
    [InlineData(45, "45 Pa", "0.0065 psi")]
    [InlineData(-500, "−0.5 kPa", "−0.0725 psi")]
    public void A_pressure_has_three_figures_or_a_tenth(double pascals, string metric, string us) =>
        AssertBoth(pascals, metric, us, (format, value) => format.Pressure(value));

    [Theory]
    [InlineData(291.15, "18 °C", "64.4 °F")]
    [InlineData(253.15, "−20 °C", "−4 °F")]
    public void A_temperature_has_a_tenth(double kelvin, string metric, string us) =>
        AssertBoth(kelvin, metric, us, (format, value) => format.Temperature(value));

    [Fact]
    public void A_velocity_and_a_ratio_have_three_figures()
    {
        Assert.Equal("1.65 m/s", Metric.Velocity(1.6543));
        Assert.Equal("5.43 ft/s", Us.Velocity(1.6543));
        Assert.Equal("12.3 %", MeasureFormat.Percent(0.12345));
        Assert.Equal("0.123", MeasureFormat.Number(0.12345));
    }

    [Fact]
    public void Rounding_never_writes_a_minus_before_nothing() =>
        Assert.Equal("0 mm", Metric.Length(-1e-9));

    [Fact]
    public void No_duration_rounds_up_to_a_full_larger_unit() =>
        Gen.Double[0, 4e6].Sample(seconds =>
        {
            string text = MeasureFormat.Duration(seconds);
            return !text.Contains("60 ", StringComparison.Ordinal) && !text.EndsWith(" 24 h", StringComparison.Ordinal);
        });

    [Fact]
    public void The_culture_changes_nothing()
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = new CultureInfo("") { NumberFormat = { NumberDecimalSeparator = ",", NegativeSign = "~" } };
            Assert.Equal("−1.25 m", Metric.Length(-1.25));
            Assert.Equal("0.123 s", MeasureFormat.Duration(0.1234));
            Assert.Equal("1 h 42 min", MeasureFormat.Duration(6125));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    private static void AssertBoth(
        double value, string metric, string us, Func<MeasureFormat, double, string> write)
    {
        Assert.Equal(metric, write(Metric, value));
        Assert.Equal(us, write(Us, value));
    }
}
