using CsCheck;
using DrainSim.Scenarios.Units;

namespace DrainSim.Tests.Scenarios.Units;

public sealed class QuantityTextTests
{
    private static readonly Gen<Quantity> AnyQuantity = Gen.Int[0, Quantities.All.Count - 1].Select(i => Quantities.All[i]);

    [Theory]
    [InlineData("2.4 m", 2.4)]
    [InlineData("38mm", 0.038)]
    [InlineData("  38  mm ", 0.038)]
    [InlineData("-1.5 m", -1.5)]
    [InlineData("+1.5 m", 1.5)]
    [InlineData("1.5e2 mm", 0.15)]
    [InlineData(".5 m", 0.5)]
    [InlineData("1.5 in", 0.0381)]
    [InlineData("1 1/2 in", 0.0381)]
    [InlineData("1-1/2 in", 0.0381)]
    [InlineData("3/4 in", 0.01905)]
    [InlineData("-1/2 in", -0.0127)]
    [InlineData("-0 1/2 in", -0.0127)]
    [InlineData("5 ft 3 in", 1.6002)]
    [InlineData("5 ft 3 1/2 in", 1.6129)]
    [InlineData("-5 ft 3 in", -1.6002)]
    [InlineData("1 m 5 cm 2 mm", 1.052)]
    [InlineData("0.0015 µm", 1.5e-9)]
    [InlineData("0 m", 0)]
    public void A_length_is_read_in_metres(string text, double metres)
    {
        QuantityReading reading = QuantityText.Read(text, Quantities.Length);
        Assert.Null(reading.Fault);
        Assert.Equal(metres, reading.Value, 1e-15);
    }

    [Theory]
    [InlineData("1 h 30 min", 5400)]
    [InlineData("1h 30min", 5400)]
    [InlineData("2 d 3 h", 183600)]
    [InlineData("12 h", 43200)]
    public void A_time_of_several_units_adds_up(string text, double seconds) =>
        Assert.Equal(seconds, QuantityText.Read(text, Quantities.Time).Value);

    [Theory]
    [InlineData("18 degC", 291.15)]
    [InlineData("-40 °F", 233.15)]
    [InlineData("32 degF", 273.15)]
    [InlineData("291.15 K", 291.15)]
    public void A_temperature_is_read_in_kelvins(string text, double kelvins) =>
        Assert.Equal(kelvins, QuantityText.Read(text, Quantities.Temperature).Value, 1e-12);

    [Theory]
    [InlineData("80 %", 0.8)]
    [InlineData("80%", 0.8)]
    [InlineData("0.8", 0.8)]
    public void A_ratio_is_read_with_and_without_a_per_cent_sign(string text, double ratio) =>
        Assert.Equal(ratio, QuantityText.Read(text, Quantities.Ratio).Value, 1e-15);

    [Theory]
    [InlineData("38", "'38' has no unit", "A length reads 38 mm, 1.5 in or 0.038 m")]
    [InlineData("", "'' is not a finite number with a unit", "A length reads 38 mm, 1.5 in or 0.038 m")]
    [InlineData("long", "'long' is not a finite number with a unit", "A length reads 38 mm, 1.5 in or 0.038 m")]
    [InlineData("NaN m", "'NaN m' is not a finite number with a unit", "A length reads 38 mm, 1.5 in or 0.038 m")]
    [InlineData("1e999 m", "'1e999 m' is not a finite number with a unit", "A length reads 38 mm, 1.5 in or 0.038 m")]
    [InlineData("1e308 km", "'1e308 km' is not a finite number with a unit", "A length reads 38 mm, 1.5 in or 0.038 m")]
    [InlineData("1/0 m", "'1/0 m' is not a finite number with a unit", "A length reads 38 mm, 1.5 in or 0.038 m")]
    [InlineData("1,5 m", "'1,5 m' has a comma", "Write a decimal point and no thousands sign")]
    [InlineData("1,000 m", "'1,000 m' has a comma", "Write a decimal point and no thousands sign")]
    [InlineData("38 MM", "'38 MM' has a unit 'MM' that is not known", "did you mean 'mm'?")]
    [InlineData("38 kPa", "'38 kPa' is a pressure", "A length reads 38 mm, 1.5 in or 0.038 m")]
    [InlineData("38 furlong", "'38 furlong' has a unit 'furlong' that is not known", "A length reads 38 mm, 1.5 in or 0.038 m")]
    [InlineData("3 in 5 ft", "'3 in 5 ft' has units that do not get smaller", "A length reads 38 mm, 1.5 in or 0.038 m")]
    [InlineData("5 ft -3 in", "'5 ft -3 in' has a sign inside", "A length reads 38 mm, 1.5 in or 0.038 m")]
    [InlineData("5 ft 3", "'5 ft 3' has no unit", "A length reads 38 mm, 1.5 in or 0.038 m")]
    public void A_bad_length_is_refused_by_its_reason(string text, string fault, string accepted)
    {
        QuantityReading reading = QuantityText.Read(text, Quantities.Length);
        Assert.Equal((fault, accepted), (reading.Fault, reading.Accepted));
    }

    [Fact]
    public void A_length_given_for_a_pressure_is_named_a_length()
    {
        QuantityReading reading = QuantityText.Read("38 mm", Quantities.Pressure);
        Assert.Equal("'38 mm' is a length", reading.Fault);
        Assert.Equal("A pressure reads 101.3 kPa, 1013 mbar or 14.7 psi", reading.Accepted);
    }

    [Theory]
    [InlineData("5 psig")]
    [InlineData("0.3 barg")]
    public void A_gauge_pressure_is_not_taken_for_an_absolute_one(string text) =>
        Assert.Contains("is a gauge pressure", QuantityText.Read(text, Quantities.Pressure).Fault, StringComparison.Ordinal);

    [Fact]
    public void Two_temperatures_do_not_add_up() =>
        Assert.NotNull(QuantityText.Read("18 degC 3 K", Quantities.Temperature).Fault);

    [Fact]
    public void No_text_ends_in_an_exception() =>
        Gen.Select(Gen.String[Gen.Char["0123456789.,+-eE/ %°mhdftinµNaN\t\0é"], 0, 20], AnyQuantity)
            .Sample((text, quantity) => double.IsFinite(QuantityText.Read(text, quantity).Value), iter: 20_000);

    [Fact]
    public void What_is_written_in_a_unit_is_read_back() =>
        Gen.Select(AnyQuantity, Gen.Int[0, 100], Gen.Double[-1e6, 1e6])
            .Sample((quantity, pick, number) =>
            {
                Unit unit = quantity.Units[pick % quantity.Units.Count];
                string text = string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{number:R} {unit.Spelling}");
                // "0.5 1" is no way to write the bare number.
                return unit.Spelling == "1"
                    || QuantityText.Read(text, quantity).Value == unit.ToSi(number);
            });
}
