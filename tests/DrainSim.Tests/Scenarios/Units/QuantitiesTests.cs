using DrainSim.Scenarios.Units;
using UnitsNet;
using Unit = DrainSim.Scenarios.Units.Unit;

namespace DrainSim.Tests.Scenarios.Units;

public sealed class QuantitiesTests
{
    public static TheoryData<string, string, double, double> Independent
    {
        get
        {
            // Both sides follow from the same definitions: only rounding may differ, except where the
            // comparison library rounds its own factors (measured: mmHg 1.9e-8, inHg 8e-9, torr 2.2e-6,
            // lb/ft3 7e-9, ft3/s 1.4e-11, and its ft2/s, 1e-6).
            const double exact = 1e-13;
            return new TheoryData<string, string, double, double>
            {
                { "length", "in", UnitsNet.Length.FromInches(1).Meters, exact },
                { "length", "ft", UnitsNet.Length.FromFeet(1).Meters, exact },
                { "length", "yd", UnitsNet.Length.FromYards(1).Meters, exact },
                { "length", "mil", UnitsNet.Length.FromMils(1).Meters, exact },
                { "length", "um", UnitsNet.Length.FromMicrometers(1).Meters, exact },
                { "area", "in2", UnitsNet.Area.FromSquareInches(1).SquareMeters, exact },
                { "area", "ft2", UnitsNet.Area.FromSquareFeet(1).SquareMeters, exact },
                { "area", "acre", UnitsNet.Area.FromAcres(1).SquareMeters, exact },
                { "area", "ha", UnitsNet.Area.FromHectares(1).SquareMeters, exact },
                { "volume", "L", UnitsNet.Volume.FromLiters(1).CubicMeters, exact },
                { "volume", "gal", UnitsNet.Volume.FromUsGallons(1).CubicMeters, exact },
                { "volume", "imp gal", UnitsNet.Volume.FromImperialGallons(1).CubicMeters, exact },
                { "volume", "bbl", UnitsNet.Volume.FromOilBarrels(1).CubicMeters, 1e-9 },
                { "volume", "ft3", UnitsNet.Volume.FromCubicFeet(1).CubicMeters, exact },
                { "volume", "in3", UnitsNet.Volume.FromCubicInches(1).CubicMeters, 1e-9 },
                { "volume", "yd3", UnitsNet.Volume.FromCubicYards(1).CubicMeters, 1e-9 },
                { "volume", "acre ft", UnitsNet.Volume.FromAcreFeet(1).CubicMeters, 1e-5 }, // theirs is the US survey acre-foot, 6e-6 larger
                { "flow", "gpm", UnitsNet.VolumeFlow.FromUsGallonsPerMinute(1).CubicMetersPerSecond, 1e-9 },
                { "flow", "cfs", UnitsNet.VolumeFlow.FromCubicFeetPerSecond(1).CubicMetersPerSecond, 1e-10 },
                { "flow", "L/min", UnitsNet.VolumeFlow.FromLitersPerMinute(1).CubicMetersPerSecond, exact },
                { "flow", "m3/h", UnitsNet.VolumeFlow.FromCubicMetersPerHour(1).CubicMetersPerSecond, exact },
                { "flow", "bbl/d", UnitsNet.VolumeFlow.FromOilBarrelsPerDay(1).CubicMetersPerSecond, 1e-6 },
                { "pressure", "psi", UnitsNet.Pressure.FromPoundsForcePerSquareInch(1).Pascals, 1e-12 },
                { "pressure", "atm", UnitsNet.Pressure.FromAtmospheres(1).Pascals, exact },
                { "pressure", "torr", UnitsNet.Pressure.FromTorrs(1).Pascals, 3e-6 },
                { "pressure", "mmHg", UnitsNet.Pressure.FromMillimetersOfMercury(1).Pascals, 3e-8 },
                { "pressure", "inHg", UnitsNet.Pressure.FromInchesOfMercury(1).Pascals, 1e-8 },
                { "pressure", "mH2O", UnitsNet.Pressure.FromMetersOfWaterColumn(1).Pascals, 1e-9 },
                { "pressure", "inH2O", UnitsNet.Pressure.FromInchesOfWaterColumn(1).Pascals, 1e-6 },
                { "density", "lb/ft3", UnitsNet.Density.FromPoundsPerCubicFoot(1).KilogramsPerCubicMeter, 1e-8 },
                { "density", "lb/gal", UnitsNet.Density.FromPoundsPerUSGallon(1).KilogramsPerCubicMeter, 1e-8 },
                { "density", "g/cm3", UnitsNet.Density.FromGramsPerCubicCentimeter(1).KilogramsPerCubicMeter, exact },
                { "viscosity", "cP", DynamicViscosity.FromCentipoise(1).PascalSeconds, exact },
                { "viscosity", "P", DynamicViscosity.FromPoise(1).PascalSeconds, exact },
                { "kinematic viscosity", "cSt", UnitsNet.KinematicViscosity.FromCentistokes(1).SquareMetersPerSecond, exact },
                { "kinematic viscosity", "St", UnitsNet.KinematicViscosity.FromStokes(1).SquareMetersPerSecond, exact },
                { "kinematic viscosity", "ft2/s", UnitsNet.KinematicViscosity.FromSquareFeetPerSecond(1).SquareMetersPerSecond, 2e-6 },
                { "temperature", "degC", UnitsNet.Temperature.FromDegreesCelsius(1).Kelvins, exact },
                { "temperature", "degF", UnitsNet.Temperature.FromDegreesFahrenheit(1).Kelvins, exact },
                { "angle", "deg", UnitsNet.Angle.FromDegrees(1).Radians, exact },
                { "velocity", "ft/s", Speed.FromFeetPerSecond(1).MetersPerSecond, exact },
                { "acceleration", "ft/s2", UnitsNet.Acceleration.FromFeetPerSecondSquared(1).MetersPerSecondSquared, exact },
                { "time", "week", UnitsNet.Duration.FromWeeks(1).Seconds, exact },
            };
        }
    }

    [Theory]
    [MemberData(nameof(Independent))]
    public void A_unit_agrees_with_an_independent_table(string quantity, string spelling, double si, double tolerance)
    {
        Unit unit = Quantities.All.Single(q => q.Name == quantity).Find(spelling)!;
        Assert.InRange(unit.ToSi(1) / si, 1 - tolerance, 1 + tolerance);
    }

    // NIST SP 811 (2008), appendix B.8, where the figures in bold are exact.
    [Theory]
    [InlineData("length", "in", 0.0254)]
    [InlineData("length", "ft", 0.3048)]
    [InlineData("length", "yd", 0.9144)]
    [InlineData("volume", "gal", 3.785411784e-3)]
    [InlineData("volume", "bbl", 0.158987294928)]
    [InlineData("volume", "ft3", 0.028316846592)]
    [InlineData("volume", "in3", 1.6387064e-5)]
    [InlineData("pressure", "atm", 101325)]
    [InlineData("pressure", "psi", 6894.757293168361)]
    [InlineData("pressure", "mmHg", 133.322387415)]
    [InlineData("pressure", "kgf/cm2", 98066.5)]
    [InlineData("viscosity", "P", 0.1)]
    [InlineData("kinematic viscosity", "ft2/s", 0.09290304)]
    public void A_factor_is_that_of_its_definition(string quantity, string spelling, double factor)
    {
        Unit unit = Quantities.All.Single(q => q.Name == quantity).Find(spelling)!;
        // A few roundings in the product of constants.
        Assert.InRange(unit.Factor / factor, 1 - 1e-15, 1 + 1e-15);
    }

    [Fact]
    public void No_spelling_stands_for_two_units_of_one_quantity() =>
        Assert.All(Quantities.All, quantity =>
        {
            string[] spellings = [.. quantity.Units.SelectMany(u => u.OtherSpellings.Prepend(u.Spelling))];
            Assert.Equal(spellings.Length, spellings.Distinct().Count());
        });

    [Fact]
    public void No_spelling_stands_for_two_quantities()
    {
        string[] spellings = [.. Quantities.All.SelectMany(q => q.Units).SelectMany(u => u.OtherSpellings.Prepend(u.Spelling))];
        Assert.Equal(spellings.Length, spellings.Distinct().Count());
    }

    [Fact]
    public void The_first_unit_of_a_quantity_is_its_SI_unit() =>
        Assert.All(Quantities.All, q => Assert.Equal((q.SiUnit, 1.0, 0.0), (q.Units[0].Spelling, q.Units[0].Factor, q.Units[0].Offset)));

    [Fact]
    public void Every_example_of_a_message_is_read() =>
        Assert.All(Quantities.All, quantity => Assert.All(
            quantity.Examples.Replace(" or ", ", ", StringComparison.Ordinal).Split(", "),
            example => Assert.False(QuantityText.Read(example, quantity).IsRefused)));
}
